import { MM_PER_INCH } from '../units/constants';
import { convertUnit } from '../units/entry-units';
import { figure, term } from './figures';
import type { WheelMarking } from './marking';
import type { Figure } from './types';

/** Largest index (wheel diameter by width, in inches) that each stone serves, and the stone in carats. */
const STONES: readonly (readonly [index: number, carats: number])[] = [
  [3, 0.25],
  [6, 0.35],
  [10, 0.5],
  [15, 0.6],
  [21, 0.75],
  [30, 1],
  [48, 1.25],
  [65, 1.5],
  [80, 1.75],
  [100, 2],
  [150, 2.5],
  [200, 3],
  [260, 3.5],
  [350, 4],
];

const COARSE_UNDER = 46;
const HARD_ABOVE = 'M';
const FAST_ABOVE_FT_PER_MIN = 6500;
/** Doubles must not push an index of exactly 30, or a speed of exactly 6 500 ft/min, over the edge. */
const SLACK = 1e-9;

/** What wears a diamond faster; null where it is not known and does not count. */
export interface DressingConditions {
  marking: WheelMarking | null;
  /** Dressed without coolant. */
  dry: boolean;
  wheelMPerS: number | null;
}

/**
 * How many sizes larger the diamond must be: one for each pair, or a single one, of silicon carbide, dry,
 * coarser than 46, harder than M, above 6 500 ft/min.
 *
 * @param conditions - the wheel's mark, dry or not, and its speed, m/s.
 * @returns 0 to 3 sizes.
 * @source mh31-1303
 * @example diamondSizesUp({ marking: null, dry: true, wheelMPerS: 25 }) // 1
 */
export function diamondSizesUp({ marking, dry, wheelMPerS }: DressingConditions): number {
  const conventional = marking?.kind === 'conventional' ? marking : null;
  const reasons = [
    conventional?.abrasive === 'C' || conventional?.abrasive === 'GC',
    dry,
    conventional !== null && conventional.grain < COARSE_UNDER,
    conventional !== null && conventional.grade > HARD_ABOVE,
    wheelMPerS !== null &&
      convertUnit(wheelMPerS, 'm/s', 'ft/min') > FAST_ABOVE_FT_PER_MIN * (1 + SLACK),
  ];
  return Math.ceil(reasons.filter(Boolean).length / 2);
}

/**
 * The smallest single-point diamond for truing a wheel.
 *
 * @param diameterMm - wheel diameter when new, mm, over 0.
 * @param widthMm - wheel width, mm, over 0.
 * @param conditions - what asks for a larger stone.
 * @returns carats; null while a size is, or beyond the largest wheel or stone of the table.
 * @source mh31-1303
 * @example smallestDiamond(304.8, 63.5, { marking: null, dry: false, wheelMPerS: null }).value // 1.00 ct
 */
export function smallestDiamond(
  diameterMm: number | null,
  widthMm: number | null,
  conditions: DressingConditions,
): Figure {
  const sizesUp = diamondSizesUp(conditions);
  return figure({
    unit: 'ct',
    formula: 'the stone listed for {D} × {T}, {n} sizes up',
    source: 'mh31-1303',
    terms: [
      term('D', 'wheel diameter', [diameterMm, 'mm']),
      term('T', 'wheel width', [widthMm, 'mm']),
      term('n', 'for silicon carbide, dry, coarse, hard and fast', [sizesUp, '1']),
    ],
    compute: (diameter, width, up) => {
      const index = (diameter / MM_PER_INCH) * (width / MM_PER_INCH);
      const row = STONES.findIndex(([largest]) => index <= largest * (1 + SLACK));
      return row < 0 ? null : (STONES[row + up]?.[1] ?? null);
    },
    note: 'The table goes by diameter × width in inches. One size up for each two, or a single one, of the conditions.',
  });
}
