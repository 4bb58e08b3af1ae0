import type { WorkInputs } from '../domain/setups';
import { toRadians } from './angles';
import { figure, term, termOf } from './figures';
import { notNegative, positive } from './sizes';
import { halfAngle, halfAngleOfTaper, halfOfIncluded } from './taper';
import type { Figure } from './types';

/** A cone as its drawing gives it; null inside while something is missing. */
export interface Cone {
  half: Figure;
  smallDiameter: Figure;
  /** Length along its side. */
  slantLength: Figure;
}

/**
 * The cone of a taper, from the one of angle, small end and taper that its drawing gives.
 *
 * @param work - diameter at the big end and length along the axis in mm, and what the drawing gives.
 * @returns half angle, small end and slant length; null inside while something is missing, or where the ends
 * are the wrong way round.
 * @source derived-taper
 * @example coneOf({ ...planInput.work, diameterMm: 40, lengthMm: 20, taperGiven: 'angle', includedAngleDeg: 60 }).smallDiameter.value // 16.91 mm
 */
export function coneOf(work: WorkInputs): Cone {
  const big = positive(work.diameterMm);
  const length = positive(work.lengthMm);
  const half = halfOf(work, big, length);
  return {
    half,
    smallDiameter: smallEnd(big, length, half),
    slantLength: figure({
      unit: 'mm',
      formula: '{l} = {L} / cos {α}',
      source: 'derived-taper',
      terms: [term('L', 'length along the axis', [length, 'mm']), termOf('α', 'half angle', half)],
      compute: (along, angle) => along / Math.cos(toRadians(angle)),
    }),
  };
}

function halfOf(work: WorkInputs, big: number | null, length: number | null): Figure {
  switch (work.taperGiven) {
    case 'angle':
      return halfOfIncluded(positive(work.includedAngleDeg));
    case 'taper':
      return halfAngleOfTaper(positive(work.taperPerLength));
    case 'small end':
      return halfAngle(big, notNegative(work.smallDiameterMm), length);
  }
}

/** Below 0 where a cone this long would run past its own point. */
function smallEnd(big: number | null, length: number | null, half: Figure): Figure {
  return figure({
    unit: 'mm',
    formula: '{d} = {D} - 2 {L} tan {α}',
    source: 'derived-taper',
    terms: [
      term('D', 'diameter at the big end', [big, 'mm']),
      term('L', 'length along the axis', [length, 'mm']),
      termOf('α', 'half angle', half),
    ],
    compute: (diameter, along, angle) => diameter - 2 * along * Math.tan(toRadians(angle)),
  });
}
