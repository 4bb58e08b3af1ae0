import type { UnitSystem } from '@/shared/domain/people';
import type { BeltStepPlan, SpeedLimit } from '@/shared/rules/types';
import { formatQuantity, type FormatOptions } from '@/shared/units/format';

const DASH = '–';

/** Whose limit it is, in "above the wheel’s 14 921", and where it comes from. */
const LIMIT_WORDS: Record<SpeedLimit['kind'], { whose: string; by: string }> = {
  'marked rpm': { whose: 'the wheel’s', by: 'by the marking' },
  'marked speed': { whose: 'the wheel’s', by: 'by the marking' },
  unmarked: { whose: 'the wheel’s', by: 'the wheel is unmarked' },
  'maker, mounted': { whose: 'its maker’s', by: 'by the maker' },
  'quill marked': { whose: 'the quill’s', by: 'by the quill’s marking' },
  'quill bending': { whose: 'the quill’s', by: 'by the quill’s bending' },
  'grinder spindle': { whose: 'the grinder’s', by: 'by the grinder’s spindle' },
};

const rpm = (value: number | null, units: UnitSystem, options: FormatOptions) =>
  value === null ? DASH : formatQuantity({ value, unit: 'rpm' }, units, options);

/** Rounded up, so that it never reads as equal to a limit it breaks. */
export const stepRpm = (step: BeltStepPlan, units: UnitSystem) =>
  rpm(step.rpm.value, units, { rounding: 'up' });

export const stepSpeed = (step: BeltStepPlan, units: UnitSystem) =>
  step.wheelSpeed.value === null
    ? 'wheel speed not known yet'
    : formatQuantity({ value: step.wheelSpeed.value, unit: step.wheelSpeed.unit }, units, {
        fixed: true,
      });

/** "limit 14 921 rpm, by the marking" */
export function limitWords(limit: SpeedLimit | null, units: UnitSystem): string {
  if (limit === null || limit.rpm.value === null) return 'limit not known yet';
  return `limit ${rpm(limit.rpm.value, units, { rounding: 'down' })}, ${LIMIT_WORDS[limit.kind].by}`;
}

/** Why a step cannot be chosen; null when it can, or while no limit is known. */
export function lockedBecause(
  step: BeltStepPlan,
  limit: SpeedLimit | null,
  units: UnitSystem,
): string | null {
  if (step.allowed !== false || limit === null) return null;
  if (limit.kind === 'unmarked') return 'Locked out: an unmarked wheel does not run.';
  const most = rpm(limit.rpm.value, units, { rounding: 'down', withUnit: false });
  return `Locked out: ${stepRpm(step, units)} is above ${LIMIT_WORDS[limit.kind].whose} ${most}.`;
}

/** A row as it is spoken: "E, 15 438 rpm, 25.9 m/s. Locked out: …" */
export function stepSpoken(step: BeltStepPlan, reason: string | null, units: UnitSystem): string {
  const figures = `${step.name}, ${stepRpm(step, units)}, ${stepSpeed(step, units)}`;
  if (reason !== null) return `${figures}. ${reason}`;
  return step.actsSoft ? `${figures}, acts soft` : figures;
}
