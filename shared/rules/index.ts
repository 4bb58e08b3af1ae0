import type { PlanInput } from '../domain/setups';
import { cautionsFor } from './cautions';
import { equivalentDiameter } from './contact';
import { shrinkage } from './cooling';
import { unknown } from './cut-figures';
import { planDressing } from './dressing';
import { deepestWithoutBurn, specificEnergy } from './energy';
import { effectiveQuill } from './mandrel';
import { needsOf } from './needs';
import { inputFindings } from './plan-checks';
import { planCutOutcome } from './plan-cut';
import { planHeight } from './plan-height';
import { planQuill, stiffnessOf } from './plan-quill';
import { planSpeed } from './plan-speed';
import { planTaper } from './plan-taper';
import { cuttingForce, planPower } from './power-plan';
import { workRotation } from './rotation';
import { jawPlanOf, stockOf } from './stock';
import { notNegative, positive } from './sizes';
import { squareTo, surfaceOf } from './surface';
import { tailstockCorrection } from './taper';
import { planTime } from './time';
import type { Plan } from './types';
import { byGravity, verdictOf } from './verdict';
import { RULES_VERSION } from './version';
import { markingOf } from './bond';
import { planWorkSpeed, workSpeedFindings } from './work-speed';
import { isSteel } from './work-table';

export { completeInputs, emptySetupInputs } from '../domain/setup-defaults';
export { assemblePlanInput, typedWheelData } from './assemble';
export { CAUTIONS } from './cautions';
export { FINDINGS, findingWords, type FindingCode } from './findings';
export { orderOfWork } from './order-of-work';
export { kindOf } from './surface';
export { quickCheck, type QuickCheck, type QuickCheckInput } from './quick-check';
export type * from './types';
export type { PlanInput } from '../domain/setups';
export { RULES_VERSION } from './version';

/**
 * Plans a grinding setup: speeds and their limits, work speed, traverse, infeed pass by pass, what the quill
 * does, time, and the verdict with all that speaks for it.
 *
 * Pure, and never in doubt of its own input: what is missing is named in `needs` and leaves null figures,
 * what is wrong is a finding. It throws for nothing that a person can type.
 *
 * @param given - the setup with its machines and wheel, SI numbers in the unit of their name.
 * @returns the plan; its figures are null or finite, unrounded unless their working says otherwise.
 * @source none: each part names its own
 * @example planSetup(planInput).verdict // 'clear'
 */
