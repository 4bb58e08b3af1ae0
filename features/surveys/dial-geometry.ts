import { curveCardinalClosed, lineRadial } from 'd3-shape';

import { polar, type Point } from '@/features/ui/polar';
import type { Reading, RunoutFit } from '@/shared/rules/runout';

const CIRCLE_POINTS = 72;
const TURN = 360;
/** Below this, mm, a departure is only the error of doubles, and is not enlarged. */
const LEAST_DEPARTURE = 1e-7;
/** Shares of the dial's radius: where no deviation stands, and how far the largest one goes. */
const BASE_SHARE = 0.7;
const SWING_SHARE = 0.22;
export const TICKS_DEG = Array.from({ length: 12 }, (_, index) => index * 30);

export interface DialLayout {
  centre: Point;
  /** Ring of the ticks, and the mean of the readings, in pixels. */
  radius: number;
  baseRadius: number;
  height: number;
}

/** A dial with room for its angles outside the ring. */
export function dialLayout(width: number, textScale: number): DialLayout {
  const margin = 34 * textScale;
  const radius = Math.max(width / 2 - margin, 40);
  return {
    centre: { x: width / 2, y: radius + margin * 0.8 },
    radius,
    baseRadius: radius * BASE_SHARE,
    height: 2 * (radius + margin * 0.8),
  };
}

export interface DialMarks {
  points: Point[];
  /** Outline of the fitted circle; null while there is none. */
  circle: string | null;
  /** Where the high spot's hand ends; null while there is none. */
  hand: Point | null;
}

/** Readings round the clock, enlarged so that the largest departure from their mean fills the dial. */
export function dialMarks(
  readings: readonly Reading[],
  fit: RunoutFit | null,
  { centre, baseRadius, radius }: DialLayout,
): DialMarks {
  const mean =
    fit?.meanMm ??
    readings.reduce((sum, { readingMm }) => sum + readingMm, 0) / Math.max(readings.length, 1);
  const off = fit?.eccentricity.value ?? 0;
  const largest = Math.max(off, ...readings.map(({ readingMm }) => Math.abs(readingMm - mean)));
  const pixels = largest > LEAST_DEPARTURE ? (SWING_SHARE * radius) / largest : 0;
  const at = (departureMm: number) => baseRadius + pixels * departureMm;
  const circle = (angleDeg: number) =>
    at(off * Math.cos(((angleDeg - (fit?.highSpotDeg ?? 0)) * Math.PI) / 180));
  const outline = lineRadial<number>()
    .angle((angleDeg) => (angleDeg * Math.PI) / 180)
    .radius(circle)
    .curve(curveCardinalClosed);
  return {
    points: readings.map(({ angleDeg, readingMm }) =>
      polar(centre, at(readingMm - mean), angleDeg),
    ),
    circle: fit
      ? outline(Array.from({ length: CIRCLE_POINTS }, (_, i) => (i * TURN) / CIRCLE_POINTS))
      : null,
    hand:
      fit && off > LEAST_DEPARTURE ? polar(centre, circle(fit.highSpotDeg), fit.highSpotDeg) : null,
  };
}
