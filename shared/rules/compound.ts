import type { CompoundZero } from '../domain/machines';
import { toRadians } from './angles';
import { figure, term, termOf } from './figures';
import type { Figure } from './types';

const MM_PER_M = 1000;
const RIGHT_ANGLE = 90;

/**
 * What the compound slide's scale reads when the slide travels along the side of a cone.
 *
 * Lathes mark the scale's zero differently: some with the slide across the bed, as the cross-slide runs, some
 * along it.
 *
 * @param half - half angle, degrees.
 * @param zero - along what the slide travels at zero; null while nobody has looked.
 * @returns the reading, degrees; null while the zero is not known.
 * @source practice-scale
 * @example compoundReading(halfOfIncluded(60), 'cross-slide').value // 60 degrees
 * @example compoundReading(halfOfIncluded(60), 'spindle-axis').value // 30 degrees
 */
export function compoundReading(half: Figure, zero: CompoundZero | null): Figure {
  const across = zero === 'cross-slide';
  return figure({
    unit: 'deg',
    formula: across ? '90° - {α}' : '{α}',
    source: 'practice-scale',
    terms: [
      zero === null
        ? term('α', "half angle, once the scale's zero is known", [null, 'deg'])
        : termOf('α', 'half angle', half),
    ],
    compute: (angle) => (across ? RIGHT_ANGLE - angle : angle),
    note: across
      ? 'The scale reads zero with the slide across the bed.'
      : 'The scale reads zero with the slide along the bed.',
  });
}

/**
 * How far the compound slide travels along the side of a cone, with the overrun at both ends.
 *
 * @param lengthMm - length of the cone along the axis, mm.
 * @param half - half angle, degrees, under 90.
 * @param overrunMm - overrun at each end, along the side, mm.
 * @returns mm; it must fit the slide's travel.
 * @source derived-taper
 * @example slantTravel(40, halfOfIncluded(60), 3).value // 52.19 mm
 */
export function slantTravel(
  lengthMm: number | null,
  half: Figure,
  overrunMm: number | null,
): Figure {
  return figure({
    unit: 'mm',
    formula: '{L} / cos {α} + 2 {o}',
    source: 'derived-taper',
    terms: [
      term('L', 'length along the axis', [lengthMm, 'mm']),
      termOf('α', 'half angle', half),
      term('o', 'overrun at each end', [overrunMm, 'mm']),
    ],
    compute: (length, angle, overrun) =>
      angle < RIGHT_ANGLE ? length / Math.cos(toRadians(angle)) + 2 * overrun : null,
  });
}

/**
 * The work speed at which hand feed on the compound slide keeps a wanted traverse.
 *
 * @param slideMmPerTurn - what one turn of the crank moves the slide, mm.
 * @param traverseMmPerRev - traverse wanted for each turn of the work, mm, over 0.
 * @param diameterMm - diameter at the big end, mm.
 * @returns work speed there, m/min, at one crank turn a second.
 * @source practice-crank
 * @example handFedWorkSpeed(2, 1, 25).value // 9.42 m/min
 */
export function handFedWorkSpeed(
  slideMmPerTurn: number | null,
  traverseMmPerRev: number | null,
  diameterMm: number | null,
): Figure {
  return figure({
    unit: 'm/min',
    formula: '{v_w} = 60 π {d} {p} / (1 000 {s})',
    source: 'practice-crank',
    terms: [
      term('d', 'diameter at the big end', [diameterMm, 'mm']),
      term('p', 'slide for one turn of the crank', [slideMmPerTurn, 'mm']),
      term('s', 'traverse per work revolution', [traverseMmPerRev, 'mm/rev']),
    ],
    compute: (diameter, perTurn, traverse) =>
      traverse > 0 ? (60 * Math.PI * diameter * perTurn) / (MM_PER_M * traverse) : null,
    note: 'At one turn of the crank a second.',
  });
}

/**
 * How fast the compound's crank must be turned to keep a traverse.
 *
 * @param traverse - traverse for each turn of the work, mm.
 * @param latheRpm - lathe speed, rpm.
 * @param slideMmPerTurn - what one turn of the crank moves the slide, mm, over 0; null where not measured.
 * @returns turns a second; a hand keeps up about one.
 * @source practice-crank
 * @example crankRate(stated('traverse', [1, 'mm/rev']), stated('lathe speed', [120, 'rpm']), 2).value // 1
 */
export function crankRate(
  traverse: Figure,
  latheRpm: Figure,
  slideMmPerTurn: number | null,
): Figure {
  return figure({
    unit: '1',
    formula: '{s} {n_w} / (60 {p})',
    source: 'practice-crank',
    terms: [
      termOf('s', 'traverse per work revolution', traverse),
      termOf('n_w', 'lathe speed', latheRpm),
      term('p', 'slide for one turn of the crank', [slideMmPerTurn, 'mm']),
    ],
    compute: (perRev, rpm, perTurn) => (perTurn > 0 ? (perRev * rpm) / (60 * perTurn) : null),
    note: 'Turns of the crank in a second; a hand keeps up about one.',
  });
}
