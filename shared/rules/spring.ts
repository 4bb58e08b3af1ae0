import { assumedTerm, figure, term, termOf } from './figures';
import type { Figure } from './types';

/** Spark-out never helps beyond this: under a rubbing threshold some spring stays. */
const MOST_SPARK_OUTS = 12;

/** A joule is a newton metre: one J/mm3 is 1 000 N/mm2. */
const N_PER_MM2 = 1000;

/**
 * How much more the wheel presses for each millimetre deeper that it cuts.
 *
 * @param cut - specific energy in J/mm3, work and wheel speed in m/s, traverse in mm per work revolution, and
 * tangential over normal force.
 * @returns cutting stiffness, N/mm, unrounded.
 * @source derived-spring
 * @example cuttingStiffness({ energy: 38, workMPerS: 0.25, wheelMPerS: 20, traverseMm: 1.5, forceRatio: 0.4 }) // 1781 N/mm
 */
export function cuttingStiffness(cut: {
  energy: number;
  workMPerS: number;
  wheelMPerS: number;
  traverseMm: number;
  forceRatio: number;
}): number {
  return (
    (N_PER_MM2 * cut.energy * (cut.workMPerS / cut.wheelMPerS) * cut.traverseMm) / cut.forceRatio
  );
}

/** What the cut fraction of one stage depends on; null while unknown. Speeds in m/s, traverse in mm. */
export interface StageCut {
  energy: number | null;
  workMPerS: number | null;
  wheelMPerS: number | null;
  traverseMm: number | null;
  forceRatio: number;
}

/**
 * The share of what is set in that is really cut in one pass; the rest springs back.
 *
 * @param stiffness - stiffness at the wheel, N/mm.
 * @param cut - what the stage cuts with.
 * @returns a share over 0 and under 1.
 * @source derived-spring
 * @example cutFraction(stated('stiffness', [5000, 'N/mm']), { energy: 38, workMPerS: 0.25, wheelMPerS: 20, traverseMm: 1.5, forceRatio: 0.4 }).value // 0.737
 */
export function cutFraction(stiffness: Figure, cut: StageCut): Figure {
  return figure({
    unit: '1',
    formula: '{K} = {k} / ({k} + 1 000 {u} ({v_w}/{v_s}) {s} / {μ})',
    source: 'derived-spring',
    terms: [
      termOf('k', 'stiffness at the wheel', stiffness),
      term('u', 'specific energy', [cut.energy, 'J/mm3']),
      term('v_w', 'work speed', [cut.workMPerS, 'm/s']),
      term('v_s', 'wheel speed', [cut.wheelMPerS, 'm/s']),
      term('s', 'traverse per work revolution', [cut.traverseMm, 'mm/rev']),
      assumedTerm('μ', 'tangential over normal force', [cut.forceRatio, '1']),
    ],
    compute: (k, energy, workMPerS, wheelMPerS, traverseMm, forceRatio) =>
      k / (k + cuttingStiffness({ energy, workMPerS, wheelMPerS, traverseMm, forceRatio })),
    note: 'For one stroke; a second stroke without infeed only helps.',
  });
}

/**
 * What stays as spring once passes follow one another evenly.
 *
 * @param infeedMm - infeed on radius, mm.
 * @param fraction - cut fraction, over 0 and up to 1.
 * @returns lag, mm.
 * @source derived-spring
 * @example steadyLag(0.01, 0.5) // 0.01
 */
export function steadyLag(infeedMm: number, fraction: number): number {
  return (infeedMm * (1 - fraction)) / fraction;
}

/**
 * One pass: the spring it starts with and what is set in come together; part is cut, the rest springs.
 *
 * @param infeedMm - infeed on radius, mm; 0 when sparking out.
 * @param springMm - spring at the start, mm.
 * @param fraction - cut fraction.
 * @returns metal cut on radius and spring left, mm.
 */
export function takePass(
  infeedMm: number,
  springMm: number,
  fraction: number,
): { cutMm: number; springMm: number } {
  const pressed = infeedMm + springMm;
  return { cutMm: fraction * pressed, springMm: (1 - fraction) * pressed };
}

/**
 * Passes without infeed until the spring is down to what may stay.
 *
 * @param springMm - spring at the start, mm.
 * @param leftMm - spring that may stay, mm, over 0.
 * @param fraction - cut fraction, over 0 and up to 1.
 * @returns 0 when nothing needs to come out, 12 at most.
 * @source derived-spring
 * @example sparkOutPasses(0.02, 0.0005, 0.5) // 6
 */
export function sparkOutPasses(springMm: number, leftMm: number, fraction: number): number {
  if (springMm <= leftMm || fraction >= 1) return 0;
  const passes = Math.ceil(Math.log(leftMm / springMm) / Math.log(1 - fraction) - 1e-9);
  return Math.min(Math.max(passes, 0), MOST_SPARK_OUTS);
}

/**
 * The cut fraction after several turns at one setting: each takes the same share of what is left.
 *
 * @param oneTurn - cut fraction of one turn.
 * @param turns - turns at one setting, 1 or more.
 * @returns the cut fraction of all of them.
 */
export function fractionOverTurns(oneTurn: Figure, turns: number): Figure {
  return figure({
    unit: '1',
    formula: '{K} = 1 - (1 - {K_1})^{N}',
    source: 'derived-spring',
    terms: [
      termOf('K_1', 'cut fraction of one turn, over the whole width', oneTurn),
      term('N', 'turns of the work at each setting', [turns, '1']),
    ],
    compute: (fraction, count) => 1 - (1 - fraction) ** count,
  });
}
