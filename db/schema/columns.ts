import { sql, type AnyColumn, type SQL } from 'drizzle-orm';
import {
  doublePrecision,
  integer,
  jsonb,
  pgPolicy,
  text,
  timestamp,
  uuid,
} from 'drizzle-orm/pg-core';

import type { Range } from '@/shared/domain/limits';

/** The shop or the person that the transaction was opened for; null when it was opened for none. */
export const currentShop = sql`(select nullif(current_setting('app.shop_id', true), '')::uuid)`;
export const currentPerson = sql`(select nullif(current_setting('app.person_id', true), '')::uuid)`;

const moment = (name: string) => timestamp(name, { withTimezone: true, precision: 3 });

/** Milliseconds, as JavaScript keeps them: a page's key must compare equal after the round trip. */
export const createdAt = () => moment('created_at').notNull().defaultNow();
export const updatedAt = () => moment('updated_at').notNull().defaultNow();
export const retiredAt = () => moment('retired_at');
export const happenedAt = () => moment('at').notNull().defaultNow();

export const shopId = () => uuid('shop_id').notNull();
/** What is edited counts its edits. */
export const edits = () => ({
  version: integer('version').notNull().default(1),
  createdAt: createdAt(),
  updatedAt: updatedAt(),
});

/** A thing of a shop that its people make and edit. */
export const itemOfShop = () => ({
  shopId: shopId(),
  id: uuid('id').notNull(),
  ...edits(),
  /** What was typed for a field, by its path. */
  typed: jsonb('typed').$type<Record<string, string>>().notNull(),
  /** Of the request that made the row: tells the same request sent again from another one with its id. */
  creationDigest: text('creation_digest').notNull(),
});

export const measure = (name: string) => doublePrecision(name);

/** Rows of a shop are seen and written only by a transaction opened for that shop. */
export const shopPolicy = (table: string) =>
  pgPolicy(`${table}_of_the_shop`, {
    for: 'all',
    using: sql`shop_id = ${currentShop}`,
    withCheck: sql`shop_id = ${currentShop}`,
  });

export const inRange = (column: AnyColumn, { min, max }: Range): SQL =>
  sql`${column} between ${sql.raw(String(min))} and ${sql.raw(String(max))}`;

export const eachInRange = (column: AnyColumn, { min, max }: Range): SQL =>
  sql`${sql.raw(String(min))} <= all(${column}) and ${sql.raw(String(max))} >= all(${column})`;

export const oneOf = (column: AnyColumn, values: readonly string[]): SQL =>
  sql`${column} in (${sql.raw(values.map((value) => `'${value}'`).join(', '))})`;

export const textUpTo = (column: AnyColumn, longest: number): SQL =>
  sql`char_length(${column}) between 1 and ${sql.raw(String(longest))}`;
