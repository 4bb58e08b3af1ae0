import type { QuillData, QuillMaterial, QuillSegment } from '../domain/machines';
import { finding } from './findings';
import { assumedTerm, figure, quantity, stated, term } from './figures';
import type { Figure, Finding } from './types';

/** Young's modulus in N/mm2 and density in kg/m3. */
export const QUILL_MATERIAL: Record<QuillMaterial, { modulus: number; density: number }> = {
  steel: { modulus: 206_000, density: 7850 },
  carbide: { modulus: 600_000, density: 14_900 },
};

const WHEEL_DENSITY = 2200;
/** Rayleigh's share of a cantilever's own mass that moves with its tip. */
const MOVING_SHARE = 33 / 140;

/** How a quill answers a unit force at its wheel end, and what it weighs. */
export interface Bending {
  deflectionMmPerN: number;
  slopePerN: number;
  massKg: number;
}

/**
 * Bending of a stepped cantilever, clamped at the far end of its last segment.
 *
 * @param segments - length and diameter of each segment from the wheel end, mm.
 * @param material - Young's modulus, N/mm2, and density, kg/m3.
 * @returns deflection and slope for one newton at the wheel, and mass; null without any length.
 * @source derived-beam
 * @example bendingOf([{ lengthMm: 30, diameterMm: 10 }, { lengthMm: 50, diameterMm: 20 }], QUILL_MATERIAL.steel)?.deflectionMmPerN // 0.000188926
 */
export function bendingOf(
  segments: readonly QuillSegment[],
  { modulus, density }: { modulus: number; density: number },
): Bending | null {
  let from = 0;
  const sum = { deflectionMmPerN: 0, slopePerN: 0, massKg: 0 };
  for (const { lengthMm, diameterMm } of segments) {
    const to = from + lengthMm;
    const secondMoment = (Math.PI * diameterMm ** 4) / 64;
    sum.deflectionMmPerN += (to ** 3 - from ** 3) / (3 * modulus * secondMoment);
    sum.slopePerN += (to ** 2 - from ** 2) / (2 * modulus * secondMoment);
    sum.massKg += ((Math.PI * diameterMm ** 2) / 4) * lengthMm * density * 1e-9;
    from = to;
  }
  return from > 0 && sum.deflectionMmPerN > 0 ? sum : null;
}

/**
 * First bending frequency of a cantilever with a mass at its end.
 *
 * @param stiffnessNPerMm - stiffness at the end, N/mm, over 0.
 * @param tipKg - mass at the end, kg.
 * @param ownKg - mass of the cantilever, kg; 33/140 of it moves with the end.
 * @returns frequency, Hz, unrounded.
 * @source derived-beam
 * @example tipMassFrequency(38.656, 1, 0) // 31.29 Hz
 */
export function tipMassFrequency(stiffnessNPerMm: number, tipKg: number, ownKg: number): number {
  return Math.sqrt((stiffnessNPerMm * 1000) / (tipKg + MOVING_SHARE * ownKg)) / (2 * Math.PI);
}

function bending(quill: Pick<QuillData, 'segments' | 'material'>): Bending | null {
  return bendingOf(quill.segments, QUILL_MATERIAL[quill.material]);
}

/**
 * Length of a quill from the wheel end to the bearing, mm.
 *
 * @param segments - segments from the wheel end.
 * @returns mm.
 */
export function quillLength(segments: readonly QuillSegment[]): number {
  return segments.reduce((sum, { lengthMm }) => sum + lengthMm, 0);
}

/**
 * How stiff a quill is at the wheel, clamped at its bearing; the measured value takes the computed one's place.
 *
 * @param quill - segments from the wheel end, mm, material, and the measured stiffness, N/mm.
 * @returns stiffness, N/mm, unrounded; optimistic where computed, since the bearing gives way too.
 * @source derived-beam
 * @example quillStiffness({ ...quill, segments: [{ lengthMm: 30, diameterMm: 10 }, { lengthMm: 50, diameterMm: 20 }] }).value // 5293 N/mm
 */