export function planSetup(given: PlanInput): Plan {
  const input = { ...given, quill: effectiveQuill(given.quill, given.wheelData) };
  const { work, lathe, grinder, quill, wheelData: wheel } = input;
  const surface = surfaceOf(input);
  const speed = planSpeed(input);
  const jaws = jawPlanOf(input);
  const stock = stockOf(input, jaws);
  const turning = planWorkSpeed({
    material: work.material,
    diameterMm: surface.diameterMm,
    wheelMPerS: speed.wheelSpeed.value,
    lathe,
    typedRpm: input.cut.latheRpm,
  });
  const energy = specificEnergy(work.material);
  const steel = work.material !== null && isSteel(work.material);
  const wheelMm = wheel?.diameterNowMm ?? null;
  const contact = equivalentDiameter(wheelMm, surface.contactDiameterMm, surface.side);
  const stiffness = stiffnessOf(input, surface);
  const outcome = planCutOutcome(
    {
      input,
      surface,
      stockMm: stock.value,
      energy: energy.value,
      burnMm: steel
        ? deepestWithoutBurn(energy.value, contact.value, turning.workSpeed.value)
        : null,
      wheelMPerS: speed.wheelSpeed.value,
      workMPerMin: turning.workSpeed.value,
      latheRpm: turning.latheRpm.value,
      stiffness: stiffness.atWheel,
      plungeMm: plungeWidth(surface.lengthMm, wheel?.widthMm ?? null),
    },
    turning.latheRpm,
  );
  const load = {
    surface,
    energy,
    wheelSpeed: speed.wheelSpeed,
    forceRatio: input.rules.forceRatio,
  };
  const power = planPower({
    load,
    contact,
    removal: outcome.removal.rough,
    infeedMm: squareTo(surface, (outcome.infeed.perTurn?.rough ?? outcome.infeed.rough).value),
    workMPerMin: turning.workSpeed.value,
    motorW: grinder?.motorPowerW ?? null,
    share: input.rules.powerShare,
    steel,
  });
  const bent = planQuill(input, {
    stiffness,
    lag: outcome.lag,
    finishForce: cuttingForce(load, outcome.removal.finish).normal,
  });
  const { rough, finish, diamond, ...dressing } = planDressing({
    dress: input.dress,
    rules: input.rules,
    marking: markingOf(wheel?.marking ?? null),
    dry: true,
    wheelMPerS: speed.wheelSpeed.value,
    diameterMm: wheel?.diameterNewMm ?? null,
    widthMm: wheel?.widthMm ?? null,
    spindle: speed.spindleRpm,
  });
  const directions = {
    side: surface.side,
    lathe,
    grinder,
    quill,
    workRotation: input.machine.workRotation,
  };
  const cone = planTaper(input, {
    surface,
    overrun: outcome.traverse.overrun,
    traverse: outcome.traverse.rough,
    latheRpm: turning.latheRpm,
  });
  const high = planHeight({
    belowMm: input.machine.belowCentreMm,
    surface,
    wheelMm,
    grinder,
  });
  const findings = byGravity([
    ...speed.findings,
    ...inputFindings(input, {
      surface,
      overrun: outcome.traverse.overrun,
      turning: directions,
    }),
    ...cone.findings,
    ...high.findings,
    ...workSpeedFindings(turning, surface.diameterMm, input.rules),
    ...outcome.findings,
    ...power.findings,
    ...bent.findings,
    ...dressing.findings,
  ]);
  const needs = needsOf(input);
  return {
    rulesVersion: RULES_VERSION,
    verdict: verdictOf(findings, needs),
    needs,
    findings,
    cautions: cautionsFor(input),
    speed: {
      steps: speed.steps,
      chosen: speed.chosen?.id ?? null,
      suggested: speed.suggested,
      spindleRpm: speed.spindleRpm,
      wheelSpeed: speed.wheelSpeed,
      speedRatio: turning.ratio,
    },
    limits: speed.limits,
    work: {
      targetSpeed: turning.target,
      latheRpm: turning.latheRpm,
      workSpeed: turning.workSpeed,
      steps: turning.steps,
      rotation: workRotation(directions),
    },
    traverse: outcome.traverse,
    infeed: outcome.infeed,
    stock,
    jaws,
    taper: cone.taper,
    height: high.height,
    measuring: {
      shrinkage: shrinkage(
        steel ? surface.diameterMm : null,
        notNegative(work.warmerK),
        input.rules,
      ),
      tailstockMove: tailstockCorrection(
        {
          firstMm: positive(work.headEndMm),
          secondMm: positive(work.tailEndMm),
          apartMm: positive(work.endsApartMm),
        },
        positive(work.unsupportedLengthMm),
      ),
    },
    passes: outcome.schedule?.passes ?? [],
    cutFraction: {
      rough: outcome.cut.rough?.fraction ?? unknown('1', 'cut fraction'),
      finish: outcome.cut.finish?.fraction ?? unknown('1', 'cut fraction'),
    },
    dressing: { rough, finish, diamond },
    quill: bent.quill,
    power: power.power,
    time: planTime({
      schedule: outcome.schedule,
      passSeconds: outcome.passSeconds,
      dressing: { rough, finish },
    }),
  };
}

/** The wheel plunges where the surface is no wider than the wheel. */
function plungeWidth(lengthMm: number | null, widthMm: number | null): number | null {
  return lengthMm !== null && widthMm !== null && lengthMm <= widthMm ? lengthMm : null;
}
