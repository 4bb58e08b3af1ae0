import { cutFindings } from './cut-findings';
import { plungeRemovalRate, removalRate, wheelWear } from './contact';
import {
  infeedFigure,
  lagFigure,
  perTurnFigure,
  secondsPerSetting,
  traverseFigure,
} from './cut-figures';
import { planCut, type CutPlan } from './cut-plan';
import type { CutBasis, StageCutPlan } from './cut-stage';
import { squareTo } from './surface';
import { planPasses, type Schedule, type StageFeed } from './schedule';
import { notNegative, positive } from './sizes';
import { secondsPerPass, strokesPerPass } from './time';
import {
  overrun,
  overrunOfPlunge,
  secondsPerStroke,
  travel,
  traverseFindings,
  traverseRate,
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
  /** Metal removed each second. */
  removal: { rough: Figure; finish: Figure };
  /** Seconds of one pass. */
  passSeconds: { rough: Figure; finish: Figure };
  lag: Figure;
  findings: Finding[];
}

/**
 * Traverse, infeed and passes of a setup.
 *
 * @param basis - the setup and what was worked out before.
 * @param latheRpm - lathe speed.
 * @returns figures, schedule and findings; null inside while something they need is missing.
 * @source mh31-1318
 * @example planCutOutcome(basis, plan.work.latheRpm).schedule?.counts.rough // 14
 */
export function planCutOutcome(basis: CutBasis, latheRpm: Figure): CutOutcome {
  const { input, surface, stockMm } = basis;
  const cut = planCut(basis);
  const traverse = traverseOf(basis, cut, latheRpm);
  const schedule = scheduleOf(basis, cut);
  const lag = lagFigure(cut.rough, surface);
  const strokes = strokesPerPass(input.cut.strokes);
  return {
    cut,
    schedule,
    traverse,
    infeed: infeedOf(basis, cut),
    removal: {
      rough: removalOf(basis, cut.rough, traverse.roughRate),
      finish: removalOf(basis, cut.finish, traverse.finishRate),
    },
    passSeconds: {
      rough: passSeconds(traverse, traverse.roughRate, { stage: cut.rough, latheRpm, strokes }),
      finish: passSeconds(traverse, traverse.finishRate, { stage: cut.finish, latheRpm, strokes }),
    },
    lag,
    findings: [
      ...traverseFindings({
        widthMm: input.wheelData?.widthMm ?? null,
        inside: surface.side === 'inside',
        aims: cut.aims,
        byHand: surface.slide === 'carriage' && (cut.rough?.byHand ?? false),
        traverse,
      }),
      ...cutFindings({ cut, lag, schedule, stockMm, slide: surface.slide, rules: input.rules }),
    ],
  };
}

function traverseOf(basis: CutBasis, cut: CutPlan, latheRpm: Figure): Plan['traverse'] {
  const { input, surface, plungeMm } = basis;
  const widthMm = input.wheelData?.widthMm ?? null;
  const typed = (mm: number | null) => positive(mm) !== null;
  const rough = traverseFigure(cut.rough, cut.aims.rough, typed(input.cut.roughTraverseMmPerRev));
  const finish = traverseFigure(
    cut.finish,
    cut.aims.finish,
    typed(input.cut.finishTraverseMmPerRev),
  );
  const past =
    plungeMm === null
      ? overrun(widthMm, notNegative(input.cut.overrunMm))
      : overrunOfPlunge(widthMm, plungeMm);
  const distance = travel(surface.lengthMm, widthMm, past, surface.shoulders);
  const roughRate = traverseRate(rough, latheRpm);
  return {
    rough,
    finish,
    roughRate,
    finishRate: traverseRate(finish, latheRpm),
    overrun: past,
    travel: distance,
    secondsPerStroke:
      plungeMm === null
        ? secondsPerStroke(distance, roughRate)
        : secondsPerSetting(cut.rough, latheRpm),
    plunge: plungeMm !== null,
  };
}

function infeedOf(basis: CutBasis, { rough, finish }: CutPlan): Plan['infeed'] {
  const { input, surface, plungeMm } = basis;
  return {
    rough: infeedFigure(rough),
    finish: infeedFigure(finish),
    perTurn:
      plungeMm === null ? null : { rough: perTurnFigure(rough), finish: perTurnFigure(finish) },
    roughDivisions: rough?.setting.divisions ?? null,
    finishDivisions: finish?.setting.divisions ?? null,
    governedBy: rough?.by ?? null,
    compoundAngle: finish?.setting.compoundAngle ?? rough?.setting.compoundAngle ?? null,
    wheelWear: wheelWear({
      infeedMm: depthOf(rough, surface),
      workMm: surface.diameterMm,
      lengthMm: surface.lengthMm,
      wheelMm: input.wheelData?.diameterNowMm ?? null,
      widthMm: input.wheelData?.widthMm ?? null,
      ratio: input.rules.grindingRatio,
    }),
  };
}

function removalOf(
  { surface, plungeMm, latheRpm }: CutBasis,
  stage: StageCutPlan | null,
  rate: Figure,
): Figure {
  const { diameterMm } = surface;
  const perTurnMm = stage?.plunge?.perTurnMm ?? null;
  return plungeMm === null
    ? removalRate(diameterMm, depthOf(stage, surface), rate.value)
    : plungeRemovalRate({
        workMm: diameterMm,
        widthMm: plungeMm,
        infeedMmPerRev: squareTo(surface, perTurnMm),
        workRpm: latheRpm,
      });
}

function passSeconds(
  { travel: distance, plunge }: Plan['traverse'],
  rate: Figure,
  pass: { stage: StageCutPlan | null; latheRpm: Figure; strokes: number },
): Figure {
  return plunge
    ? secondsPerSetting(pass.stage, pass.latheRpm)
    : secondsPerPass(secondsPerStroke(distance, rate), pass.strokes);
}

/** Depth of cut of a stage, square to the surface. */
function depthOf(stage: StageCutPlan | null, surface: CutBasis['surface']): number | null {
  return squareTo(surface, stage?.setting.infeedMm ?? null);
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
