import { dressWidth } from '../dressing';
import { casesOf } from './case';

export const firstPrinciplesDressing = casesOf('derived-dressing', [
  {
    checks: 'Chord of the tip at the depth of dressing',
    inputs: 'tip radius 0.38 mm, 0.025 mm deep',
    expected: 0.2711,
    unit: 'mm',
    tolerance: { within: 0.00005 },
    got: () => dressWidth(0.38, 0.025, false).value,
  },
]);
