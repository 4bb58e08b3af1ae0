import { createGrinderRequest, updateGrinderRequest } from '@/shared/contracts/machines';

import { itemRoutes } from '../http/item-routes';
import { callerOf, shopParams } from '../http/params';
import { ok, signedInRoute, type Route } from '../http/route';
import type { GrindersService } from './grinders-service';

const path = '/shops/:shopId/grinders';

export const grindersRoutes = (service: GrindersService): Route[] => [
  signedInRoute({
    method: 'get',
    path,
    params: shopParams,
    act: async (input) => ok(await service.list(callerOf(input))),
  }),
  ...itemRoutes({ path, create: createGrinderRequest, update: updateGrinderRequest, service }),
];
