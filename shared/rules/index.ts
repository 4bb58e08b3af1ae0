import type { PlanInput } from '../domain/setups';
import { cautionsFor } from './cautions';
import { clearanceFindings } from './clearance';
import { equivalentDiameter } from './contact';
import { unknown } from './cut-figures';
import { deepestWithoutBurn, specificEnergy } from './energy';
import { guardFindings } from './guard';
import { effectiveQuill } from './mandrel';
import { needsOf } from './needs';
import { planCutOutcome } from './plan-cut';
import { planSpeed } from './plan-speed';
import { cuttingForce, planPower } from './power-plan';
import { firstFrequency, quillStiffness, quillTaper, taperFindings, wheelMassKg } from './quill';
import { rotationFindings, workRotation } from './rotation';
import { postStiffness, stiffnessAtWheel, workStiffness } from './stiffness';
import { jawPlanOf, stockFindings, stockOf } from './stock';
import { notNegative, positive, surfaceOf } from './surface';
import { planTime } from './time';
import type { Plan } from './types';
import { unitFindings } from './unit-doubt';
import { verdictOf } from './verdict';
import { RULES_VERSION } from './version';
import { wheelFindings } from './wheel-checks';
import { planWorkSpeed, workSpeedFindings } from './work-speed';
import { isSteel } from './work-table';

export { assemblePlanInput, emptySetupInputs, typedWheelData, type Found } from './assemble';
export { CAUTIONS, type CautionId } from './cautions';
export { FINDINGS, findingWords, type FindingCode } from './findings';
export { orderOfWork, type WorkStep } from './order-of-work';
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
  const { operation, work, lathe, grinder, quill, wheelData: wheel } = input;
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
  const ownStiffness = quillStiffness(quill);
  const stiffness = stiffnessAtWheel({
    quill: ownStiffness,
    post: postStiffness(
      grinder?.postStiffnessNPerMm ?? null,
      input.rules.assumedPostStiffnessNPerMm,
    ),
    work: workStiffness(work, surface),
  });
  const energy = specificEnergy(work.material);
  const steel = work.material !== null && isSteel(work.material);
  const contact = equivalentDiameter(
    wheel?.diameterNowMm ?? null,
    surface.diameterMm,
    surface.side,
  );
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
      stiffness,
    },
    turning.latheRpm,
  );
  const load = {
    surface,
    energy,
    wheelSpeed: speed.wheelSpeed,
    forceRatio: input.rules.forceRatio,
  };
  const roughForce = cuttingForce(load, outcome.infeed.rough.value, outcome.traverse.roughRate);
  const finishForce = cuttingForce(load, outcome.infeed.finish.value, outcome.traverse.finishRate);
  const motorW = positive(grinder?.motorPowerW ?? null);
  const power = planPower({
    load,
    force: roughForce,
    infeedMm: outcome.infeed.rough.value,
    wheelMm: wheel?.diameterNowMm ?? null,
    workMPerMin: turning.workSpeed.value,
    availableW: motorW === null ? null : motorW * input.rules.powerShare,
    steel,
  });
  const direction = {
    side: surface.side,
    lathe,
    grinder,
    quill,
    workRotation: input.machine.workRotation,
  };
  const widthMm = wheel?.widthMm ?? null;
  const taper = quillTaper(quill, finishForce.normal.value, widthMm);
  const findings = [
    ...speed.findings,
    ...(wheel === null
      ? []
      : wheelFindings({
          wheel,
          quill,
          organicBond: null,
          typed: input.wheel.typed !== null,
          today: input.today,
        })),
    ...guardFindings({
      operation,
      grinder,
      shieldFitted: input.machine.shieldFitted,
      overrunMm: outcome.traverse.overrun.value,
      widthMm,
    }),
    ...rotationFindings(direction),
    ...(surface.side === 'inside'
      ? clearanceFindings({
          boreMm: surface.diameterMm,
          lengthMm: surface.lengthMm,
          overrunMm: outcome.traverse.overrun.value,
          clearDepthMm:
            operation === 'bore' && work.throughBore !== false
              ? null
              : notNegative(work.clearDepthMm),
          wheel,
          quill,
        })
      : []),
    ...stockFindings(input),
    ...workSpeedFindings(turning, surface.diameterMm),
    ...outcome.findings,
    ...power.findings,
    ...taperFindings(taper, work.toleranceMm),
    ...unitFindings(input),
  ];
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
      rotation: workRotation(direction),
    },
    traverse: outcome.traverse,
    infeed: outcome.infeed,
    stock,
    jaws,
    passes: outcome.schedule?.passes ?? [],
    cutFraction: {
      rough: outcome.cut.rough?.fraction ?? unknown('1', 'cut fraction'),
      finish: outcome.cut.finish?.fraction ?? unknown('1', 'cut fraction'),
    },
    dressing: null,
    quill: {
      stiffness: ownStiffness,
      stiffnessAtWheel: stiffness,
      lag: outcome.lag,
      firstFrequency: firstFrequency(quill, wheel === null ? null : wheelMassKg(wheel)),
      taper: taper,
    },
    power: power.power,
    time: planTime({
      schedule: outcome.schedule,
      travel: outcome.traverse.travel,
      rough: outcome.traverse.roughRate,
      finish: outcome.traverse.finishRate,
      strokes: input.cut.strokes,
      dressing: null,
    }),
  };
}
