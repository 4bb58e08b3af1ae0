import type { WheelData } from '../domain/wheels';
import { MM_PER_INCH } from '../units/constants';
import { figure, term } from './figures';
import type { Figure } from './types';

const FLANGE_SHARE = 1 / 3;
/** Internal wheels under this diameter go without flanges and blotters. */
const INTERNAL_WITHOUT_MM = 2 * MM_PER_INCH;

/**
 * How wide each flange must be at least: a third of the wheel.
 *
 * @param diameterMm - wheel diameter, mm; null while unknown.
 * @returns mm, unrounded.
 * @source wac-296-806-40516
 * @example leastFlange(175).value // 58.33
 */
export function leastFlange(diameterMm: number | null): Figure {
  return figure({
    unit: 'mm',
    formula: '{D} / 3',
    source: 'wac-296-806-40516',
    terms: [term('D', 'wheel diameter', [diameterMm, 'mm'])],
    compute: (diameter) => diameter * FLANGE_SHARE,
  });
}

/**
 * Mounted wheels have a mandrel, and small wheels for bores a screw: neither takes flanges.
 *
 * @param wheel - the wheel.
 * @param side - where it grinds.
 * @returns whether flanges and blotters belong on it.
 */
export function takesFlanges(wheel: WheelData, side: 'outside' | 'inside'): boolean {
  return (
    wheel.mounted === null && !(side === 'inside' && wheel.diameterNewMm < INTERNAL_WITHOUT_MM)
  );
}
