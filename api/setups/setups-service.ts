import type {
  CreateSetupRequest,
  DuplicateSetupRequest,
  Setup,
  UpdateSetupRequest,
} from '@/shared/contracts/setups';
import type { SetupInputs } from '@/shared/domain/setups';
import { can } from '@/shared/roles/roles';

import type { AuditTrail } from '../audit/audit-trail';
import { demand, refusedByRule, staleVersion } from '../refusals';
import type { Caller, InShop, ShopScope } from '../shop-scope';
import { createItem, existing, updateItem } from '../stored-items';
import { lockNamedParts, planFor } from './planning';
import type { RefreshOutdated } from './recompute';
import type { SetupSearch } from './setups-repository';

interface SetupsContext {
  inShop: InShop;
  refreshOutdated: RefreshOutdated;
  now: () => Date;
}

/** The plan follows from the inputs and the rules' version, and is too long to be written down twice. */
const view = ({ plan, ...setup }: Setup) => ({
  ...setup,
  verdict: plan.verdict,
  rulesVersion: plan.rulesVersion,
});

const trail = (audit: AuditTrail) => ({ subject: 'setup' as const, audit, view });

function demandDraft({ state }: Setup): void {
  if (state !== 'draft') throw refusedByRule('state', 'Only a draft can be edited.');
}

export function setupsService({ inShop, refreshOutdated, now }: SetupsContext) {
  const planned = async (scope: ShopScope, inputs: SetupInputs) => ({
    stored: await planFor(inputs, { scope, now: now() }),
    updatedBy: scope.personId,
  });

  return {
    list: (caller: Caller, search: SetupSearch) =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'setup:read'));
        await refreshOutdated(scope);
        return scope.setups.list(search);
      }),

    get: (caller: Caller, id: string) =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'setup:read'));
        await refreshOutdated(scope);
        return existing(scope.setups.find(id));
      }),

    create: (caller: Caller, request: CreateSetupRequest) =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'setup:draft'));
        await lockNamedParts(request.inputs, scope);
        return createPlanned(scope, { setup: request, request });
      }),

    update: (caller: Caller, id: string, request: UpdateSetupRequest) =>
      inShop(caller, async (scope) => {
        const { role, setups, audit } = scope;
        demand(can(role, 'setup:draft'));
        await existing(setups.find(id));
        // The parts before the setup: in the order in which a change of a part takes its locks.
        await lockNamedParts(request.inputs, scope);
        const extra = await planned(scope, request.inputs);
        const repository = {
          find: setups.find,
          update: (_id: string, content: UpdateSetupRequest) =>
            setups.update(id, { ...content, ...extra }),
        };
        return updateItem(repository, { id, request, check: demandDraft }, trail(audit));
      }),

    duplicate: (caller: Caller, sourceId: string, request: DuplicateSetupRequest) =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'setup:draft'));
        const { inputs, typed } = await existing(scope.setups.find(sourceId));
        await lockNamedParts(inputs, scope);
        return createPlanned(scope, {
          setup: { ...request, inputs, typed },
          request: { ...request, sourceId },
        });
      }),

    retire: (caller: Caller, id: string, { version }: { version: number }) =>
      inShop(caller, async ({ role, personId, setups, audit }) => {
        demand(can(role, 'setup:draft'));
        const before = await existing(setups.find(id, 'no key update'));
        if (before.version !== version) throw staleVersion(before);
        if (before.state === 'retired') throw refusedByRule('state', 'It is retired already.');
        const after = await setups.setState(id, 'retired', personId);
        await audit.record({
          action: 'retire',
          subject: 'setup',
          subjectId: id,
          before: { state: before.state },
          after: { state: after.state },
        });
        return after;
      }),
  };

  /** `request` is what came from the person: sent again, it makes nothing new. */
  async function createPlanned<R extends { id: string }>(
    scope: ShopScope,
    { setup, request }: { setup: CreateSetupRequest; request: R },
  ) {
    const extra = await planned(scope, setup.inputs);
    const repository = {
      find: scope.setups.find,
      creationDigest: scope.setups.creationDigest,
      insert: (_request: R, digest: string) => scope.setups.insert({ ...setup, ...extra }, digest),
    };
    return createItem(repository, request, trail(scope.audit));
  }
}

export type SetupsService = ReturnType<typeof setupsService>;
