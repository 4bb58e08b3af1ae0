import { convertUnit } from '../../units/entry-units';
import { rpmForSurfaceSpeed } from '../speed';
import { casesOf } from './case';

export const jones = casesOf('jones', [
  {
    checks: 'Lathe speed for a cutting speed',
    inputs: '60 ft/min, 5 in diameter',
    expected: 46,
    unit: 'rpm',
    tolerance: { within: 0.5 },
    got: () => rpmForSurfaceSpeed(convertUnit(60, 'ft/min', 'm/min'), convertUnit(5, 'in', 'mm')),
  },
]);
