import { scaleLinear } from 'd3-scale';

import type { WheelEntryView } from '@/shared/contracts/wheel-entries';
import type { RackWheel } from '@/shared/domain/wheels';
import { diameterAfterDressing } from '@/shared/rules/wheel-life';

/** A size that the wheel came down to, and by what. */
export interface LifeMark {
  entry: WheelEntryView;
  diameterMm: number;
}

/** The size an entry itself states; null where it states none. */
function measuredIn({ step }: WheelEntryView): number | null {
  switch (step.kind) {
    case 'received':
    case 'inspected':
    case 'used':
      return step.diameterMm;
    default:
      return null;
  }
}

/**
 * The wheel's sizes one after another, oldest first. Entries that are taken back count for nothing. Where the oldest
 * entries are not known, sizes start at the first that was measured; where none was, they are found backwards.
 */
export function lifeMarks(entries: readonly WheelEntryView[], nowMm: number): LifeMark[] {
  const counting = entries
    .filter(({ correctedBy }) => correctedBy === null)
    .sort((a, b) => a.number - b.number);
  const unmeasured = counting.every((entry) => measuredIn(entry) === null);
  let diameterMm = unmeasured ? nowMm + dressedOff(counting) : null;
  return counting.flatMap((entry) => {
    const { step } = entry;
    const measured = measuredIn(entry);
    if (measured !== null) diameterMm = measured;
    else if (step.kind === 'dressed' && diameterMm !== null)
      diameterMm = diameterAfterDressing(diameterMm, step);
    else return [];
    return [{ entry, diameterMm }];
  });
}

const dressedOff = (entries: readonly WheelEntryView[]): number =>
  entries.reduce(
    (sum, { step }) => sum - (step.kind === 'dressed' ? diameterAfterDressing(0, step) : 0),
    0,
  );

type Sizes = Pick<RackWheel, 'diameterNewMm' | 'diameterNowMm' | 'smallestUsableMm' | 'holeMm'>;

/** How far below the smallest usable diameter the bar begins, as a share of what can be used. */
const BELOW_SHARE = 0.35;
const LEAST_WIDTH = 2;

/** What came off the wheel between two sizes on record. */
export interface Loss {
  fromMm: number;
  toMm: number;
  /** Or it wore off in use, or before it came. */
  byDressing: boolean;
}

/** What each entry took off, oldest first; a wheel measured larger than reckoned has lost nothing. */
export function lossesOf(freshMm: number, marks: readonly LifeMark[]): Loss[] {
  return marks.flatMap(({ entry, diameterMm }, index) => {
    const fromMm = marks[index - 1]?.diameterMm ?? freshMm;
    if (diameterMm >= fromMm) return [];
    return [{ fromMm, toMm: diameterMm, byDressing: entry.step.kind === 'dressed' }];
  });
}

export interface LifeBar {
  /** In pixels: where the usable wheel ends, where it is now, where it began. */
  end: number;
  now: number;
  fresh: number;
  /** What dressing took, each at least wide enough to be seen. */
  dressed: { x: number; width: number }[];
  /** What the lower end of the usable wheel is. */
  endIs: 'smallest' | 'hole';
  endMm: number;
}

/** The bar of a wheel's life on so many pixels. Without a smallest diameter the hole is the end. */
export function lifeBar(sizes: Sizes, marks: readonly LifeMark[], width: number): LifeBar {
  const { diameterNewMm, diameterNowMm, smallestUsableMm, holeMm } = sizes;
  const endMm = smallestUsableMm ?? holeMm;
  const usable = diameterNewMm - endMm;
  const from = Math.max(smallestUsableMm === null ? endMm : holeMm, endMm - BELOW_SHARE * usable);
  const x = scaleLinear().domain([from, diameterNewMm]).range([0, width]).clamp(true);
  return {
    end: x(endMm),
    now: x(diameterNowMm),
    fresh: x(diameterNewMm),
    dressed: lossesOf(diameterNewMm, marks)
      .filter(({ byDressing }) => byDressing)
      .map(({ fromMm, toMm }) => ({
        x: x(toMm),
        width: Math.max(x(fromMm) - x(toMm), LEAST_WIDTH),
      })),
    endIs: smallestUsableMm === null ? 'hole' : 'smallest',
    endMm,
  };
}

export interface Label {
  words: string;
  x: number;
  anchor: 'start' | 'middle' | 'end';
}

/** Where a label stands so that it neither leaves the drawing nor, of two, covers the other. */
export function labelAt(
  words: string,
  at: number,
  { width, wordWidth }: { width: number; wordWidth: number },
): Label {
  const half = wordWidth / 2;
  if (at - half < 0) return { words, x: 0, anchor: 'start' };
  if (at + half > width) return { words, x: width, anchor: 'end' };
  return { words, x: at, anchor: 'middle' };
}
