import { contactLength, equivalentDiameter, grindingRatio, removalRate } from '../contact';
import { casesOf } from './case';

/** Flat work is work of a very large diameter. */
const FLAT_MM = 1e12;

const ring = (largeMm: number, smallMm: number, lengthMm: number) =>
  (Math.PI / 4) * (largeMm ** 2 - smallMm ** 2) * lengthMm;

/** Over flat work, 5 mm of width stands for a circumference and the work's speed for the traverse. */
function removedPerMin(widthMm: number, depthMm: number, workMPerS: number): number {
  return 60 * (removalRate(widthMm / Math.PI, depthMm, workMPerS * 60_000).value ?? NaN);
}

export const grooverProblems = casesOf('groover-problem', [
  {
    checks: 'Length of contact on flat work',
    inputs: 'wheel 150 mm, depth 0.07 mm',
    expected: 3.24,
    unit: 'mm',
    tolerance: { within: 0.005 },
    got: () => contactLength(0.07, equivalentDiameter(150, FLAT_MM, 'outside')).value,
  },
  {
    checks: 'Metal removed each minute on flat work',
    inputs: 'work 0.25 m/s, width 5 mm, depth 0.07 mm',
    expected: 5250,
    unit: 'mm³/min',
    tolerance: 'exact',
    got: () => removedPerMin(5, 0.07, 0.25),
  },
  {
    checks: 'Grinding ratio of a bore',
    inputs: 'bore 250 to 252.5 × 125 mm, wheel 150 to 149.75 × 20 mm',
    expected: 104.8,
    unit: '',
    tolerance: { within: 0.05 },
    got: () => grindingRatio(ring(252.5, 250, 125), ring(150, 149.75, 20)),
  },
]);
