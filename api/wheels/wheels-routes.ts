import { createWheelRequest, updateWheelRequest, wheelQuery } from '@/shared/contracts/wheels';

import { itemRoutes } from '../http/item-routes';
import { callerOf, shopParams } from '../http/params';
import { ok, signedInRoute, type Route } from '../http/route';
import type { WheelsService } from './wheels-service';

const path = '/shops/:shopId/wheels';

export const wheelsRoutes = (service: WheelsService): Route[] => [
  signedInRoute({
    method: 'get',
    path,
    params: shopParams,
    query: wheelQuery,
    act: async (input) => ok(await service.list(callerOf(input), input.query)),
  }),
  ...itemRoutes({ path, create: createWheelRequest, update: updateWheelRequest, service }),
];
