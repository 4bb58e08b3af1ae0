import { toDegrees, toRadians } from './angles';
import { figure, term } from './figures';
import type { Figure } from './types';

/** Where the centre of a surface stands from the spindle axis: along 0 degrees, and along 90. */
export interface Offset {
  aMm: number;
  bMm: number;
}

/** The offset as a straight line along the axis: its value at z = 0, and its change for each mm. */
export interface OffsetLine {
  at0: Offset;
  perMm: Offset;
}

/**
 * How far off centre a surface is.
 *
 * @param offset - its two parts, mm.
 * @returns eccentricity, mm, unrounded.
 * @source derived-least-squares
 * @example eccentricity({ aMm: 0.03, bMm: 0.04 }).value // 0.05 mm
 */
export function eccentricity(offset: Offset): Figure {
  return figure({
    unit: 'mm',
    formula: '{e} = √({a}² + {b}²)',
    source: 'derived-least-squares',
    terms: [
      term('a', 'offset along 0 degrees', [offset.aMm, 'mm']),
      term('b', 'offset along 90 degrees', [offset.bMm, 'mm']),
    ],
    compute: Math.hypot,
    note: 'Least-squares circle through the readings (ISO 12181).',
  });
}

/**
 * The angle at which a surface stands furthest from the axis.
 *
 * @param offset - its two parts, mm.
 * @returns degrees, 0 to 360; 0 when there is no offset.
 * @source derived-least-squares
 * @example highSpot({ aMm: 0, bMm: -0.02 }) // 270
 */
export function highSpot(offset: Offset): number {
  return (toDegrees(Math.atan2(offset.bMm, offset.aMm)) + 360) % 360;
}

/**
 * The offset behind a run-out that was read on an indicator, taking the part for round.
 *
 * @param runOutMm - full movement of the indicator (TIR) in one turn, mm, 0 or more.
 * @param highSpotDeg - angle of the highest reading, degrees.
 * @returns the two parts of the offset, mm; together they are half the run-out.
 * @source iso-1101
 * @example offsetFromRunOut(0.1, 90).bMm // 0.05
 */
export function offsetFromRunOut(runOutMm: number, highSpotDeg: number): Offset {
  const eccentricityMm = runOutMm / 2;
  const angle = toRadians(highSpotDeg);
  return { aMm: eccentricityMm * Math.cos(angle), bMm: eccentricityMm * Math.sin(angle) };
}

/**
 * The straight line on which the centres of several planes lie: through two, fitted through more.
 *
 * @param planes - offset and distance along the axis of each plane, mm; one or more. One plane, or planes at
 * one distance, show no tilt and give none.
 * @returns the line; null without planes.
 * @source derived-least-squares
 * @example offsetLine([{ zMm: 20, aMm: 0.02, bMm: 0 }, { zMm: 120, aMm: 0.06, bMm: 0 }])?.perMm.aMm // 0.0004
 */
export function offsetLine(planes: readonly (Offset & { zMm: number })[]): OffsetLine | null {
  const count = planes.length;
  if (count === 0) return null;
  const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / count;
  const meanZ = mean(planes.map(({ zMm }) => zMm));
  const spread = mean(planes.map(({ zMm }) => (zMm - meanZ) ** 2));
  const line = (pick: (plane: Offset) => number) => {
    const middle = mean(planes.map(pick));
    const slope =
      spread > 0
        ? mean(planes.map((plane) => (plane.zMm - meanZ) * (pick(plane) - middle))) / spread
        : 0;
    return { at0: middle - slope * meanZ, slope };
  };
  const a = line(({ aMm }) => aMm);
  const b = line(({ bMm }) => bMm);
  return { at0: { aMm: a.at0, bMm: b.at0 }, perMm: { aMm: a.slope, bMm: b.slope } };
}

/**
 * The offset at one place along the axis.
 *
 * @param line - from offsetLine.
 * @param zMm - distance along the axis, mm, from where the planes were measured.
 * @returns the offset there, mm.
 * @source derived-least-squares
 * @example offsetAt({ at0: { aMm: 0.01, bMm: 0 }, perMm: { aMm: 0.0004, bMm: 0 } }, 100).aMm // 0.05
 */
export function offsetAt(line: OffsetLine, zMm: number): Offset {
  return {
    aMm: line.at0.aMm + line.perMm.aMm * zMm,
    bMm: line.at0.bMm + line.perMm.bMm * zMm,
  };
}

/**
 * How much the offset changes over a length: what a tilted axis adds from one end of the work to the other.
 *
 * @param line - from offsetLine.
 * @param lengthMm - length of the ground surface, mm, 0 or more.
 * @returns change of the offset over the length, mm.
 * @source derived-least-squares
 * @example tiltOver({ at0: { aMm: 0, bMm: 0 }, perMm: { aMm: 0.0003, bMm: 0.0004 } }, 40).value // 0.02 mm
 */
export function tiltOver(line: OffsetLine, lengthMm: number): Figure {
  return figure({
    unit: 'mm',
    formula: '{c} = {k} {L}',
    source: 'derived-least-squares',
    terms: [
      term('k', 'change of the offset for each mm along the axis', [
        Math.hypot(line.perMm.aMm, line.perMm.bMm),
        '1',
      ]),
      term('L', 'length of the ground surface', [lengthMm, 'mm']),
    ],
    compute: (slope, length) => slope * length,
  });
}
