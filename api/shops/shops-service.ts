import type { UpdateShopRequest } from '@/shared/contracts/shops';
import { can } from '@/shared/roles/roles';

import type { AuditTrail } from '../audit/audit-trail';
import { demand } from '../refusals';
import type { Recompute } from '../setups/recompute';
import type { Caller, InShop } from '../shop-scope';
import { existing, updateItem, type Lock } from '../stored-items';

const trail = (audit: AuditTrail) => ({ subject: 'shop' as const, audit });

export const shopsService = (inShop: InShop, recompute: Recompute) => ({
  get: (caller: Caller) =>
    inShop(caller, ({ role, shop }) => {
      demand(can(role, 'shop:read'));
      return existing(shop.find());
    }),

  update: (caller: Caller, request: UpdateShopRequest) =>
    inShop(caller, async (scope) => {
      demand(can(scope.role, 'shop:update'));
      const repository = {
        find: (_id: string, lock?: Lock) => scope.shop.find(lock),
        update: (_id: string, content: UpdateShopRequest) => scope.shop.update(content),
      };
      const edit = { id: caller.shopId, request };
      const updated = await updateItem(repository, edit, trail(scope.audit));
      await recompute(scope, 'all');
      return updated;
    }),

  members: (caller: Caller) =>
    inShop(caller, async ({ role, members }) => {
      demand(can(role, 'shop:read'));
      return { items: await members.list() };
    }),
});

export type ShopsService = ReturnType<typeof shopsService>;
