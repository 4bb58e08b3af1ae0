import { and, eq, gte, inArray, like, lte, sql, type SQL } from 'drizzle-orm';
import type { AnyPgColumn } from 'drizzle-orm/pg-core';
import { validate as isUuid } from 'uuid';

import type { Transaction } from '@/db/client';
import { wheels } from '@/db/schema';
import type { WheelQuery } from '@/shared/contracts/wheels';

import { containing, isDate, isNumber, isText, isTime, keyOf } from '../paging';
import type { WheelRow } from './wheel-mapping';

/** A list asked for, on a day of the shop's. */
export type WheelSearch = WheelQuery & { today: string };

interface Order {
  column: AnyPgColumn;
  /** How the database reads the column's part of a key. */
  type: SQL;
  fits: (part: string) => boolean;
  part: (row: WheelRow) => string;
  /** The order it is read in unless turned round. */
  newestFirst?: boolean;
}

const ORDERS: Record<WheelQuery['sort'], Order> = {
  tag: { column: wheels.tagKey, type: sql`text`, fits: isText, part: (row) => row.tagKey },
  diameter: {
    column: wheels.diameterNowMm,
    type: sql`double precision`,
    fits: isNumber,
    part: (row) => String(row.diameterNowMm),
  },
  due: { column: wheels.dueKey, type: sql`date`, fits: isDate, part: (row) => row.dueKey },
  latest: {
    column: wheels.updatedAt,
    type: sql`timestamptz`,
    fits: isTime,
    part: (row) => row.updatedAt.toISOString(),
    newestFirst: true,
  },
};

/** How a list is ordered, where its next page starts, and the key of a row. */
export function orderOf({ sort, order, after }: WheelSearch) {
  const { column, type, fits, part, newestFirst = false } = ORDERS[sort];
  const down = newestFirst !== (order === 'down');
  // Tags are unique: they need no id beside them.
  const isUnique = sort === 'tag';
  const [first, id] =
    after === undefined ? [] : isUnique ? keyOf(after, fits) : keyOf(after, fits, isUuid);
  const beyond = down ? sql`<` : sql`>`;
  const start =
    first === undefined
      ? undefined
      : id === undefined
        ? sql`${column} ${beyond} ${first}::${type}`
        : sql`(${column}, ${wheels.id}) ${beyond} (${first}::${type}, ${id}::uuid)`;
  const by = (name: AnyPgColumn) => (down ? sql`${name} desc` : sql`${name} asc`);
  return {
    start,
    orderBy: isUnique ? [by(column)] : [by(column), by(wheels.id)],
    key: (row: WheelRow) => (isUnique ? [part(row)] : [part(row), row.id]),
  };
}

const maybe = <T>(value: T | undefined, condition: (value: T) => SQL | undefined) =>
  value === undefined ? undefined : condition(value);

/** Every filter but the search: comparisons of columns alone, which indexes serve under a policy. */
export const filtersOf = (search: WheelSearch): SQL | undefined =>
  and(
    maybe(search.usable, () => gte(wheels.usableUntil, search.today)),
    maybe(search.state, (state) => eq(wheels.state, state)),
    maybe(search.abrasive, (abrasive) => eq(wheels.abrasive, abrasive)),
    maybe(search.grain, (grain) => eq(wheels.grain, grain)),
    maybe(search.diameterFromMm, (least) => gte(wheels.diameterNowMm, least)),
    maybe(search.diameterToMm, (most) => lte(wheels.diameterNowMm, most)),
    maybe(search.limitFromRpm, (least) => gte(wheels.limitRpm, least)),
    maybe(search.dueBy, (day) => lte(wheels.dueKey, day)),
    maybe(search.place, (place) => eq(wheels.placeKey, place.toLowerCase())),
  );

/** Texts shorter than this have no trigram to be found by. */
const TRIGRAM = 3;
/** Where more are found than this, a page is full after a short walk through the list itself. */
const MOST_FOUND = 1000;

/** Those that hold a text in tag or marking: by their ids where they are few, else looked at one by one. */
export async function holding(tx: Transaction, text: string): Promise<SQL | undefined> {
  const pattern = containing(text.toLowerCase());
  if (text.length >= TRIGRAM) {
    const { rows } = await tx.execute<{ id: string }>(
      sql`select wheels_holding(${pattern}, ${MOST_FOUND + 1}) as id`,
    );
    if (rows.length <= MOST_FOUND)
      return rows.length === 0
        ? sql`false`
        : inArray(
            wheels.id,
            rows.map(({ id }) => id),
          );
  }
  return like(wheels.searchText, pattern);
}