export function quillStiffness(quill: QuillData | null): Figure {
  if (quill !== null && quill.measuredStiffnessNPerMm !== null)
    return stated('stiffness as measured', [quill.measuredStiffnessNPerMm, 'N/mm']);
  const bent = quill === null ? null : bending(quill);
  const modulus = quill === null ? null : QUILL_MATERIAL[quill.material].modulus;
  const plain = quill !== null && quill.segments.length === 1 ? quill.segments[0] : undefined;
  return figure({
    unit: 'N/mm',
    formula:
      plain === undefined
        ? '{k} = 3 {E} / Σ ((x_i³ - x_(i-1)³) / I_i)'
        : '{k} = 3 {E} π {d}⁴ / (64 {L}³)',
    source: 'derived-beam',
    terms: [
      assumedTerm('E', "Young's modulus of the quill", [modulus, 'N/mm2']),
      ...(plain === undefined
        ? []
        : [
            term('d', 'quill diameter', [plain.diameterMm, 'mm']),
            term('L', 'length to the bearing', [plain.lengthMm, 'mm']),
          ]),
    ],
    compute: () => (bent === null ? null : 1 / bent.deflectionMmPerN),
    note: 'Clamped at the bearing, so optimistic: the bearing and the post give way too.',
  });
}

/**
 * Mass of a wheel, kg, from its sizes and an assumed density.
 *
 * @param wheel - diameter now, width and hole, mm.
 * @returns kg.
 */
export function wheelMassKg(wheel: {
  diameterNowMm: number;
  widthMm: number;
  holeMm: number;
}): number {
  const area = (Math.PI * (wheel.diameterNowMm ** 2 - wheel.holeMm ** 2)) / 4;
  return Math.max(area * wheel.widthMm * WHEEL_DENSITY * 1e-9, 0);
}

/**
 * The first bending frequency of a quill with its wheel; the measured value takes the computed one's place.
 *
 * @param quill - segments, material, and the measured frequency, Hz.
 * @param wheelKg - mass of wheel and nut, kg, 0 or more.
 * @returns frequency, Hz, unrounded; null while quill or wheel is unknown.
 * @source derived-beam
 * @example firstFrequency(quill, 0.015).value // 2499 Hz
 */
export function firstFrequency(quill: QuillData | null, wheelKg: number | null): Figure {
  if (quill !== null && quill.measuredFrequencyHz !== null)
    return stated('first bending frequency as measured', [quill.measuredFrequencyHz, 'Hz']);
  const bent = quill === null ? null : bending(quill);
  return figure({
    unit: 'Hz',
    formula: '{f_1} = √({k} · 1000 / ({m} + (33/140) {m_b})) / (2π)',
    source: 'derived-beam',
    terms: [
      term('k', 'stiffness of the quill', [
        bent === null ? null : 1 / bent.deflectionMmPerN,
        'N/mm',
      ]),
      assumedTerm('m', 'mass of the wheel', [wheelKg, 'kg']),
      assumedTerm('m_b', 'mass of the quill', [bent?.massKg ?? null, 'kg']),
    ],
    compute: tipMassFrequency,
    note: 'Clamped at the bearing; in its bearings a quill reaches 0.65 to 0.79 of this.',
  });
}

/**
 * The taper that a bent quill grinds across the width of its wheel.
 *
 * @param quill - segments and material; null while not chosen.
 * @param forceN - normal force at the wheel, N.
 * @param widthMm - width of the wheel, mm.
 * @returns difference of radius across the wheel, mm: 1.5 times the quill's own bend times width over length
 * for a plain quill.
 * @source derived-beam
 * @example quillTaper(quill, 10, 12).value // 0.00033 mm
 */
export function quillTaper(
  quill: QuillData | null,
  forceN: number | null,
  widthMm: number | null,
): Figure {
  const bent = quill === null ? null : bending(quill);
  return figure({
    unit: 'mm',
    formula: '{F_n} {s} {T}',
    source: 'derived-beam',
    terms: [
      term('F_n', 'normal force, finishing', [forceN, 'N']),
      term('s', 'slope of the quill at the wheel for each newton, radians', [
        bent?.slopePerN ?? null,
        '1',
      ]),
      term('T', 'wheel width', [widthMm, 'mm']),
    ],
    compute: (force, slope, width) => force * slope * width,
  });
}

/** The share of the tolerance that the quill's taper may take, on diameter, before it is worth a word. */
const TAPER_SHARE = 0.25;

/**
 * A note when the quill's taper, on diameter, takes a good part of the tolerance.
 *
 * @param taper - difference of radius across the wheel, mm.
 * @param toleranceMm - permitted error of size on diameter, mm.
 * @returns one note, or none.
 */
export function taperFindings(taper: Figure, toleranceMm: number | null): Finding[] {
  if (taper.value === null || toleranceMm === null) return [];
  const onDiameter = 2 * taper.value;
  return onDiameter > toleranceMm * TAPER_SHARE
    ? [finding('quill-taper', { figures: { taper: quantity(onDiameter, 'mm') } })]
    : [];
}
