import { LIMITS } from '../domain/limits';
import { figure, term, termOf } from './figures';
import type { Figure } from './types';

/** A change smaller than this many steps of the gauge tells nothing. */
const LEAST_STEPS = 3;
const LEAST_CHANGES = 2;

/**
 * The cut fraction that a run showed. The spring itself cannot be seen, but while sparking out each pass takes
 * the same share of what is left, so the changes of size shrink by one ratio: a straight line in their
 * logarithms.
 *
 * @param changesMm - successive changes of size under spark-out, mm, the first pass first, all on radius or all
 * on diameter.
 * @param resolutionMm - smallest step of the gauge, mm, over 0; what is not over three of them is left out, and
 * all that follows it.
 * @returns a share over 0 and under 1; null with fewer than two usable changes, or when they do not shrink.
 * @source derived-spring
 * @example observedFraction([0.008, 0.004, 0.002], 0.0005) // 0.5
 */
export function observedFraction(
  changesMm: readonly number[],
  resolutionMm: number,
): number | null {
  const tooSmall = changesMm.findIndex((change) => !(change > LEAST_STEPS * resolutionMm));
  const usable = tooSmall < 0 ? changesMm : changesMm.slice(0, tooSmall);
  if (usable.length < LEAST_CHANGES) return null;
  const middle = (usable.length - 1) / 2;
  let [rise, run] = [0, 0];
  usable.forEach((change, pass) => {
    rise += (pass - middle) * Math.log(change);
    run += (pass - middle) ** 2;
  });
  const fraction = 1 - Math.exp(rise / run);
  return fraction > 0 && fraction < 1 ? fraction : null;
}

/** What a stage cuts with: traverse in mm per work revolution, work and wheel speed in m/s, all over 0. */
export interface CutConditions {
  traverseMm: number;
  workMPerS: number;
  wheelMPerS: number;
}

/** The same, null where it is not known yet. */
type Expected = { [K in keyof CutConditions]: CutConditions[K] | null };

/**
 * What a run teaches about quill, wheel and material together, freed of its traverse and speeds, so that it
 * serves the next plan.
 *
 * @param fraction - observed cut fraction, over 0 and under 1.
 * @param cut - what it was observed at.
 * @returns softness over sharpness, 1/mm, to be kept for this quill, kind of wheel and material.
 * @source derived-spring
 * @example softness(0.5, { traverseMm: 1, workMPerS: 0.25, wheelMPerS: 25 }) // 100
 */
export function softness(fraction: number, cut: CutConditions): number {
  return ((1 / fraction - 1) * cut.wheelMPerS) / (cut.workMPerS * cut.traverseMm);
}

/**
 * The cut fraction to expect from what runs have taught; offered beside the computed one, never in its place
 * unasked.
 *
 * @param learned - from softness, 1/mm, 0 or more; null while nothing was learned.
 * @param cut - what the next plan cuts with.
 * @returns a share over 0 and up to 1.
 * @source derived-spring
 * @example expectedFraction(100, { traverseMm: 0.5, workMPerS: 0.25, wheelMPerS: 25 }).value // 0.6667
 */
export function expectedFraction(learned: number | null, cut: Expected): Figure {
  return figure({
    unit: '1',
    formula: '{K} = 1 / (1 + {Λ} {s} {v_w}/{v_s})',
    source: 'derived-spring',
    terms: [
      term('Λ', 'learned from runs, for each millimetre', [learned, '1/mm']),
      term('s', 'traverse per work revolution', [cut.traverseMm, 'mm/rev']),
      term('v_w', 'work speed', [cut.workMPerS, 'm/s']),
      term('v_s', 'wheel speed', [cut.wheelMPerS, 'm/s']),
    ],
    compute: (lambda, traverse, work, wheel) => 1 / (1 + (lambda * traverse * work) / wheel),
  });
}

/** Why sizes read during spark-out teach nothing. */
export type SparkOutSilence = 'too few' | 'too small' | 'not shrinking' | 'out of range';

export interface SparkOutLesson {
  /** The cut fraction that the changes show. */
  fraction: Figure;
  /** What it teaches for the next plan, 1/mm. */
  softness: Figure;
  /** Null where something was learned. */
  silence: SparkOutSilence | null;
}

/**
 * What sizes read during spark-out teach for the next plan, or why they teach nothing.
 *
 * @param changesMm - successive changes of diameter, mm, positive the way the grinding goes, the first pass first.
 * @param resolutionMm - smallest step of the gauge, mm, over 0.
 * @param cut - what the passes were cut with; null while unknown.
 * @returns the share cut in a pass and the softness behind it; null values where nothing can be said.
 * @source derived-spring
 * @example sparkOutLesson([0.008, 0.004, 0.002], 0.0005, { traverseMm: 1, workMPerS: 0.25, wheelMPerS: 25 }).softness.value // 100
 */
export function sparkOutLesson(
  changesMm: readonly number[],
  resolutionMm: number,
  cut: Expected,
): SparkOutLesson {
  const observed = observedFraction(changesMm, resolutionMm);
  const fraction = figure({
    unit: '1',
    formula: '{K} = 1 - {q}',
    source: 'derived-spring',
    terms: [
      term('q', 'each change as a share of the one before, fitted through all that count', [
        observed === null ? null : 1 - observed,
        '1',
      ]),
    ],
    compute: (ratio) => 1 - ratio,
    note: 'Only changes of more than three steps of the gauge count, and none after the first that is smaller.',
  });
  const softnessLearned = figure({
    unit: '1/mm',
    formula: '{Λ} = (1 / {K} - 1) {v_s} / ({v_w} {s})',
    source: 'derived-spring',
    terms: [
      termOf('K', 'observed cut fraction', fraction),
      term('v_s', 'wheel speed', [cut.wheelMPerS, 'm/s']),
      term('v_w', 'work speed', [cut.workMPerS, 'm/s']),
      term('s', 'traverse per work revolution', [cut.traverseMm, 'mm/rev']),
    ],
    compute: (share, wheelMPerS, workMPerS, traverseMm) =>
      softness(share, { wheelMPerS, workMPerS, traverseMm }),
  });
  return {
    fraction,
    softness: softnessLearned,
    silence: silenceOf(changesMm, resolutionMm, softnessLearned.value),
  };
}

function silenceOf(
  changesMm: readonly number[],
  resolutionMm: number,
  learned: number | null,
): SparkOutSilence | null {
  if (changesMm.length < LEAST_CHANGES) return 'too few';
  if (observedFraction(changesMm, resolutionMm) === null) {
    const usable = changesMm.slice(0, LEAST_CHANGES);
    if (usable.some((change) => change < 0)) return 'not shrinking';
    return usable.every((change) => change > LEAST_STEPS * resolutionMm)
      ? 'not shrinking'
      : 'too small';
  }
  const { min, max } = LIMITS.softnessPerMm;
  return learned !== null && (learned < min || learned > max) ? 'out of range' : null;
}
