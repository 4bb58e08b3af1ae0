import type { PlanInput } from '../domain/setups';
import { settle, type Dial, type Setting } from './dial';
import { finite } from './figures';
import { balanceCut, leastCap, type Cap } from './infeed';
import { expectedFraction } from './learning';
import { cutFraction, cuttingStiffness, fractionOverTurns } from './spring';
import { positive } from './sizes';
import type { Surface } from './surface';
import { feedAtMost } from './traverse';
import type { Figure } from './types';

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
  /** Width of wheel that cuts where it covers the surface without traverse, mm; null where it traverses. */
  plungeMm: number | null;
}

/** Infeed and traverse of one stage. */
export interface StageCutPlan {
  setting: Setting;
  /** The infeed before it was rounded to the dial, and what set it. */
  wantedMm: number;
  by: Cap['by'];
  typed: boolean;
  caps: Cap[];
  /** Traverse per work revolution; null where the wheel plunges. */
  traverseMm: number | null;
  byHand: boolean;
  /** Plunging: infeed for each turn of the work, mm, and turns until the wheel has caught up; else null. */
  plunge: { perTurnMm: number; turns: number } | null;
  fraction: Figure;
}

export interface StageAim {
  caps: Cap[];
  typedInfeedMm: number | null;
  typedTraverseMm: number | null;
  aimMm: number;
  leastMm: number;
  ceilingMm: number;
  /** The table's infeed for each turn of the work when plunging, mm. */
  plungePerTurnMm: number;
  dial: Dial | null;
}

/**
 * Infeed of one stage within its caps, and its traverse; or, where the wheel covers the surface, its infeed
 * for each turn of the work.
 *
 * @param basis - the setup and what was worked out before.
 * @param aim - caps, typed values and traverse aimed at, mm.
 * @returns the stage; null when nothing caps it.
 * @source derived-spring
 * @example planStage(basis, { caps: [{ by: 'shop', valueMm: 0.0125 }], typedInfeedMm: null, typedTraverseMm: null, aimMm: 1, leastMm: 0.5, ceilingMm: 0.05, plungePerTurnMm: 0.001, dial: dialOf(lathe) })?.setting.infeedMm // 0.0125 mm
 */
export function planStage(basis: CutBasis, aim: StageAim): StageCutPlan | null {
  const cap: Cap | null =
    aim.typedInfeedMm === null ? leastCap(aim.caps) : { by: 'typed', valueMm: aim.typedInfeedMm };
  if (cap === null) return null;
  return basis.plungeMm === null
    ? traversing(basis, aim, cap)
    : plunging({ ...basis, plungeMm: basis.plungeMm }, aim, cap);
}

function traversing(basis: CutBasis, aim: StageAim, cap: Cap): StageCutPlan {
  const feeds = basis.surface.slide === 'compound' ? [] : (basis.input.lathe?.feedsMmPerRev ?? []);
  const limits = { ...cutEffects(basis), lagLimitMm: basis.input.rules.lagLimitMm };
  const typed = aim.typedTraverseMm;
  const asked = typed ?? feedAtMost(feeds, aim.aimMm).mmPerRev;
  const { traverseMm } = balanceCut(
    cap,
    { aimMm: asked, leastMm: aim.leastMm, fixed: typed !== null },
    limits,
  );
  const feed = typed === null ? feedAtMost(feeds, traverseMm) : { mmPerRev: typed, byHand: false };
  // The infeed is judged at the feed that is there, which may be finer than the one aimed at.
  const balanced = balanceCut(
    cap,
    { aimMm: feed.mmPerRev, leastMm: feed.mmPerRev, fixed: true },
    limits,
  );
  return {
    ...settled(aim, balanced),
    traverseMm: feed.mmPerRev,
    byHand: feed.byHand,
    plunge: null,
    fraction: fractionAt(basis, feed.mmPerRev),
  };
}

/** Here lag and power depend on the infeed for each turn, and turns go by until the setting is cut. */
function plunging(basis: CutBasis & { plungeMm: number }, aim: StageAim, cap: Cap): StageCutPlan {
  const effects = cutEffects(basis);
  const perTurn = balanceCut(
    { by: 'table', valueMm: aim.plungePerTurnMm },
    { aimMm: basis.plungeMm, leastMm: basis.plungeMm, fixed: true },
    { ...effects, lagLimitMm: basis.input.rules.lagLimitMm },
  );
  const stage = settled(aim, { infeedMm: cap.valueMm, by: cap.by });
  const turns = Math.max(Math.ceil(stage.setting.infeedMm / perTurn.infeedMm - 1e-9), 1);
  return {
    ...stage,
    traverseMm: null,
    byHand: false,
    plunge: { perTurnMm: perTurn.infeedMm, turns },
    fraction: fractionOverTurns(fractionAt(basis, basis.plungeMm), turns),
  };
}

function settled(aim: StageAim, cut: { infeedMm: number; by: Cap['by'] }) {
  const typed = aim.typedInfeedMm !== null;
  const wantedMm = aim.typedInfeedMm ?? cut.infeedMm;
  const setting = settle(wantedMm, aim.ceilingMm, aim.dial);
  const by: Cap['by'] = typed ? 'typed' : setting.compoundAngle !== null ? 'dial' : cut.by;
  return { setting, wantedMm, by, typed, caps: aim.caps };
}

function fractionAt(basis: CutBasis, traverseMm: number): Figure {
  const learned = positive(basis.input.cut.softnessPerMm);
  if (learned !== null)
    return expectedFraction(learned, {
      traverseMm,
      workMPerS: perSecond(basis.workMPerMin),
      wheelMPerS: basis.wheelMPerS,
    });
  return cutFraction(basis.stiffness, {
    energy: basis.energy,
    workMPerS: perSecond(basis.workMPerMin),
    wheelMPerS: basis.wheelMPerS,
    traverseMm,
    forceRatio: basis.input.rules.forceRatio,
  });
}

/** Lag and power both grow with infeed times traverse; what they are for one square millimetre of it. */
function cutEffects(basis: CutBasis) {
  const { energy, wheelMPerS, workMPerMin, latheRpm, surface, input, stiffness } = basis;
  const motorW = positive(input.grinder?.motorPowerW ?? null);
  const work = perSecond(workMPerMin);
  const depth = surface.depthPerInfeed ?? 1;
  const learned = positive(input.cut.softnessPerMm);
  return {
    lagPerMm2:
      wheelMPerS === null || work === null
        ? null
        : learned !== null
          ? finite((depth * learned * work) / wheelMPerS)
          : energy === null || stiffness.value === null
            ? null
            : finite(
                (depth *
                  cuttingStiffness({
                    energy,
                    workMPerS: work,
                    wheelMPerS,
                    traverseMm: 1,
                    forceRatio: input.rules.forceRatio,
                  })) /
                  stiffness.value,
              ),
    wattsPerMm2:
      energy === null || latheRpm === null || surface.diameterMm === null
        ? null
        : finite((depth * energy * Math.PI * surface.diameterMm * latheRpm) / SECONDS),
    availableWatts: motorW === null ? null : motorW * input.rules.powerShare,
    burnMm: basis.burnMm,
  };
}

function perSecond(perMin: number | null): number | null {
  return perMin === null ? null : perMin / SECONDS;
}
