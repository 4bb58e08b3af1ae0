import type * as z from 'zod';

import type { Caller } from '../shop-scope';
import type { Creation } from '../stored-items';
import { callerOf, itemParams, shopParams } from './params';
import { ok, signedInRoute, stored, type Route } from './route';

interface ItemService<Create, Update> {
  create(caller: Caller, request: Create): Promise<Creation<unknown>>;
  get(caller: Caller, id: string): Promise<unknown>;
  update(caller: Caller, id: string, request: Update): Promise<unknown>;
}

interface ItemRoutes<Create, Update> {
  /** Where the things are listed. */
  path: string;
  create: z.ZodType<Create>;
  update: z.ZodType<Update>;
  service: ItemService<Create, Update>;
}

/** Creating, reading and updating one thing of a shop: the same for every kind of thing. */
export const itemRoutes = <Create, Update>({
  path,
  create,
  update,
  service,
}: ItemRoutes<Create, Update>): Route[] => [
  signedInRoute({
    method: 'post',
    path,
    params: shopParams,
    body: create,
    act: async (input) => stored(await service.create(callerOf(input), input.body)),
  }),
  signedInRoute({
    method: 'get',
    path: `${path}/:id`,
    params: itemParams,
    act: async (input) => ok(await service.get(callerOf(input), input.params.id)),
  }),
  signedInRoute({
    method: 'put',
    path: `${path}/:id`,
    params: itemParams,
    body: update,
    act: async (input) => ok(await service.update(callerOf(input), input.params.id, input.body)),
  }),
];
