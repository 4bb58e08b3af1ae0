import type { GrinderData, QuillData } from '../domain/machines';
import type { ShopRules } from '../domain/shop-rules';
import type { WheelData } from '../domain/wheels';
import { planBeltSteps } from './belt-steps';
import { quantity } from './figures';
import { limitRpm, speedLimits } from './limits';
import { effectiveQuill } from './mandrel';
import type { BeltStepPlan, SpeedLimit } from './types';
import { fitFindings } from './wheel-checks';
import { refuse, type StepRefusal } from './wheel-step-words';

export interface Spindle {
  grinder: GrinderData;
  quill: QuillData;
}

export interface SpindleUse {
  /** Why the wheel does not go on it, or must not turn on it at any belt step; null where it may. */
  refusal: StepRefusal | null;
  /** The lowest limit in force. */
  governing: SpeedLimit;
  steps: BeltStepPlan[];
  suggested: string | null;
}

/**
 * Whether a wheel goes on a spindle, and which of its belt steps it may be turned at. It speaks of fit and
 * speed alone: whether the wheel may be used at all is for its findings to say.
 *
 * @param wheel - the wheel, mm, rpm and m/s.
 * @param spindle - grinder and quill or arbor.
 * @param rules - the shop's.
 * @returns limits in whole rpm, rounded down; belt steps in the order recorded.
 * @source osha-1910-215-d1
 * @example spindleUse(wheel, { grinder, quill }, rules).refusal // null
 */
export function spindleUse(
  wheel: WheelData,
  { grinder, quill }: Spindle,
  rules: ShopRules,
): SpindleUse {
  const all = speedLimits({ wheel, quill: effectiveQuill(quill, wheel), grinder, rules });
  const [governing] = all;
  if (governing === undefined) throw new RangeError('A wheel always sets a limit of its own.');
  const { rows, suggested } = planBeltSteps(grinder, wheel.diameterNowMm, {
    all,
    wheelKnown: true,
  });
  const [misfit] = fitFindings(wheel, quill.seatDiameterMm);
  const tooFast = rows.every(({ allowed }) => allowed !== true)
    ? refuse('no-step-within-limit', { figures: { limit: quantity(limitRpm(governing), 'rpm') } })
    : null;
  return { refusal: misfit ?? tooFast, governing, steps: rows, suggested };
}
