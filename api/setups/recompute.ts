import { RULES_VERSION } from '@/shared/rules';

import type { ShopScope } from '../shop-scope';
import { existing } from '../stored-items';
import { dateIn, planFor } from './planning';
import type { Draft, DraftFilter } from './setups-repository';

/** Makes the plans of the shop's drafts anew after something they rest on has changed. */
export type Recompute = (scope: ShopScope, which: DraftFilter | 'all') => Promise<void>;

/** Makes the plans of drafts anew that were made by other rules, or whose wheel has expired since. */
export type RefreshOutdated = (scope: ShopScope) => Promise<void>;

export const recomputeDrafts =
  (now: () => Date): Recompute =>
  async (scope, which) =>
    replan(scope, await scope.setups.lockDrafts(which === 'all' ? {} : which), now());

export const refreshOutdated =
  (now: () => Date): RefreshOutdated =>
  async (scope) => {
    const { timeZone } = await existing(scope.shop.find());
    const current = { rulesVersion: RULES_VERSION, today: dateIn(timeZone, now()) };
    await replan(scope, await scope.setups.lockOutdatedDrafts(current), now());
  };

async function replan(scope: ShopScope, drafts: Draft[], now: Date): Promise<void> {
  for (const { id, inputs, verdict } of drafts) {
    const stored = await planFor(inputs, { scope, now });
    await scope.setups.storePlan(id, stored);
    if (stored.plan.verdict !== verdict)
      await scope.audit.record({
        action: 'recompute',
        subject: 'setup',
        subjectId: id,
        before: { verdict },
        after: { verdict: stored.plan.verdict, rulesVersion: stored.plan.rulesVersion },
      });
  }
}
