import * as z from 'zod';

import { id } from '@/shared/contracts/common';

import type { Caller } from '../shop-scope';

export const shopParams = z.object({ shopId: id });
export const itemParams = z.object({ shopId: id, id });

export const callerOf = (input: { personId: string; params: { shopId: string } }): Caller => ({
  personId: input.personId,
  shopId: input.params.shopId,
});
