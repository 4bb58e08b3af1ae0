import type { UpdateShopRequest } from '@/shared/contracts/shops';
import { can } from '@/shared/roles/roles';

import { demand } from '../refusals';
import type { Recompute } from '../setups/recompute';
import type { Caller, InShop } from '../shop-scope';
import { existing, updateItem } from '../stored-items';

export const shopsService = (inShop: InShop, recompute: Recompute) => ({
  get: (caller: Caller) =>
    inShop(caller, ({ role, shop }) => {
      demand(can(role, 'shop:read'));
      return existing(shop.find());
    }),

  update: (caller: Caller, request: UpdateShopRequest) =>
    inShop(caller, async (scope) => {
      demand(can(scope.role, 'shop:update'));
      const { shop, audit } = scope;
      const id = caller.shopId;
      const updated = await updateItem(shop, { id, request }, { subject: 'shop', audit });
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
