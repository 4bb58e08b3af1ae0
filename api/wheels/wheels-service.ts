import { isDeepStrictEqual } from 'node:util';

import type { CreateWheelRequest, UpdateWheelRequest, Wheel } from '@/shared/contracts/wheels';
import type { Role } from '@/shared/domain/people';
import { can } from '@/shared/roles/roles';

import type { AuditTrail } from '../audit/audit-trail';
import { demand } from '../refusals';
import type { Recompute } from '../setups/recompute';
import type { Caller, InShop } from '../shop-scope';
import { createItem, existing, updateItem } from '../stored-items';
import type { WheelSearch } from './wheels-repository';

const trail = (audit: AuditTrail) => ({ subject: 'wheel' as const, audit });

export const wheelsService = (inShop: InShop, recompute: Recompute) => ({
  list: (caller: Caller, search: WheelSearch) =>
    inShop(caller, ({ role, wheels }) => {
      demand(can(role, 'wheel:read'));
      return wheels.list(search);
    }),

  get: (caller: Caller, id: string) =>
    inShop(caller, ({ role, wheels }) => {
      demand(can(role, 'wheel:read'));
      return existing(wheels.find(id));
    }),

  create: (caller: Caller, request: CreateWheelRequest) =>
    inShop(caller, ({ role, wheels, audit }) => {
      demand(can(role, 'wheel:edit'));
      return createItem(wheels, request, trail(audit));
    }),

  update: (caller: Caller, id: string, request: UpdateWheelRequest) =>
    inShop(caller, async (scope) => {
      const check = (before: Wheel) => demand(mayChange(scope.role, before, request));
      const wheel = await updateItem(scope.wheels, { id, request, check }, trail(scope.audit));
      await recompute(scope, { wheelId: id });
      return wheel;
    }),
});

export type WheelsService = ReturnType<typeof wheelsService>;

/** Anyone may set a wheel aside; bringing one back into use is decided apart from editing it. */
function mayChange(role: Role, before: Wheel, after: UpdateWheelRequest): boolean {
  if (isOut(before) && !isOut(after)) return can(role, 'wheel:return');
  return can(role, onlySetsAside(before, after) ? 'wheel:set-aside' : 'wheel:edit');
}

const isOut = ({ data }: Pick<Wheel, 'data'>) =>
  data.state === 'set aside' || data.state === 'scrapped';

function onlySetsAside(before: Wheel, after: UpdateWheelRequest): boolean {
  const { state, setAsideReason } = after.data;
  const setAside = { ...before.data, state, setAsideReason };
  return (
    state === 'set aside' &&
    before.data.state !== 'scrapped' &&
    after.tag === before.tag &&
    isDeepStrictEqual(after.typed, before.typed) &&
    isDeepStrictEqual(after.data, setAside)
  );
}
