import { createLatheRequest, updateLatheRequest } from '@/shared/contracts/machines';

import { itemRoutes } from '../http/item-routes';
import { callerOf, shopParams } from '../http/params';
import { ok, signedInRoute, type Route } from '../http/route';
import type { LathesService } from './lathes-service';

const path = '/shops/:shopId/lathes';

export const lathesRoutes = (service: LathesService): Route[] => [
  signedInRoute({
    method: 'get',
    path,
    params: shopParams,
    act: async (input) => ok(await service.list(callerOf(input))),
  }),
  ...itemRoutes({ path, create: createLatheRequest, update: updateLatheRequest, service }),
];
