import { assumedTerm, figure, term, termOf } from './figures';
import type { Figure } from './types';

const SECONDS_PER_MINUTE = 60;
const MM_PER_M = 1000;

/**
 * The diameter of the wheel that would touch flat work over the same length as this one touches round work.
 *
 * @param wheelMm - wheel diameter now, mm, over 0.
 * @param workMm - diameter of the ground surface, mm, over 0.
 * @param side - 'outside' for shafts, 'inside' for bores and jaws.
 * @returns mm, unrounded; null while a diameter is, or when the wheel does not go into the bore.
 * @source derived-contact-length
 * @example equivalentDiameter(25, 50, 'inside').value // 50 mm
 */
export function equivalentDiameter(
  wheelMm: number | null,
  workMm: number | null,
  side: 'outside' | 'inside',
): Figure {
  const inside = side === 'inside';
  return figure({
    unit: 'mm',
    formula: `{d_e} = {d_s} {d_w} / ({d_w} ${inside ? '-' : '+'} {d_s})`,
    source: 'derived-contact-length',
    terms: [
      term('d_s', 'wheel diameter now', [wheelMm, 'mm']),
      term('d_w', 'diameter of the ground surface', [workMm, 'mm']),
    ],
    compute: (wheel, work) => {
      if (inside && work <= wheel) return null;
      return (wheel * work) / (work + (inside ? -wheel : wheel));
    },
  });
}

/**
 * How long the wheel is in contact along its rim.
 *
 * @param infeedMm - infeed on radius, mm, 0 or more.
 * @param equivalent - equivalent diameter, mm; for flat work the wheel's own.
 * @returns mm, unrounded.
 * @source groover-24
 * @example contactLength(0.07, equivalentDiameter(150, 1e9, 'outside')).value // 3.24 mm
 */
export function contactLength(infeedMm: number | null, equivalent: Figure): Figure {
  return figure({
    unit: 'mm',
    formula: '{l} = √({a} {d_e})',
    source: 'groover-24',
    terms: [
      term('a', 'infeed on radius', [infeedMm, 'mm']),
      termOf('d_e', 'equivalent diameter', equivalent),
    ],
    compute: (infeed, diameter) => Math.sqrt(infeed * diameter),
  });
}

/**
 * How thick the metal would be that passes the contact, if it left as one sheet at wheel speed.
 *
 * @param infeedMm - infeed on radius, mm.
 * @param workMPerMin - work speed, m/min.
 * @param wheelMPerS - wheel speed, m/s, over 0.
 * @returns equivalent chip thickness, mm; 0.00002 to 0.0001 is usual in finishing, 0.0002 to 0.0006 in roughing,
 * half of that in bores.
 * @source memory-chip-thickness
 * @example equivalentChip(0.01, 15, 25).value // 0.0001 mm
 */
export function equivalentChip(
  infeedMm: number | null,
  workMPerMin: number | null,
  wheelMPerS: number | null,
): Figure {
  return figure({
    unit: 'mm',
    formula: '{h_eq} = {a} {v_w} / (60 {v_s})',
    source: 'memory-chip-thickness',
    terms: [
      term('a', 'infeed on radius', [infeedMm, 'mm']),
      term('v_w', 'work speed', [workMPerMin, 'm/min']),
      term('v_s', 'wheel speed', [wheelMPerS, 'm/s']),
    ],
    compute: (infeed, work, wheel) => (infeed * work) / (SECONDS_PER_MINUTE * wheel),
    note: 'Usual: 0.02 to 0.1 µm finishing, 0.2 to 0.6 µm roughing; half of that in bores.',
  });
}

/**
 * Metal removed each second while the wheel traverses.
 *
 * @param workMm - diameter of the ground surface, mm.
 * @param infeedMm - infeed on radius, mm.
 * @param traverseMmPerMin - traverse along the work, mm/min.
 * @returns mm3/s, unrounded.
 * @source groover-24
 * @example removalRate(40, 0.01, 120).value // 2.513 mm3/s
 */
export function removalRate(
  workMm: number | null,
  infeedMm: number | null,
  traverseMmPerMin: number | null,
): Figure {
  return figure({
    unit: 'mm3/s',
    formula: '{Q} = π {d_w} {a} {v_f} / 60',
    source: 'groover-24',
    terms: [
      term('d_w', 'diameter of the ground surface', [workMm, 'mm']),
      term('a', 'infeed on radius', [infeedMm, 'mm']),
      term('v_f', 'traverse', [traverseMmPerMin, 'mm/min']),
    ],
    compute: (diameter, infeed, traverse) =>
      (Math.PI * diameter * infeed * traverse) / SECONDS_PER_MINUTE,
  });
}

