import type { CreateGrinderRequest, UpdateGrinderRequest } from '@/shared/contracts/machines';
import { can } from '@/shared/roles/roles';

import type { AuditTrail } from '../audit/audit-trail';
import { demand } from '../refusals';
import type { Recompute } from '../setups/recompute';
import type { Caller, InShop } from '../shop-scope';
import { createItem, existing, updateItem } from '../stored-items';

const trail = (audit: AuditTrail) => ({ subject: 'grinder' as const, audit });

export const grindersService = (inShop: InShop, recompute: Recompute) => ({
  list: (caller: Caller) =>
    inShop(caller, async ({ role, grinders }) => {
      demand(can(role, 'machine:read'));
      return { items: await grinders.list() };
    }),

  get: (caller: Caller, id: string) =>
    inShop(caller, ({ role, grinders }) => {
      demand(can(role, 'machine:read'));
      return existing(grinders.find(id));
    }),

  create: (caller: Caller, request: CreateGrinderRequest) =>
    inShop(caller, ({ role, grinders, audit }) => {
      demand(can(role, 'machine:edit'));
      return createItem(grinders, request, trail(audit));
    }),

  update: (caller: Caller, id: string, request: UpdateGrinderRequest) =>
    inShop(caller, async (scope) => {
      demand(can(scope.role, 'machine:edit'));
      const grinder = await updateItem(scope.grinders, { id, request }, trail(scope.audit));
      await recompute(scope, { grinderId: id });
      return grinder;
    }),
});

export type GrindersService = ReturnType<typeof grindersService>;
