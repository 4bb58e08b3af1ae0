import { toDegrees, toRadians } from './angles';
import { figure, term, termOf } from './figures';
import type { Figure } from './types';

const RIGHT_ANGLE = 90;

/**
 * Half of a cone's included angle: between its side and the spindle axis.
 *
 * @param largeMm - diameter at the big end, mm.
 * @param smallMm - diameter at the small end, mm, 0 or more.
 * @param lengthMm - length along the axis between them, mm, over 0.
 * @returns degrees, unrounded; null when the ends are the wrong way round.
 * @source derived-taper
 * @example halfAngle(40, 20, 10).value // 45 degrees
 */
export function halfAngle(
  largeMm: number | null,
  smallMm: number | null,
  lengthMm: number | null,
): Figure {
  return figure({
    unit: 'deg',
    formula: '{α} = atan(({D} - {d}) / (2 {L}))',
    source: 'derived-taper',
    terms: [
      term('D', 'diameter at the big end', [largeMm, 'mm']),
      term('d', 'diameter at the small end', [smallMm, 'mm']),
      term('L', 'length along the axis', [lengthMm, 'mm']),
    ],
    compute: (large, small, length) =>
      large < small || length <= 0 ? null : toDegrees(Math.atan((large - small) / (2 * length))),
  });
}

/**
 * Half of the included angle that is wanted, as for a lathe centre.
 *
 * @param includedDeg - included angle, degrees, over 0 and under 180.
 * @returns degrees; null outside that range.
 * @source derived-taper
 * @example halfOfIncluded(60).value // 30 degrees
 */
export function halfOfIncluded(includedDeg: number | null): Figure {
  return figure({
    unit: 'deg',
    formula: '{α} = {β} / 2',
    source: 'derived-taper',
    terms: [term('β', 'included angle', [includedDeg, 'deg'])],
    compute: (included) => (included > 0 && included < 2 * RIGHT_ANGLE ? included / 2 : null),
  });
}

/**
 * Taper as diameter over length, from a half angle: 0.0833 is one inch in the foot.
 *
 * @param half - half angle, degrees, under 90.
 * @returns change of diameter for each unit of length; times 12 it is the taper per foot in inches.
 * @source derived-taper
 * @example taperPerLength(halfOfIncluded(60)).value // 1.1547
 */
export function taperPerLength(half: Figure): Figure {
  return figure({
    unit: 'taper',
    formula: '{k} = 2 tan {α}',
    source: 'derived-taper',
    terms: [termOf('α', 'half angle', half)],
    compute: (angle) => (angle < RIGHT_ANGLE ? 2 * Math.tan(toRadians(angle)) : null),
  });
}

/**
 * Half angle of a taper given as diameter over length: 0.05 is 1 in 20, 1/12 an inch to the foot.
 *
 * @param perLength - change of diameter for each unit of length along the axis, 0 or more.
 * @returns half angle, degrees, unrounded.
 * @source derived-taper
 * @example halfAngleOfTaper(3.5 / 12).value // 8.297 degrees
 */
export function halfAngleOfTaper(perLength: number | null): Figure {
  return figure({
    unit: 'deg',
    formula: '{α} = atan({k} / 2)',
    source: 'derived-taper',
    terms: [term('k', 'taper, diameter over length', [perLength, 'taper'])],
    compute: (taper) => (taper < 0 ? null : toDegrees(Math.atan(taper / 2))),
  });
}

/**
 * How far the tailstock is set over to make a taper between centres.
 *
 * @param totalLengthMm - length of the work between the centres, mm.
 * @param taper - diameter over length, as from taperPerLength.
 * @returns setover, mm, unrounded.
 * @source jones-setover
 * @example tailstockSetover(228.6, stated('taper', [1 / 12, 'taper'])).value // 9.525 mm: three eighths of an inch
 */
export function tailstockSetover(totalLengthMm: number | null, taper: Figure): Figure {
  return figure({
    unit: 'mm',
    formula: '{s} = {L} {k} / 2',
    source: 'jones-setover',
    terms: [
      term('L', 'length between the centres', [totalLengthMm, 'mm']),
      termOf('k', 'taper, diameter over length', taper),
    ],
    compute: (length, perLength) => (length * perLength) / 2,
    note: 'The length of the whole piece counts, not that of the taper.',
  });
}

/**
 * How far to move the tailstock when a shaft comes out larger at one end.
 *
 * @param diameters - at two places, mm, and the distance along the axis between them, mm, over 0.
 * @param totalLengthMm - length between the centres, mm.
 * @returns mm, positive when the second diameter is the larger.
 * @source derived-taper
 * @example tailstockCorrection({ firstMm: 40, secondMm: 40.02, apartMm: 100 }, 200).value // 0.02 mm
 */
export function tailstockCorrection(
  diameters: { firstMm: number | null; secondMm: number | null; apartMm: number | null },
  totalLengthMm: number | null,
): Figure {
  return figure({
    unit: 'mm',
    formula: '{c} = ({d_2} - {d_1}) {L} / (2 {b})',
    source: 'derived-taper',
    terms: [
      term('d_2', 'second diameter', [diameters.secondMm, 'mm']),
      term('d_1', 'first diameter', [diameters.firstMm, 'mm']),
      term('L', 'length between the centres', [totalLengthMm, 'mm']),
      term('b', 'distance between the two', [diameters.apartMm, 'mm']),
    ],
    compute: (...[second = NaN, first = NaN, length = NaN, apart = NaN]) =>
      ((second - first) * length) / (2 * apart),
  });
}

/**
 * What a move of a slide takes off a cone, square to its surface.
 *
 * @param moveMm - how far the slide moves, mm.
 * @param half - half angle, degrees.
 * @param slide - 'cross-slide' moves across the axis, 'carriage' along it.
 * @returns infeed normal to the surface, mm.
 * @source derived-taper
 * @example normalInfeed(0.01, halfOfIncluded(60), 'carriage').value // 0.005 mm
 */
export function normalInfeed(
  moveMm: number | null,
  half: Figure,
  slide: 'cross-slide' | 'carriage',
): Figure {
  const across = slide === 'cross-slide';
  return figure({
    unit: 'mm',
    formula: across ? '{m} cos {α}' : '{m} sin {α}',
    source: 'derived-taper',
    terms: [
      term('m', across ? 'move of the cross-slide' : 'move of the carriage', [moveMm, 'mm']),
      termOf('α', 'half angle', half),
    ],
    compute: (move, angle) =>
      move * (across ? Math.cos(toRadians(angle)) : Math.sin(toRadians(angle))),
  });
}

/**
 * The diameter of the cylinder that curves like a cone does where the wheel touches it.
 *
 * @param diameterMm - diameter of the cone there, mm.
 * @param half - half angle, degrees, under 90.
 * @returns mm, unrounded; it takes the work diameter's place in the contact.
 * @source derived-taper
 * @example coneDiameter(20, halfOfIncluded(60)).value // 23.09 mm
 */
export function coneDiameter(diameterMm: number | null, half: Figure): Figure {
  return figure({
    unit: 'mm',
    formula: '{d} / cos {α}',
    source: 'derived-taper',
    terms: [term('d', 'diameter of the cone', [diameterMm, 'mm']), termOf('α', 'half angle', half)],
    compute: (diameter, angle) =>
      angle < RIGHT_ANGLE ? diameter / Math.cos(toRadians(angle)) : null,
  });
}
