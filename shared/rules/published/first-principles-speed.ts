import { convertUnit } from '../../units/entry-units';
import { quickCheck } from '../quick-check';
import { casesOf } from './case';

const small = () =>
  quickCheck({
    wheelDiameterMm: 65,
    marking: { speedMPerS: convertUnit(4300, 'm/min', 'm/s') },
    spindle: { rpm: 23_000 },
  });

const inputs = '65 mm wheel marked 4 300 m/min, spindle 23 000 rpm';

export const firstPrinciplesSpeed = casesOf('derived-geometry', [
  {
    checks: 'Verdict on a small wheel on a fast spindle',
    inputs,
    expected: 'stop',
    got: () => small().verdict,
  },
  {
    checks: 'Limit of the spindle from the marked speed, rounded down',
    inputs,
    expected: 21_057,
    unit: 'rpm',
    tolerance: 'exact',
    got: () => small().limit.value,
  },
  {
    checks: 'Speed that its rim would have',
    inputs,
    expected: 4697,
    unit: 'm/min',
    tolerance: { within: 0.5 },
    got: () => convertUnit(small().surfaceSpeed.value ?? NaN, 'm/s', 'm/min'),
  },
]);
