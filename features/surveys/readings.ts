import { readEntry, type QuantitySpec } from '@/features/forms';
import type { UnitSystem } from '@/shared/domain/people';
import type { Reading } from '@/shared/rules/runout';

/** How many readings are spread over the turn; as many as were typed unless it is said before. */
export const SPREADS = ['as typed', '4', '8', '12'] as const;
export type Spread = (typeof SPREADS)[number];

export interface TypedReadings {
  readings: Reading[];
  /** What cannot be read, in words. */
  faults: string[];
  /** Where the next reading is to be taken; null where angles are typed or the turn is full. */
  nextDeg: number | null;
}

const TURN = 360;
const MOST_READINGS = 72;

/**
 * Reads a list of indicator readings: one to a line or with semicolons between, each alone or as
 * "angle: reading". Those without angles are spread evenly over the turn, from 0 degrees.
 */
export function readReadings(text: string, units: UnitSystem, spread: Spread): TypedReadings {
  const entries = text
    .split(/[;\n]/)
    .map((entry) => entry.trim())
    .filter((entry) => entry !== '');
  if (entries.length > MOST_READINGS)
    return { readings: [], faults: [`At most ${MOST_READINGS} readings.`], nextDeg: null };
  const withAngle = entries.filter((entry) => entry.includes(':')).length;
  if (withAngle > 0 && withAngle < entries.length)
    return {
      readings: [],
      faults: ['Give every reading its angle, like 30: 0.02, or none of them.'],
      nextDeg: null,
    };
  const parts = spread === 'as typed' ? Math.max(entries.length, 1) : Number(spread);
  const faults: string[] = [];
  const readings: Reading[] = [];
  entries.forEach((entry, index) => {
    const [value = '', typedAngle] = entry.split(':', 2).reverse();
    const reading = readEntry(value, readingSpec(index), units);
    const angle =
      typedAngle === undefined
        ? { si: (index * TURN) / parts }
        : readEntry(typedAngle, angleSpec(index), units);
    if (reading.si === null || angle.si === null)
      faults.push(reading.error ?? ('error' in angle ? angle.error : null) ?? missing(index));
    else readings.push({ angleDeg: angle.si, readingMm: reading.si });
  });
  if (withAngle === 0 && entries.length > parts)
    faults.push(`${entries.length} readings are more than the ${parts} of one turn.`);
  const open = withAngle === 0 && spread !== 'as typed' && entries.length < parts;
  return { readings, faults, nextDeg: open ? (entries.length * TURN) / parts : null };
}

const readingSpec = (index: number): QuantitySpec => ({
  label: `Reading ${index + 1}`,
  unit: 'mm',
  limit: 'readingMm',
});

const angleSpec = (index: number): QuantitySpec => ({
  label: `Angle ${index + 1}`,
  unit: 'deg',
  limit: 'highSpotDeg',
});

const missing = (index: number) => `Reading ${index + 1} needs an angle and a number.`;

/** An indicator inside a bore rises where the surface comes nearer to the axis. */
export const seenFromOutside = (readings: readonly Reading[], inside: boolean): Reading[] =>
  readings.map(({ angleDeg, readingMm }) => ({
    angleDeg,
    readingMm: inside ? -readingMm : readingMm,
  }));
