import { halfOfIncluded, taperPerLength } from '../taper';
import { casesOf } from './case';

const TABLE: readonly [includedDeg: number, perInch: number][] = [
  [5, 0.08732],
  [40, 0.72794],
  [50, 0.93262],
];

export const colvin = casesOf(
  'colvin',
  TABLE.map(([includedDeg, perInch]) => ({
    checks: 'Taper to the inch of an included angle',
    inputs: `${includedDeg}°`,
    expected: perInch,
    unit: 'in',
    tolerance: { within: 0.000005 },
    got: () => taperPerLength(halfOfIncluded(includedDeg)).value,
  })),
);
