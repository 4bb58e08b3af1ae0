import { sql } from 'drizzle-orm';
import {
  check,
  foreignKey,
  index,
  json,
  jsonb,
  pgPolicy,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uniqueIndex,
  uuid,
  varchar,
} from 'drizzle-orm/pg-core';

import { TEXT_LIMITS } from '@/shared/domain/limits';
import { ROLES, UNIT_SYSTEMS } from '@/shared/domain/people';
import type { ShopRules } from '@/shared/domain/shop-rules';

import {
  createdAt,
  currentPerson,
  currentShop,
  edits,
  oneOf,
  shopId,
  shopPolicy,
  textUpTo,
  updatedAt,
} from './columns';

/** The application may not read password_hash here: it is granted the other columns only. */
export const persons = pgTable(
  'persons',
  {
    id: uuid('id').primaryKey(),
    name: text('name').notNull(),
    email: text('email').notNull(),
    passwordHash: text('password_hash').notNull(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    uniqueIndex('persons_email').on(t.email),
    check('persons_name_length', textUpTo(t.name, TEXT_LIMITS.name)),
    check('persons_email_lower', sql`${t.email} = lower(${t.email})`),
    check('persons_email_length', textUpTo(t.email, TEXT_LIMITS.email)),
    pgPolicy('persons_self', {
      for: 'all',
      using: sql`id = ${currentPerson}`,
      withCheck: sql`id = ${currentPerson}`,
    }),
    pgPolicy('persons_colleagues', {
      for: 'select',
      using: sql`id in (select person_id from memberships where shop_id = ${currentShop})`,
    }),
  ],
);

export const shops = pgTable(
  'shops',
  {
    id: uuid('id').primaryKey(),
    name: text('name').notNull(),
    units: text('units', { enum: UNIT_SYSTEMS }).notNull(),
    timeZone: text('time_zone').notNull(),
    rules: jsonb('rules').$type<ShopRules>().notNull(),
    ...edits(),
  },
  (t) => [
    check('shops_name_length', textUpTo(t.name, TEXT_LIMITS.name)),
    check('shops_units', oneOf(t.units, UNIT_SYSTEMS)),
    pgPolicy('shops_current', {
      for: 'all',
      using: sql`id = ${currentShop}`,
      withCheck: sql`id = ${currentShop}`,
    }),
    pgPolicy('shops_of_the_person', {
      for: 'select',
      using: sql`id in (select shop_id from memberships where person_id = ${currentPerson})`,
    }),
  ],
);

export const memberships = pgTable(
  'memberships',
  {
    shopId: shopId(),
    personId: uuid('person_id').notNull(),
    role: text('role', { enum: ROLES }).notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ name: 'memberships_pkey', columns: [t.shopId, t.personId] }),
    index('memberships_person').on(t.personId),
    foreignKey({ name: 'memberships_shop', columns: [t.shopId], foreignColumns: [shops.id] }),
    foreignKey({ name: 'memberships_person', columns: [t.personId], foreignColumns: [persons.id] }),
    check('memberships_role', oneOf(t.role, ROLES)),
    shopPolicy('memberships'),
    pgPolicy('memberships_of_the_person', {
      for: 'select',
      using: sql`person_id = ${currentPerson}`,
    }),
  ],
);

/** As connect-pg-simple reads and writes it. */
export const sessions = pgTable(
  'sessions',
  {
    sid: varchar('sid').primaryKey(),
    sess: json('sess').notNull(),
    expire: timestamp('expire', { precision: 6 }).notNull(),
  },
  (t) => [index('sessions_expire').on(t.expire)],
);
