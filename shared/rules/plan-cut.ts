import { cutFindings } from './cut-findings';
import { infeedFigure, lagFigure, traverseFigure } from './cut-figures';
import { planCut, type CutBasis, type CutPlan, type StageCutPlan } from './cut-plan';
import { planPasses, type Schedule, type StageFeed } from './schedule';
import { notNegative } from './surface';
import {
  overrun,
  secondsPerStroke,
  travel,
  traverseFindings,
  traverseRate,
  typedTraverse,
} from './traverse';
import type { Figure, Finding, Plan } from './types';

/** Spring that may stay after spark-out, mm, and as a share of the tolerance on diameter. */
const SPRING_LEFT_MM = 0.0005;
const SPRING_LEFT_SHARE = 1 / 20;

export interface CutOutcome {
  cut: CutPlan;
  schedule: Schedule | null;
  traverse: Plan['traverse'];
  infeed: Plan['infeed'];
  lag: Figure;
  finishLag: Figure;
  findings: Finding[];
}

/**
 * Traverse, infeed and passes of a setup.
 *
 * @param basis - the setup and what was worked out before.
 * @param latheRpm - lathe speed.
 * @returns figures, schedule and findings; null inside while something they need is missing.
 * @source mh31-1318
 * @example planCutOutcome(basis, latheRpm).schedule?.counts.rough
 */
export function planCutOutcome(basis: CutBasis, latheRpm: Figure): CutOutcome {
  const { input, surface } = basis;
  const widthMm = input.wheelData?.widthMm ?? null;
  const cut = planCut(basis);
  const rough = traverseFigure(
    cut.rough,
    cut.aims.rough,
    typedTraverse(input.cut.roughTraverseMmPerRev) !== null,
  );
  const finish = traverseFigure(
    cut.finish,
    cut.aims.finish,
    typedTraverse(input.cut.finishTraverseMmPerRev) !== null,
  );
  const past = overrun(widthMm, notNegative(input.cut.overrunMm));
  const distance = travel(surface.lengthMm, widthMm, past);
  const roughRate = traverseRate(rough, latheRpm);
  const seconds = secondsPerStroke(distance, roughRate);
  const schedule = scheduleOf(basis, cut);
  const lag = lagFigure(cut.rough);
  return {
    cut,
    schedule,
    traverse: {
      rough,
      finish,
      roughRate,
      finishRate: traverseRate(finish, latheRpm),
      overrun: past,
      travel: distance,
      secondsPerStroke: seconds,
      plunge: surface.lengthMm !== null && widthMm !== null && surface.lengthMm <= widthMm,
    },
    infeed: {
      rough: infeedFigure(cut.rough),
      finish: infeedFigure(cut.finish),
      roughDivisions: cut.rough?.setting.divisions ?? null,
      finishDivisions: cut.finish?.setting.divisions ?? null,
      governedBy: cut.rough?.by ?? null,
      compoundAngle: cut.finish?.setting.compoundAngle ?? cut.rough?.setting.compoundAngle ?? null,
    },
    lag,
    finishLag: lagFigure(cut.finish),
    findings: [
      ...traverseFindings({
        widthMm,
        inside: surface.side === 'inside',
        overrun: past,
        aims: cut.aims,
        rough,
        finish,
        byHand: cut.rough?.byHand ?? false,
        seconds,
      }),
      ...cutFindings({ cut, lag, schedule, stockMm: basis.stockMm, rules: input.rules }),
    ],
  };
}

function scheduleOf(basis: CutBasis, cut: CutPlan): Schedule | null {
  const { input, stockMm } = basis;
  if (stockMm === null || cut.finishStockMm === null || cut.dial === null) return null;
  const rough = stageFeed(cut.rough, cut.dial.divisionMm);
  const finish = stageFeed(cut.finish, cut.dial.divisionMm);
  if (rough === null || finish === null) return null;
  const tolerance = notNegative(input.work.toleranceMm);
  return planPasses({
    stockMm,
    finishStockMm: cut.finishStockMm,
    rough,
    finish,
    springLeftMm: Math.max(SPRING_LEFT_MM, (tolerance ?? 0) * SPRING_LEFT_SHARE),
    sparkOuts: notNegative(input.cut.sparkOutPasses),
  });
}

function stageFeed(stage: StageCutPlan | null, divisionMm: number): StageFeed | null {
  if (stage === null || stage.fraction.value === null) return null;
  const { infeedMm, stepMm, divisions } = stage.setting;
  return {
    infeedMm,
    stepMm,
    divisionMm: divisions === null ? null : divisionMm,
    cutFraction: stage.fraction.value,
  };
}
