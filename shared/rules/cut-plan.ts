import type { PlanInput } from '../domain/setups';
import { dialOf, settle, type Dial, type Setting } from './dial';
import { finite } from './figures';
import { balanceCut, infeedCaps, leastCap, type Cap } from './infeed';
import { cutFraction, cuttingStiffness } from './spring';
import { positive, type Surface } from './surface';
import { feedAtMost, traverseAims, type TraverseAims } from './traverse';
import type { Figure } from './types';
import { workRow, type WorkRow } from './work-table';

const SECONDS = 60;

/** What the cut is worked out from, as far as it is known. */
export interface CutBasis {
  input: PlanInput;
  surface: Surface;
  stockMm: number | null;
  /** Mean specific energy, J/mm3. */
  energy: number | null;
  /** The deepest dry infeed under the burning threshold, mm. */
  burnMm: number | null;
  wheelMPerS: number | null;
  workMPerMin: number | null;
  latheRpm: number | null;
  stiffness: Figure;
}

/** Infeed and traverse of one stage. */
export interface StageCutPlan {
  setting: Setting;
  /** The infeed before it was rounded to the dial, and what set it. */
  wantedMm: number;
  by: Cap['by'];
  typed: boolean;
  caps: Cap[];
  traverseMm: number;
  byHand: boolean;
  fraction: Figure;
}

export interface CutPlan {
  dial: Dial | null;
  row: WorkRow | null;
  aims: TraverseAims;
  finishStockMm: number | null;
  rough: StageCutPlan | null;
  finish: StageCutPlan | null;
}

/**
 * Infeed and traverse of both stages: suggested within every cap, or as typed.
 *
 * @param basis - the setup and what was worked out before; null where unknown.
 * @returns rough and finish, null while material or wheel is unknown.
 * @source mh31-1318
 * @example planCut(basis).rough?.setting.divisions
 */
export function planCut(basis: CutBasis): CutPlan {
  const { input, stockMm } = basis;
  const { rules, cut, wheelData, work, lathe } = input;
  const row = work.material === null ? null : workRow(work.material);
  const widthMm = wheelData?.widthMm ?? null;
  const aims = traverseAims(widthMm, work.material, {
    rough: rules.roughTraverseShare,
    finish: rules.finishTraverseShare,
  });
  const dial = dialOf(lathe);
  const kept = positive(cut.finishStockMm) ?? rules.finishStockMm;
  const finishStockMm = stockMm === null ? null : Math.min(kept, stockMm);
  const known = { dial, row, aims, finishStockMm };
  if (row === null || aims.rough.value === null || aims.finish.value === null)
    return { ...known, rough: null, finish: null };

  const roughStockMm = stockMm === null || finishStockMm === null ? null : stockMm - finishStockMm;
  const roughCaps = infeedCaps(row, {
    roughStockMm,
    interrupted: basis.surface.interrupted,
    rules,
    burnMm: basis.burnMm,
  });
  const rough = planStage(basis, {
    caps: roughCaps,
    typedInfeedMm: positive(cut.roughInfeedMm),
    typedTraverseMm: positive(cut.roughTraverseMmPerRev),
    aimMm: aims.rough.value,
    leastMm: Math.min(aims.finish.value, aims.rough.value),
    ceilingMm: row.roughInfeedMm,
    dial,
  });
  const finishCaps: Cap[] = [
    { by: 'table', valueMm: row.finishInfeedMm.high },
    { by: 'shop', valueMm: rules.finishInfeedMm },
    ...(basis.burnMm === null ? [] : [{ by: 'burn' as const, valueMm: basis.burnMm }]),
  ];
  const finish = planStage(basis, {
    caps: finishCaps,
    typedInfeedMm: positive(cut.finishInfeedMm),
    typedTraverseMm: positive(cut.finishTraverseMmPerRev),
    aimMm: aims.finish.value,
    leastMm: aims.finish.value,
    ceilingMm: row.finishInfeedMm.high,
    dial,
  });
  return { ...known, rough, finish };
}

interface StageAim {
  caps: Cap[];
  typedInfeedMm: number | null;
  typedTraverseMm: number | null;
  aimMm: number;
  leastMm: number;
  ceilingMm: number;
  dial: Dial | null;
}

function planStage(basis: CutBasis, aim: StageAim): StageCutPlan | null {
  const { input } = basis;
  const cap: Cap | null =
    aim.typedInfeedMm === null ? leastCap(aim.caps) : { by: 'typed', valueMm: aim.typedInfeedMm };
  if (cap === null) return null;
  const feeds = input.lathe?.feedsMmPerRev ?? [];
  const asked = aim.typedTraverseMm ?? feedAtMost(feeds, aim.aimMm).mmPerRev;
  const balanced = balanceCut(
    cap,
    { aimMm: asked, leastMm: aim.leastMm, fixed: aim.typedTraverseMm !== null },
    { ...cutEffects(basis), lagLimitMm: input.rules.lagLimitMm },
  );
  const feed =
    aim.typedTraverseMm === null
      ? feedAtMost(feeds, balanced.traverseMm)
      : { mmPerRev: aim.typedTraverseMm, byHand: false };
  const wantedMm = aim.typedInfeedMm ?? balanced.infeedMm;
  const setting = settle(wantedMm, aim.ceilingMm, aim.dial);
  const rounded = setting.compoundAngle !== null && aim.typedInfeedMm === null;
  return {
    setting,
    wantedMm,
    by: aim.typedInfeedMm !== null ? 'typed' : rounded ? 'dial' : balanced.by,
    typed: aim.typedInfeedMm !== null,
    caps: aim.caps,
    traverseMm: feed.mmPerRev,
    byHand: feed.byHand,
    fraction: cutFraction(basis.stiffness, {
      energy: basis.energy,
      workMPerS: perSecond(basis.workMPerMin),
      wheelMPerS: basis.wheelMPerS,
      traverseMm: feed.mmPerRev,
      forceRatio: input.rules.forceRatio,
    }),
  };
}

/** Lag and power both grow with infeed times traverse; what they are for one square millimetre of it. */
function cutEffects(basis: CutBasis) {
  const { energy, wheelMPerS, workMPerMin, latheRpm, surface, input, stiffness } = basis;
  const motorW = positive(input.grinder?.motorPowerW ?? null);
  const work = perSecond(workMPerMin);
  return {
    lagPerMm2:
      energy === null || wheelMPerS === null || work === null || stiffness.value === null
        ? null
        : finite(
            cuttingStiffness({
              energy,
              workMPerS: work,
              wheelMPerS,
              traverseMm: 1,
              forceRatio: input.rules.forceRatio,
            }) / stiffness.value,
          ),
    wattsPerMm2:
      energy === null || latheRpm === null || surface.diameterMm === null
        ? null
        : finite((energy * Math.PI * surface.diameterMm * latheRpm) / SECONDS),
    availableWatts: motorW === null ? null : motorW * input.rules.powerShare,
    burnMm: basis.burnMm,
  };
}

function perSecond(perMin: number | null): number | null {
  return perMin === null ? null : perMin / SECONDS;
}
