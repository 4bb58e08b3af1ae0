import { scaleLinear } from 'd3-scale';

import { wordsWidth } from '@/features/ui/picture';
import type { Point } from '@/features/ui/polar';

import type { Dimension, SetupScene } from './setup-scene';

export interface DimensionMark {
  words: string;
  /** Ends of its line, the line's height, and the middle of its words, in pixels. */
  from: number;
  to: number;
  y: number;
  wordsAt: number;
}

export interface SetupLayout {
  pixelsPerMm: number;
  place: (point: Point) => Point;
  /** Top of the drawing itself, under the names of the two ends, and its foot. */
  top: number;
  foot: number;
  marks: DimensionMark[];
  height: number;
}

const MARGIN = 4;
const TALLEST_SHARE = 0.75;
const TALLEST = 340;
const GAP = 8;

/** One scale for both directions; dimensions stand under the drawing, in as many rows as keep them apart. */
export function setupLayout(
  scene: SetupScene,
  { width, textScale }: { width: number; textScale: number },
  wordsOf: (dimension: Dimension) => string,
): SetupLayout {
  const { left, right, top: highest, bottom } = scene.bounds;
  const tallest = Math.min(width * TALLEST_SHARE, TALLEST);
  const pixelsPerMm = Math.min((width - 2 * MARGIN) / (right - left), tallest / (bottom - highest));
  const top = 24 * textScale;
  const middle = width / 2;
  const x = scaleLinear()
    .domain([left, right])
    .range([
      middle - ((right - left) * pixelsPerMm) / 2,
      middle + ((right - left) * pixelsPerMm) / 2,
    ]);
  const y = scaleLinear()
    .domain([highest, bottom])
    .range([top, top + (bottom - highest) * pixelsPerMm]);
  const foot = y(bottom);
  const rows: number[] = [];
  const rowHeight = 26 * textScale;
  const marks = [...scene.dimensions]
    .sort((one, other) => one.to - one.from - (other.to - other.from))
    .map((dimension) => {
      const words = wordsOf(dimension);
      const half = wordsWidth(words, 'small', textScale) / 2;
      const [from, to] = [x(dimension.from), x(dimension.to)];
      const wordsAt = Math.min(Math.max((from + to) / 2, half), width - half);
      return {
        words,
        from,
        to,
        wordsAt,
        start: Math.min(from, wordsAt - half),
        end: Math.max(to, wordsAt + half),
      };
    })
    .sort((one, other) => one.start - other.start)
    .map(({ start, end, ...mark }) => {
      const free = rows.findIndex((taken) => taken + GAP <= start);
      const row = free < 0 ? rows.length : free;
      rows[row] = end;
      return { ...mark, y: foot + (row + 1) * rowHeight };
    });
  return {
    pixelsPerMm,
    place: (point) => ({ x: x(point.x), y: y(point.y) }),
    top,
    foot,
    marks,
    height: foot + rows.length * rowHeight + 8,
  };
}
