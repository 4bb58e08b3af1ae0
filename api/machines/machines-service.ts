import { can } from '@/shared/roles/roles';

import type { AuditTrail } from '../audit/audit-trail';
import { demand } from '../refusals';
import type { Recompute } from '../setups/recompute';
import type { DraftFilter } from '../setups/setups-repository';
import type { Caller, InShop, ShopScope } from '../shop-scope';
import { createItem, existing, updateItem, type Item, type ItemRepository } from '../stored-items';

type MachinesRepository<T extends Item, Create extends { id: string }, Content> = ItemRepository<
  T,
  Create,
  Content
> & { list(): Promise<T[]> };

interface MachineKind<T extends Item, Create extends { id: string }, Content> {
  subject: 'lathe' | 'grinder';
  repositoryOf(scope: ShopScope): MachinesRepository<T, Create, Content>;
  /** The setups that rest on the machine. */
  usersOf(id: string): DraftFilter;
}

interface MachinesContext {
  inShop: InShop;
  recompute: Recompute;
}

/** Lathes and grinders alike: what one may do with a machine does not depend on its kind. */
function machinesService<T extends Item, Create extends { id: string }, Content>(
  { subject, repositoryOf, usersOf }: MachineKind<T, Create, Content>,
  { inShop, recompute }: MachinesContext,
) {
  const trail = (audit: AuditTrail) => ({ subject, audit });

  return {
    list: (caller: Caller) =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'machine:read'));
        return { items: await repositoryOf(scope).list() };
      }),

    get: (caller: Caller, id: string) =>
      inShop(caller, (scope) => {
        demand(can(scope.role, 'machine:read'));
        return existing(repositoryOf(scope).find(id));
      }),

    create: (caller: Caller, request: Create) =>
      inShop(caller, (scope) => {
        demand(can(scope.role, 'machine:edit'));
        return createItem(repositoryOf(scope), request, trail(scope.audit));
      }),

    update: (caller: Caller, id: string, request: Content & { version: number }) =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'machine:edit'));
        const machine = await updateItem(repositoryOf(scope), { id, request }, trail(scope.audit));
        await recompute(scope, usersOf(id));
        return machine;
      }),
  };
}

export const lathesService = (context: MachinesContext) =>
  machinesService(
    {
      subject: 'lathe',
      repositoryOf: (scope) => scope.lathes,
      usersOf: (latheId) => ({ latheId }),
    },
    context,
  );

export const grindersService = (context: MachinesContext) =>
  machinesService(
    {
      subject: 'grinder',
      repositoryOf: (scope) => scope.grinders,
      usersOf: (grinderId) => ({ grinderId }),
    },
    context,
  );
