import type { Grinder } from '@/shared/contracts/machines';
import type { Actor } from '@/shared/domain/appointments';
import type { UnitSystem } from '@/shared/domain/people';
import type { OnSpindle, WheelEntry } from '@/shared/domain/wheel-life';
import type { WheelRecord } from '@/shared/domain/wheels';
import { foldWheelLife } from '@/shared/rules/wheel-life';
import { appointedTasks } from '@/shared/rules/wheel-signatures';
import type { Spindle } from '@/shared/rules/wheel-spindles';
import { stepRefusalWords, type StepRefusal } from '@/shared/rules/wheel-step-words';
import type { StepCase } from '@/shared/rules/wheel-steps';
import { formatQuantity } from '@/shared/units/format';

import { Refusal } from '../refusals';
import { dateIn } from '../setups/planning';
import type { ShopScope } from '../shop-scope';
import { existing } from '../stored-items';

/** What of the shop a step of a wheel's life is judged by. */
export interface CaseReader {
  actor: Actor;
  /** ISO date of the shop. */
  today: string;
  units: UnitSystem;
  grinders: Grinder[];
  of(life: { wheel: WheelRecord; entries: WheelEntry[]; happenedOn: string }): StepCase;
}

export async function casesOf(scope: ShopScope, now: Date): Promise<CaseReader> {
  const { timeZone, units, rules } = await existing(scope.shop.find());
  const today = dateIn(timeZone, now);
  const grinders = await scope.grinders.list();
  const { personId, role } = scope;
  const tasks = appointedTasks(await scope.appointments.of(personId), personId, today);
  const actor = { personId, role, tasks };
  return {
    actor,
    today,
    units,
    grinders,
    of: (life) => {
      const standing = foldWheelLife(life.wheel, life.entries);
      const spindle = spindleOf(standing.onSpindle, grinders);
      return { ...life, standing, actor, today, rules, spindle };
    },
  };
}

/** Null also for a quill that is retired since: what it allowed is no longer known. */
function spindleOf(on: OnSpindle | null, grinders: readonly Grinder[]): Spindle | null {
  const grinder = grinders.find(({ id }) => id === on?.grinderId);
  const quill = grinder?.quills.find(({ id }) => id === on?.quillId);
  return grinder && quill ? { grinder: grinder.data, quill: quill.data } : null;
}

export const refusalView = (refusal: StepRefusal, units: UnitSystem) => ({
  code: refusal.code,
  words: stepRefusalWords(refusal, (quantity) => formatQuantity(quantity, units)),
});

/** What hangs on who asks, and not on the wheel. */
const OF_THE_PERSON: readonly string[] = [
  'role',
  'lead-returns',
  'lead-unscraps',
  'not-skilled',
  'not-appointed',
  'own-entry',
  'others-entry',
] satisfies StepRefusal['code'][];

export function stepForbidden(refusal: StepRefusal, units: UnitSystem): Refusal {
  const { code, words } = refusalView(refusal, units);
  return OF_THE_PERSON.includes(code)
    ? new Refusal('forbidden', { detail: words, rule: code })
    : new Refusal('refused-by-rule', {
        detail: words,
        rule: code,
        errors: [{ path: 'step', message: words }],
      });
}
