import { v7 as uuidv7 } from 'uuid';

import type {
  CreateWheelRequest,
  UpdateWheelRequest,
  Wheel,
  WheelQuery,
} from '@/shared/contracts/wheels';
import type { WheelEntry, WheelStanding, WheelStep } from '@/shared/domain/wheel-life';
import { can } from '@/shared/roles/roles';
import { foldWheelLife } from '@/shared/rules/wheel-life';

import type { AuditTrail } from '../audit/audit-trail';
import { demand, refusedByRule } from '../refusals';
import { dateIn } from '../setups/planning';
import type { Recompute } from '../setups/recompute';
import type { Caller, InShop, ShopScope } from '../shop-scope';
import { createItem, existing, updateItem } from '../stored-items';

const trail = (audit: AuditTrail) => ({ subject: 'wheel' as const, audit });

interface WheelsContext {
  inShop: InShop;
  recompute: Recompute;
  now: () => Date;
}

export const wheelsService = ({ inShop, recompute, now }: WheelsContext) => {
  const todayIn = async ({ shop }: ShopScope) =>
    dateIn((await existing(shop.find())).timeZone, now());

  return {
    list: (caller: Caller, query: WheelQuery) =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'wheel:read'));
        await scope.wheels.refreshFacts();
        return scope.wheels.list({ ...query, today: await todayIn(scope) });
      }),

    places: (caller: Caller) =>
      inShop(caller, async ({ role, wheels }) => {
        demand(can(role, 'wheel:read'));
        return { items: await wheels.places() };
      }),

    get: (caller: Caller, id: string) =>
      inShop(caller, ({ role, wheels }) => {
        demand(can(role, 'wheel:read'));
        return existing(wheels.find(id));
      }),

    /** The wheel, and the first entries of its life: that it came, and what was seen and heard then. */
    create: (caller: Caller, request: CreateWheelRequest) =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'wheel:edit'));
        const entries = receiptOf(request, await todayIn(scope), scope.personId);
        const { received: _received, ...content } = request;
        const standing = foldWheelLife(request.data, entries);
        const repository = {
          ...scope.wheels,
          insert: async (_request: CreateWheelRequest, digest: string) => {
            const wheel = await scope.wheels.insert({ ...content, standing }, digest);
            if (!wheel) return null;
            const extra = { wheelId: wheel.id, note: null, creationDigest: digest };
            await scope.wheelEntries.add(...entries.map((entry) => ({ ...entry, ...extra })));
            return wheel;
          },
        };
        return createItem(repository, request, trail(scope.audit));
      }),

    update: (caller: Caller, id: string, request: UpdateWheelRequest) =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'wheel:edit'));
        const repository = {
          find: scope.wheels.find,
          update: async (_id: string, { version: _version, ...content }: UpdateWheelRequest) => {
            const standing = foldWheelLife(content.data, await scope.wheelEntries.of(id));
            demandPossible(content.data, standing);
            return scope.wheels.update(id, content, standing);
          },
        };
        const wheel: Wheel = await updateItem(repository, { id, request }, trail(scope.audit));
        await recompute(scope, { wheelId: id });
        return wheel;
      }),
  };
};

export type WheelsService = ReturnType<typeof wheelsService>;

function receiptOf(
  { data, received }: CreateWheelRequest,
  today: string,
  personId: string,
): WheelEntry[] {
  const happenedOn = received.on ?? today;
  if (happenedOn > today) throw refusedByRule('received.on', 'This day has not come yet.');
  const { looked, rung } = received;
  const steps: WheelStep[] = [
    { kind: 'received', diameterMm: received.diameterMm ?? data.diameterNewMm },
  ];
  if (looked !== null) steps.push({ kind: 'inspected', look: looked, diameterMm: null });
  if (rung !== null) steps.push({ kind: 'ring test', ring: rung });
  return steps.map((step, index) => ({
    id: uuidv7(),
    number: index + 1,
    personId,
    happenedOn,
    needs: null,
    step,
  }));
}

/** The wheel as it has been measured and dressed must still be one. */
function demandPossible(
  { diameterNewMm, holeMm }: UpdateWheelRequest['data'],
  { diameterNowMm }: WheelStanding,
): void {
  if (diameterNowMm > diameterNewMm)
    throw refusedByRule('data.diameterNewMm', 'By its entries the wheel is larger than that now.');
  if (diameterNowMm <= holeMm)
    throw refusedByRule('data.holeMm', 'By its entries the wheel is no larger than that now.');
}
