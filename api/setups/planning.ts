import type { SetupInputs } from '@/shared/domain/setups';
import { assemblePlanInput, planSetup, type Plan } from '@/shared/rules';

import { refusedByRule } from '../refusals';
import type { ShopScope } from '../shop-scope';
import { existing } from '../stored-items';
import type { StoredPlan } from './setups-repository';

/** The calendar date in a time zone. */
export const dateIn = (timeZone: string, now: Date): string =>
  new Intl.DateTimeFormat('sv-SE', { timeZone }).format(now);

type Sources = Pick<ShopScope, 'shop' | 'lathes' | 'grinders' | 'wheels'>;

/**
 * The shop, and what of it the inputs name. With a lock for sharing, none of it can change until the plan made
 * from it is stored: whoever changes it afterwards finds that plan and makes it anew.
 */
async function partsOf({ machine, wheel }: SetupInputs, from: Sources, lock?: 'share') {
  const shop = await existing(from.shop.find(lock));
  const { latheId, grinderId, quillId } = machine;
  const lathe = latheId === null ? null : await from.lathes.find(latheId, lock);
  const grinder = grinderId === null ? null : await from.grinders.find(grinderId, lock);
  const quill = grinder?.quills.find(({ id }) => id === quillId) ?? null;
  const rackWheel = wheel.wheelId === null ? null : await from.wheels.find(wheel.wheelId, lock);
  return { shop, lathe, grinder, quill, rackWheel };
}

/** Makes the plan from the inputs and from what they name, as it stands in this transaction. */
export async function planFor(
  inputs: SetupInputs,
  { scope, now }: { scope: Sources; now: Date },
): Promise<StoredPlan> {
  const { shop, lathe, grinder, quill, rackWheel } = await partsOf(inputs, scope);
  const today = dateIn(shop.timeZone, now);
  const input = assemblePlanInput(inputs, {
    lathe: lathe?.data ?? null,
    grinder: grinder?.data ?? null,
    quill: quill?.data ?? null,
    wheel: rackWheel?.data ?? null,
    rules: shop.rules,
    today,
  });
  const plan = planSetup(input);
  const expiresOn = input.wheelData?.expiresOn ?? null;
  const goodUntil = expiresOn !== null && expiresOn >= today ? expiresOn : null;
  return { plan: { ...plan }, verdictCount: countOf(plan), goodUntil };
}

function countOf({ verdict, needs, findings }: Plan): number {
  return verdict === 'incomplete'
    ? needs.length
    : findings.filter((finding) => finding.level === verdict).length;
}

/** Refuses, at its field, what the inputs name and the shop does not have. */
export async function lockNamedParts(inputs: SetupInputs, scope: Sources): Promise<void> {
  const { lathe, grinder, rackWheel } = await partsOf(inputs, scope, 'share');
  const { latheId, grinderId, quillId } = inputs.machine;
  if (latheId !== null && !lathe)
    throw refusedByRule('inputs.machine.latheId', 'This lathe is not one of the shop’s.');
  if (grinderId !== null && !grinder)
    throw refusedByRule('inputs.machine.grinderId', 'This grinder is not one of the shop’s.');
  if (quillId !== null && !(grinder && (await scope.grinders.hadQuill(grinder.id, quillId))))
    throw refusedByRule('inputs.machine.quillId', 'This quill is not one of the grinder’s.');
  if (inputs.wheel.wheelId !== null && !rackWheel)
    throw refusedByRule('inputs.wheel.wheelId', 'This wheel is not on the shop’s Rack.');
}
