import type { Material } from '../domain/materials';
import type { Abrasive } from '../domain/wheels';
import { MM_PER_INCH } from '../units/constants';
import { finding } from './findings';
import { GRAINS, parseMarking, type WheelMarking } from './marking';
import type { SourceId } from './sources';
import type { Finding } from './types';

/** A range of marks that suit some work. */
export interface RecommendedMark {
  family: Abrasive;
  grain: { coarsest: number; finest: number };
  grade: { softest: string; hardest: string };
  bond: 'V';
  source: SourceId;
}

export interface MarkScore {
  /** 0 does not suit, 100 is as recommended. */
  score: number;
  reasons: string[];
}

const MARKS = {
  soft: mark('aluminium oxide', [54, 60], ['L', 'M']),
  hardSmall: mark('aluminium oxide', [80, 80], ['L', 'L']),
  hardLarge: mark('aluminium oxide', [60, 60], ['K', 'K']),
  hardBore: mark('aluminium oxide', [60, 60], ['L', 'L']),
  castIron: mark('silicon carbide', [36, 36], ['J', 'J']),
  brass: mark('silicon carbide', [36, 36], ['K', 'K']),
  aluminium: mark('aluminium oxide', [46, 46], ['I', 'I']),
  stainless: mark('aluminium oxide', [46, 46], ['K', 'K']),
};

const POINTS = { family: 40, grain: 25, grade: 25, bond: 10 };
const POINTS_LOST_PER_STEP = 5;

function mark(
  family: Abrasive,
  [coarsest, finest]: [number, number],
  [softest, hardest]: [string, string],
): RecommendedMark {
  return {
    family,
    grain: { coarsest, finest },
    grade: { softest, hardest },
    bond: 'V',
    source: 'mh31-1317',
  };
}

/**
 * The wheel that the handbook recommends for a material.
 *
 * @param material - work material.
 * @param side - 'outside' for shafts, 'inside' for bores and jaws.
 * @param diameterMm - diameter of the ground surface, mm; hardened shafts up to an inch take a finer wheel. Null
 * is taken as larger.
 * @returns the range of marks, vitrified.
 * @source mh31-1317
 * @example recommendedMark('tool-hardened', 'outside', 20).grain // { coarsest: 80, finest: 80 }
 */
export function recommendedMark(
  material: Material,
  side: 'outside' | 'inside',
  diameterMm: number | null,
): RecommendedMark {
  switch (material) {
    case 'plain-carbon-hardened':
    case 'alloy-hardened':
    case 'tool-hardened':
      if (side === 'inside') return MARKS.hardBore;
      return diameterMm !== null && diameterMm <= MM_PER_INCH ? MARKS.hardSmall : MARKS.hardLarge;
    case 'cast-iron':
      return MARKS.castIron;
    case 'copper-alloy':
      return MARKS.brass;
    case 'aluminium-alloy':
      return MARKS.aluminium;
    case 'stainless':
      return MARKS.stainless;
    default:
      return MARKS.soft;
  }
}

/**
 * How near a wheel's mark comes to the recommended one, and why.
 *
 * The abrasive counts for 40 of 100, grain and grade for 25 each and lose 5 with each step, the bond for 10.
 *
 * @param marking - from parseMarking.
 * @param material - work material.
 * @param recommended - from recommendedMark.
 * @returns points and reasons; diamond on steel and iron gets none.
 * @source mh31-1317
 * @example scoreMark({ kind: 'conventional', prefix: null, abrasive: 'A', grainScale: null, grain: 60, grade: 'L', structure: null, bond: 'V', suffix: null }, 'tool-hardened', recommendedMark('tool-hardened', 'inside', 50)).score // 100
 */
