import { recordEntryRequest, wheelEntryQuery } from '@/shared/contracts/wheel-entries';
import { createWheelRequest, updateWheelRequest, wheelQuery } from '@/shared/contracts/wheels';

import { itemRoutes } from '../http/item-routes';
import { callerOf, itemParams, shopParams } from '../http/params';
import { ok, signedInRoute, stored, type Route } from '../http/route';
import type { WheelLifeService } from './wheel-life-service';
import type { WheelsService } from './wheels-service';

const path = '/shops/:shopId/wheels';

interface Services {
  wheels: WheelsService;
  wheelLives: WheelLifeService;
}

export const wheelsRoutes = ({ wheels, wheelLives }: Services): Route[] => [
  signedInRoute({
    method: 'get',
    path,
    params: shopParams,
    query: wheelQuery,
    act: async (input) => ok(await wheels.list(callerOf(input), input.query)),
  }),
  signedInRoute({
    method: 'get',
    path: '/shops/:shopId/wheel-places',
    params: shopParams,
    act: async (input) => ok(await wheels.places(callerOf(input))),
  }),
  ...itemRoutes({ path, create: createWheelRequest, update: updateWheelRequest, service: wheels }),
  signedInRoute({
    method: 'get',
    path: `${path}/:id/life`,
    params: itemParams,
    act: async (input) => ok(await wheelLives.get(callerOf(input), input.params.id)),
  }),
  signedInRoute({
    method: 'get',
    path: `${path}/:id/entries`,
    params: itemParams,
    query: wheelEntryQuery,
    act: async (input) =>
      ok(await wheelLives.entries(callerOf(input), input.params.id, input.query)),
  }),
  signedInRoute({
    method: 'post',
    path: `${path}/:id/entries`,
    params: itemParams,
    body: recordEntryRequest,
    act: async (input) =>
      stored(await wheelLives.record(callerOf(input), input.params.id, input.body)),
  }),
];
