import { convertUnit } from '../../units/entry-units';
import { markingOf } from '../bond';
import { diamondSizesUp, smallestDiamond, type DressingConditions } from '../diamond';
import { casesOf } from './case';
import type { PublishedCheck } from './types';

const MILD: DressingConditions = { marking: null, dry: false, wheelMPerS: null };

const stone = (diameterIn: number, widthIn: number, conditions = MILD) =>
  smallestDiamond(convertUnit(diameterIn, 'in', 'mm'), convertUnit(widthIn, 'in', 'mm'), conditions)
    .value;

/** The index is diameter × width in inches; wheels of that index are ours. */
const TABLE: readonly [index: number, diameterIn: number, widthIn: number, carats: number][] = [
  [3, 3, 1, 0.25],
  [6, 6, 1, 0.35],
  [10, 10, 1, 0.5],
  [15, 10, 1.5, 0.6],
  [21, 14, 1.5, 0.75],
  [30, 15, 2, 1],
  [48, 24, 2, 1.25],
  [65, 26, 2.5, 1.5],
  [80, 20, 4, 1.75],
  [100, 20, 5, 2],
  [150, 30, 5, 2.5],
  [200, 40, 5, 3],
  [260, 26, 10, 3.5],
  [350, 35, 10, 4],
];

const rows = TABLE.map(([index, diameterIn, widthIn, carats]): PublishedCheck => ({
  checks: 'Smallest diamond, row of the table',
  inputs: `index ${index} (${diameterIn} × ${widthIn} in)`,
  at: 'table',
  expected: carats,
  unit: 'ct',
  tolerance: 'exact',
  got: () => stone(diameterIn, widthIn),
}));

const siliconCarbide = (mark: string, dry = false) => ({ ...MILD, marking: markingOf(mark), dry });

export const machinerysHandbookDiamonds = casesOf('mh31-1303', [
  ...rows,
  {
    checks: 'Smallest diamond, the next index up',
    inputs: 'wheel 8 × 1 in',
    at: 'example',
    expected: 0.5,
    unit: 'ct',
    tolerance: 'exact',
    got: () => stone(8, 1),
  },
  {
    checks: 'Smallest diamond',
    inputs: 'wheel 12 × 2.5 in',
    at: 'example',
    expected: 1,
    unit: 'ct',
    tolerance: 'exact',
    got: () => stone(12, 2.5),
  },
  {
    checks: 'Smallest diamond, raised by two sizes',
    inputs: 'wheel 12 × 2.5 in, silicon carbide 36-P',
    at: 'example',
    expected: 1.5,
    unit: 'ct',
    tolerance: 'exact',
    got: () => stone(12, 2.5, siliconCarbide('C 36 P V')),
  },
  {
    checks: 'Sizes larger for a single condition',
    inputs: 'silicon carbide, 60 grain, grade K, wet',
    at: 'notes to the table',
    expected: 1,
    unit: 'size',
    tolerance: 'exact',
    got: () => diamondSizesUp(siliconCarbide('C 60 K V')),
  },
  {
    checks: 'Sizes larger for a pair of conditions',
    inputs: 'silicon carbide, 60 grain, grade K, dry',
    at: 'notes to the table',
    expected: 1,
    unit: 'size',
    tolerance: 'exact',
    got: () => diamondSizesUp(siliconCarbide('C 60 K V', true)),
  },
  {
    checks: 'Sizes larger for two pairs of conditions',
    inputs: 'silicon carbide, 36 grain, grade P, dry',
    at: 'notes to the table',
    expected: 2,
    unit: 'sizes',
    tolerance: 'exact',
    got: () => diamondSizesUp(siliconCarbide('C 36 P V', true)),
  },
  {
    checks: 'Wheel speed above which diamonds wear faster, in metres',
    inputs: '6 500 ft/min',
    at: 'notes to the table',
    expected: 1981,
    unit: 'm/min',
    tolerance: { within: 0.5 },
    got: () => convertUnit(6500, 'ft/min', 'm/min'),
  },
]);
