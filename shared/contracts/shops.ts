import * as z from 'zod';

import { ROLES, UNIT_SYSTEMS } from '../domain/people';
import { DEFAULT_SHOP_RULES, type ShopRules } from '../domain/shop-rules';
import { expectedVersion, name, stored, timeZone } from './common';

const ruleNames = Object.keys(DEFAULT_SHOP_RULES) as (keyof ShopRules)[];

const shopRules = z.strictObject(
  Object.fromEntries(ruleNames.map((key) => [key, z.number().positive()])) as Record<
    keyof ShopRules,
    z.ZodNumber
  >,
);

export const shop = z.strictObject({
  ...stored,
  name: z.string(),
  units: z.enum(UNIT_SYSTEMS),
  timeZone: z.string(),
  rules: shopRules,
});

export const updateShopRequest = z.strictObject({
  version: expectedVersion,
  name,
  units: z.enum(UNIT_SYSTEMS),
  timeZone,
});

/** A person of the shop, as colleagues see them. */
export const shopMember = z.strictObject({
  personId: z.uuid(),
  name: z.string(),
  role: z.enum(ROLES),
});

export const shopMembers = z.strictObject({ items: z.array(shopMember) });

export type Shop = z.infer<typeof shop>;
export type UpdateShopRequest = z.infer<typeof updateShopRequest>;
export type ShopMember = z.infer<typeof shopMember>;
