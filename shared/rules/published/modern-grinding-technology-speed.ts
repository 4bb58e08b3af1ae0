import { convertUnit } from '../../units/entry-units';
import { rpmOfMarkedSpeed } from '../limits';
import { wheelSpeed } from '../speed';
import { casesOf } from './case';

export const modernGrindingSpeed = casesOf('modern-grinding-dressing', [
  {
    checks: 'Spindle speed of a wheel at a rim speed',
    inputs: '406 mm wheel, 30 m/s',
    at: 'worked example',
    expected: 1410,
    unit: 'rpm',
    tolerance: { within: 2 },
    got: () => rpmOfMarkedSpeed(30, 406).value,
  },
  {
    checks: 'Rim speed of a wheel',
    inputs: '406 mm wheel, 1410 rpm',
    at: 'worked example',
    expected: 5900,
    unit: 'ft/min',
    tolerance: { within: 6 },
    got: () => convertUnit(wheelSpeed(406, 1410).value ?? NaN, 'm/s', 'ft/min'),
  },
]);
