import type { PlanInput } from '../domain/setups';
import { MM_PER_INCH } from '../units/constants';
import { finding } from './findings';
import { quantity } from './figures';
import { quillLength } from './quill';
import { positive } from './sizes';
import { kindOf } from './surface';
import type { Finding } from './types';

/** Two sizes that belong near each other, and the ratios (first over second) that are ordinary. */
interface Neighbours {
  first: readonly [label: string, mm: number | null];
  second: readonly [label: string, mm: number | null];
  low: number;
  high: number;
}

/**
 * Asks about a figure about 25 times too large or small for its neighbour, as when a 25 mm wheel is typed as
 * 25 inches.
 *
 * @param input - the setup.
 * @returns a note for each such pair; a size is asked about once.
 * @source derived-units
 * @example unitFindings(planInput) // []
 */
export function unitFindings(input: PlanInput): Finding[] {
  const asked = new Set<string>();
  return neighbours(input).flatMap((pair) => {
    const [firstLabel, first] = pair.first;
    const [secondLabel, second] = pair.second;
    if (first === null || second === null) return [];
    if (asked.has(firstLabel) || asked.has(secondLabel)) return [];
    const unit = unitMistaken(first / second, pair);
    if (unit === null) return [];
    asked.add(firstLabel).add(secondLabel);
    return [
      finding('unit-doubt', {
        figures: { first: quantity(first, 'mm'), second: quantity(second, 'mm') },
        names: { unit, firstLabel, secondLabel },
      }),
    ];
  });
}

/** Which unit the first size looks to be typed in by mistake: out of the ordinary, but not once converted. */
function unitMistaken(ratio: number, { low, high }: Neighbours): 'inches' | 'millimetres' | null {
  if (ratio >= low && ratio <= high) return null;
  const within = (value: number) => value >= low && value <= high;
  if (ratio > high && within(ratio / MM_PER_INCH)) return 'inches';
  return ratio < low && within(ratio * MM_PER_INCH) ? 'millimetres' : null;
}

function neighbours(input: PlanInput): Neighbours[] {
  const { work, wheelData, quill } = input;
  const kind = kindOf(input);
  const wheel = ['wheel diameter', positive(wheelData?.diameterNowMm ?? null)] as const;
  const width = ['wheel width', positive(wheelData?.widthMm ?? null)] as const;
  const reach = [
    'length of the quill',
    quill === null ? null : quillLength(quill.segments),
  ] as const;
  const length = ['length to grind', positive(work.lengthMm)] as const;
  const wheelOwn: Neighbours[] = [{ first: width, second: wheel, low: 0.04, high: 3 }];
  if (kind === 'outside')
    return [
      ...wheelOwn,
      {
        first: ['run-out', positive(work.runOutMm)],
        second: ['stock on diameter', positive(work.stockOnDiameterMm)],
        low: 0.0001,
        high: 6,
      },
    ];
  const bore =
    kind === 'jaws'
      ? (['bore at the jaws', positive(work.jawBoreMm)] as const)
      : (['diameter of the bore', positive(work.diameterMm)] as const);
  const inside: Neighbours[] = [
    { first: wheel, second: bore, low: 0.15, high: 1.5 },
    ...wheelOwn,
    { first: length, second: reach, low: 0.05, high: 2.5 },
  ];
  if (kind === 'bore') return inside;
  return [
    ...inside,
    { first: ['width of a pad', positive(work.padWidthMm)], second: bore, low: 0.06, high: 1 },
    {
      first: ['run-out near the chuck', positive(work.nearRunOutMm)],
      second: ['run-out further out', positive(work.farRunOutMm)],
      low: 0.1,
      high: 10,
    },
  ];
}
