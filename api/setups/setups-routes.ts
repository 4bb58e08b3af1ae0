import {
  createSetupRequest,
  duplicateSetupRequest,
  retireSetupRequest,
  setupQuery,
  updateSetupRequest,
} from '@/shared/contracts/setups';

import { itemRoutes } from '../http/item-routes';
import { callerOf, itemParams, shopParams } from '../http/params';
import { ok, signedInRoute, stored, type Route } from '../http/route';
import type { SetupsService } from './setups-service';

const path = '/shops/:shopId/setups';

export const setupsRoutes = (service: SetupsService): Route[] => [
  signedInRoute({
    method: 'get',
    path,
    params: shopParams,
    query: setupQuery,
    act: async (input) => ok(await service.list(callerOf(input), input.query)),
  }),
  ...itemRoutes({ path, create: createSetupRequest, update: updateSetupRequest, service }),
  signedInRoute({
    method: 'post',
    path: `${path}/:id/duplicate`,
    params: itemParams,
    body: duplicateSetupRequest,
    act: async (input) =>
      stored(await service.duplicate(callerOf(input), input.params.id, input.body)),
  }),
  signedInRoute({
    method: 'post',
    path: `${path}/:id/retire`,
    params: itemParams,
    body: retireSetupRequest,
    act: async (input) => ok(await service.retire(callerOf(input), input.params.id, input.body)),
  }),
];