export function scoreMark(
  marking: WheelMarking,
  material: Material,
  recommended: RecommendedMark,
): MarkScore {
  const family = abrasiveFamily(marking);
  if (family === 'diamond' && isFerrous(material))
    return { score: 0, reasons: ['Diamond wears away chemically on steel and iron.'] };
  const suits = suitsFamily(family, material, recommended);
  const reasons = [
    suits
      ? `${capital(family)} suits this work.`
      : `${capital(family)}; ${recommended.family} is usual.`,
  ];
  let score = suits ? POINTS.family : 0;
  if (marking.kind === 'conventional') {
    const grainSteps = stepsOutside(
      GRAINS.indexOf(marking.grain),
      GRAINS.indexOf(recommended.grain.coarsest),
      GRAINS.indexOf(recommended.grain.finest),
    );
    score += Math.max(POINTS.grain - POINTS_LOST_PER_STEP * Math.abs(grainSteps), 0);
    if (grainSteps !== 0)
      reasons.push(`The grain is ${grainSteps < 0 ? 'coarser' : 'finer'} than recommended.`);
    const gradeSteps = stepsOutside(
      marking.grade.charCodeAt(0),
      recommended.grade.softest.charCodeAt(0),
      recommended.grade.hardest.charCodeAt(0),
    );
    score += Math.max(POINTS.grade - POINTS_LOST_PER_STEP * Math.abs(gradeSteps), 0);
    if (gradeSteps !== 0)
      reasons.push(`The grade is ${gradeSteps < 0 ? 'softer' : 'harder'} than recommended.`);
  } else {
    reasons.push('Grain and grade of diamond and cBN are not compared.');
  }
  if (marking.bond === recommended.bond) score += POINTS.bond;
  else reasons.push('A vitrified bond is usual.');
  return { score, reasons };
}

/**
 * What a wheel's mark says about the work it is meant for.
 *
 * @param text - the mark as written; null when nothing is legible, which says nothing.
 * @param material - work material; null while not chosen.
 * @returns a check for diamond on steel or iron, notes for an unusual abrasive and for a mark that does not read.
 * @source mh31-1317
 * @example markFindings('C 60 K 8 V', 'tool-hardened')[0]?.code // 'abrasive-other'
 */
export function markFindings(text: string | null, material: Material | null): Finding[] {
  if (text === null || text.trim() === '') return [];
  const parsed = parseMarking(text);
  if (!parsed.ok) return [finding('marking-not-read', { names: { marking: text } })];
  if (material === null) return [];
  const family = abrasiveFamily(parsed.marking);
  if (family === 'diamond' && isFerrous(material)) return [finding('diamond-on-steel')];
  const recommended = recommendedMark(material, 'outside', null);
  return suitsFamily(family, material, recommended)
    ? []
    : [finding('abrasive-other', { names: { abrasive: family, usual: recommended.family } })];
}

/**
 * A recommended mark as it would stand on a wheel, with both ends of a range.
 *
 * @param recommended - from recommendedMark.
 * @returns for example "A 54-60 L-M V".
 * @source mh31-1317
 * @example writeRecommended(recommendedMark('alloy-annealed', 'outside', 40)) // 'A 54-60 L-M V'
 */
export function writeRecommended(recommended: RecommendedMark): string {
  const { grain, grade, family, bond } = recommended;
  const abrasive = family === 'silicon carbide' ? 'C' : 'A';
  return [
    abrasive,
    range(String(grain.coarsest), String(grain.finest)),
    range(grade.softest, grade.hardest),
    bond,
  ].join(' ');
}

function range(from: string, to: string): string {
  return from === to ? from : `${from}-${to}`;
}

/**
 * What kind of grain a marking names.
 *
 * @param marking - from parseMarking.
 * @returns the family.
 * @source iso-525
 * @example abrasiveFamily(markingOf('GC 80 J 6 V')) // 'silicon carbide'
 */
export function abrasiveFamily(marking: WheelMarking): Abrasive {
  if (marking.kind === 'superabrasive') return marking.abrasive === 'D' ? 'diamond' : 'cBN';
  return marking.abrasive === 'C' || marking.abrasive === 'GC'
    ? 'silicon carbide'
    : 'aluminium oxide';
}

/** cBN suits hardened steel as well as aluminium oxide does. */
function suitsFamily(family: Abrasive, material: Material, recommended: RecommendedMark): boolean {
  return (
    family === recommended.family ||
    (family === 'cBN' && recommended.family === 'aluminium oxide' && material.endsWith('-hardened'))
  );
}

function isFerrous(material: Material): boolean {
  return material !== 'copper-alloy' && material !== 'aluminium-alloy';
}

/** Steps below (negative) or above a range. */
function stepsOutside(value: number, low: number, high: number): number {
  if (value < low) return value - low;
  return value > high ? value - high : 0;
}

function capital(word: string): string {
  return word === 'cBN' ? word : word.charAt(0).toUpperCase() + word.slice(1);
}
