import {
  createGrinderRequest,
  createLatheRequest,
  updateGrinderRequest,
  updateLatheRequest,
} from '@/shared/contracts/machines';

import { itemRoutes } from '../http/item-routes';
import { callerOf, shopParams } from '../http/params';
import { ok, signedInRoute, type Route } from '../http/route';
import type { Caller } from '../shop-scope';
import type { grindersService, lathesService } from './machines-service';

interface MachineServices {
  lathes: ReturnType<typeof lathesService>;
  grinders: ReturnType<typeof grindersService>;
}

export const machinesRoutes = ({ lathes, grinders }: MachineServices): Route[] => [
  listRoute('/shops/:shopId/lathes', lathes),
  ...itemRoutes({
    path: '/shops/:shopId/lathes',
    create: createLatheRequest,
    update: updateLatheRequest,
    service: lathes,
  }),
  listRoute('/shops/:shopId/grinders', grinders),
  ...itemRoutes({
    path: '/shops/:shopId/grinders',
    create: createGrinderRequest,
    update: updateGrinderRequest,
    service: grinders,
  }),
];

const listRoute = (path: string, service: { list(caller: Caller): Promise<unknown> }) =>
  signedInRoute({
    method: 'get',
    path,
    params: shopParams,
    act: async (input) => ok(await service.list(callerOf(input))),
  });
