import type { CreateLatheRequest, UpdateLatheRequest } from '@/shared/contracts/machines';
import { can } from '@/shared/roles/roles';

import type { AuditTrail } from '../audit/audit-trail';
import { demand } from '../refusals';
import type { Recompute } from '../setups/recompute';
import type { Caller, InShop } from '../shop-scope';
import { createItem, existing, updateItem } from '../stored-items';

const trail = (audit: AuditTrail) => ({ subject: 'lathe' as const, audit });

export const lathesService = (inShop: InShop, recompute: Recompute) => ({
  list: (caller: Caller) =>
    inShop(caller, async ({ role, lathes }) => {
      demand(can(role, 'machine:read'));
      return { items: await lathes.list() };
    }),

  get: (caller: Caller, id: string) =>
    inShop(caller, ({ role, lathes }) => {
      demand(can(role, 'machine:read'));
      return existing(lathes.find(id));
    }),

  create: (caller: Caller, request: CreateLatheRequest) =>
    inShop(caller, ({ role, lathes, audit }) => {
      demand(can(role, 'machine:edit'));
      return createItem(lathes, request, trail(audit));
    }),

  update: (caller: Caller, id: string, request: UpdateLatheRequest) =>
    inShop(caller, async (scope) => {
      demand(can(scope.role, 'machine:edit'));
      const lathe = await updateItem(scope.lathes, { id, request }, trail(scope.audit));
      await recompute(scope, { latheId: id });
      return lathe;
    }),
});

export type LathesService = ReturnType<typeof lathesService>;