/**
 * Metal removed each second when the wheel plunges without traverse.
 *
 * @param plunge - diameter of the ground surface and width of wheel that cuts, mm, infeed on radius for each
 * turn of the work, mm, and lathe speed, rpm.
 * @returns mm3/s, unrounded.
 * @source derived-contact-length
 * @example plungeRemovalRate({ workMm: 40, widthMm: 10, infeedMmPerRev: 0.005, workRpm: 120 }).value // 12.57 mm3/s
 */
export function plungeRemovalRate(plunge: {
  workMm: number | null;
  widthMm: number | null;
  infeedMmPerRev: number | null;
  workRpm: number | null;
}): Figure {
  return figure({
    unit: 'mm3/s',
    formula: '{Q} = π {d_w} {T} {f} {n_w} / 60',
    source: 'derived-contact-length',
    terms: [
      term('d_w', 'diameter of the ground surface', [plunge.workMm, 'mm']),
      term('T', 'width of wheel that cuts', [plunge.widthMm, 'mm']),
      term('f', 'infeed for each turn of the work', [plunge.infeedMmPerRev, 'mm/rev']),
      term('n_w', 'lathe speed', [plunge.workRpm, 'rpm']),
    ],
    compute: (diameter, width, infeed, rpm) =>
      (Math.PI * diameter * width * infeed * rpm) / SECONDS_PER_MINUTE,
  });
}

/**
 * Metal removed each second by one millimetre of the wheel's width.
 *
 * @param infeedMm - infeed on radius, mm.
 * @param workMPerMin - work speed, m/min.
 * @returns mm3 a second for each mm, unrounded.
 * @source memory-chip-thickness
 * @example specificRemoval(0.006, 10).value // 1 mm3/(mm s)
 */
export function specificRemoval(infeedMm: number | null, workMPerMin: number | null): Figure {
  return figure({
    unit: 'mm2/s',
    formula: "{Q'} = 1 000 {a} {v_w} / 60",
    source: 'memory-chip-thickness',
    terms: [
      term('a', 'infeed on radius', [infeedMm, 'mm']),
      term('v_w', 'work speed', [workMPerMin, 'm/min']),
    ],
    compute: (infeed, work) => (MM_PER_M * infeed * work) / SECONDS_PER_MINUTE,
    note: 'Usual: 0.1 to 0.5 finishing, 1 to 5 roughing; half of that in bores.',
  });
}

/**
 * How much metal a wheel ground for each volume of itself that wore away.
 *
 * @param removedMm3 - volume ground from the work, mm3, 0 or more.
 * @param wornMm3 - volume worn from the wheel, mm3, over 0.
 * @returns the grinding ratio, unrounded.
 * @throws {RangeError} when `wornMm3` is not over 0.
 * @source groover-24
 * @example grindingRatio(123332, 1176.8) // 104.80
 */
export function grindingRatio(removedMm3: number, wornMm3: number): number {
  if (!(wornMm3 > 0)) throw new RangeError('the worn volume must be over 0');
  return removedMm3 / wornMm3;
}

/**
 * How much the wheel's face wears back in one pass over the work.
 *
 * @param pass - infeed on radius, work diameter and length, wheel diameter and width, all mm and over 0, and
 * the grinding ratio.
 * @returns wear on the wheel's radius, mm, unrounded.
 * @source derived-wheel-wear
 * @example wheelWear({ infeedMm: 0.01, workMm: 40, lengthMm: 150, wheelMm: 100, widthMm: 20, ratio: 20 }).value // 0.0015 mm
 */
export function wheelWear(pass: {
  infeedMm: number | null;
  workMm: number | null;
  lengthMm: number | null;
  wheelMm: number | null;
  widthMm: number | null;
  ratio: number | null;
}): Figure {
  return figure({
    unit: 'mm',
    formula: '{w} = {a} {d_w} {L} / ({G} {d_s} {T})',
    source: 'derived-wheel-wear',
    terms: [
      term('a', 'infeed on radius', [pass.infeedMm, 'mm']),
      term('d_w', 'diameter of the ground surface', [pass.workMm, 'mm']),
      term('L', 'length of the ground surface', [pass.lengthMm, 'mm']),
      assumedTerm('G', 'grinding ratio', [pass.ratio, '1']),
      term('d_s', 'wheel diameter now', [pass.wheelMm, 'mm']),
      term('T', 'wheel width', [pass.widthMm, 'mm']),
    ],
    compute: (infeed, work, length, ratio, wheel, width) =>
      (infeed * work * length) / (ratio * wheel * width),
  });
}
