import { updateShopRequest } from '@/shared/contracts/shops';

import { callerOf, shopParams } from '../http/params';
import { ok, signedInRoute, type Route } from '../http/route';
import type { ShopsService } from './shops-service';

const path = '/shops/:shopId';

export const shopsRoutes = (shops: ShopsService): Route[] => [
  signedInRoute({
    method: 'get',
    path,
    params: shopParams,
    act: async (input) => ok(await shops.get(callerOf(input))),
  }),
  signedInRoute({
    method: 'patch',
    path,
    params: shopParams,
    body: updateShopRequest,
    act: async (input) => ok(await shops.update(callerOf(input), input.body)),
  }),
  signedInRoute({
    method: 'get',
    path: `${path}/members`,
    params: shopParams,
    act: async (input) => ok(await shops.members(callerOf(input))),
  }),
];
