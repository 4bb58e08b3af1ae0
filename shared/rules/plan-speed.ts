import type { PlanInput } from '../domain/setups';
import { beltStepFindings, planBeltSteps, wheelSpeedFindings } from './belt-steps';
import { unknown } from './cut-figures';
import { finding } from './findings';
import { limitRpm, speedLimits } from './limits';
import { wheelSpeed } from './speed';
import type { BeltStepPlan, Figure, Finding, Plan, SpeedLimit } from './types';

export interface SpeedPlan {
  chosen: BeltStepPlan | null;
  steps: BeltStepPlan[];
  suggested: string | null;
  spindleRpm: Figure;
  wheelSpeed: Figure;
  limits: Plan['limits'];
  findings: Finding[];
}

/**
 * Spindle speed and wheel speed of the chosen belt step, and every limit in force.
 *
 * @param input - the setup.
 * @returns the chosen step (also when it is too fast), all steps, the limits lowest first, and findings.
 * @source osha-1910-215-d1
 * @example planSpeed(planInput).limits.governing?.kind // 'marked rpm'
 */
export function planSpeed(input: PlanInput): SpeedPlan {
  const { grinder, quill, wheelData: wheel, rules } = input;
  const typedUnmarked =
    input.wheel.typed !== null &&
    input.wheel.typed.markedRpm === null &&
    input.wheel.typed.markedSpeedMPerS === null;
  const counted = typedUnmarked ? null : wheel;
  const all = speedLimits({ wheel: counted, quill, grinder, rules });
  const lowest = all[0];
  const belt = planBeltSteps(grinder, wheel?.diameterNowMm ?? null, {
    all,
    wheelKnown: counted !== null,
  });
  const chosen = belt.rows.find(({ id }) => id === input.machine.beltStepId) ?? null;
  const speed = chosen?.wheelSpeed ?? wheelSpeed(wheel?.diameterNowMm ?? null, null);
  return {
    chosen,
    steps: belt.rows,
    suggested: belt.suggested,
    spindleRpm: chosen?.rpm ?? unknown('rpm', 'spindle speed'),
    wheelSpeed: speed,
    limits: { governing: counted === null ? null : (lowest ?? null), all },
    findings: [
      ...beltStepFindings(belt, chosen, withFigure(lowest)),
      ...wheelSpeedFindings(speed),
      ...(grinder !== null && grinder.spindleMaximumRpm === null
        ? [finding('spindle-maximum-not-stated')]
        : []),
    ],
  };
}

/** A wheel without any marking has a finding of its own; no step need be blamed for it. */
function withFigure(limit: SpeedLimit | undefined): SpeedLimit | undefined {
  return limit !== undefined && limitRpm(limit) > 0 ? limit : undefined;
}
