import { and, asc, eq, lt, sql } from 'drizzle-orm';

import type { Transaction } from '@/db/client';
import { wheels } from '@/db/schema';
import type { Wheel } from '@/shared/contracts/wheels';
import type { WheelStanding } from '@/shared/domain/wheel-life';
import { WHEEL_FACTS_VERSION } from '@/shared/rules/wheel-facts';

import { pageOf } from '../paging';
import { taken } from '../refusals';
import type { Lock } from '../stored-items';
import { keepingUnique } from '../unique';
import {
  factColumns,
  lifeColumns,
  recordColumns,
  toRackWheel,
  toWheel,
  type WheelContent,
} from './wheel-mapping';
import { filtersOf, holding, orderOf, type WheelSearch } from './wheels-search-repository';

interface NewWheel extends WheelContent {
  id: string;
  standing: WheelStanding;
}

const MOST_PLACES = 500;
const REFRESHED_AT_ONCE = 500;

export const wheelsRepository = (tx: Transaction, shopId: string) => {
  const one = (id: string) => and(eq(wheels.shopId, shopId), eq(wheels.id, id));
  const edited = { version: sql`${wheels.version} + 1`, updatedAt: sql`now()` };

  return {
    async list(search: WheelSearch) {
      const { start, orderBy, key } = orderOf(search);
      const rows = await tx
        .select()
        .from(wheels)
        .where(
          and(
            eq(wheels.shopId, shopId),
            start,
            filtersOf(search),
            search.search ? await holding(tx, search.search) : undefined,
          ),
        )
        .orderBy(...orderBy)
        .limit(search.limit + 1);
      return pageOf(rows, search.limit, { item: toWheel, key });
    },

    /** Leaps from one place to the next, so that it costs as many steps as there are places. */
    async places(): Promise<string[]> {
      const next = (after: ReturnType<typeof sql>) => sql`
        select place_key, place from wheels where shop_id = ${shopId} and ${after}
        order by place_key limit 1`;
      const { rows } = await tx.execute<{ place: string }>(sql`
        with recursive leap as (
          (${next(sql`place_key is not null`)})
          union all
          select found.* from leap cross join lateral (${next(sql`place_key > leap.place_key`)}) found
        ) select place from leap limit ${MOST_PLACES}`);
      return rows.map(({ place }) => place);
    },

    async find(id: string, lock?: Lock): Promise<Wheel | null> {
      const query = tx.select().from(wheels).where(one(id)).$dynamic();
      const [row] = await (lock ? query.for(lock) : query);
      return row ? toWheel(row) : null;
    },

    async creationDigest(id: string): Promise<string | null> {
      const [row] = await tx.select({ digest: wheels.creationDigest }).from(wheels).where(one(id));
      return row?.digest ?? null;
    },

    async insert({ id, standing, ...content }: NewWheel, digest: string): Promise<Wheel | null> {
      const [row] = await tagFree(
        tx
          .insert(wheels)
          .values({
            shopId,
            id,
            ...recordColumns(content),
            ...lifeColumns(content.data, standing),
            creationDigest: digest,
          })
          .onConflictDoNothing({ target: [wheels.shopId, wheels.id] })
          .returning(),
      );
      return row ? toWheel(row) : null;
    },

    async update(id: string, content: WheelContent, standing: WheelStanding): Promise<Wheel> {
      const [row] = await tagFree(
        tx
          .update(wheels)
          .set({
            ...recordColumns(content),
            ...lifeColumns(content.data, standing),
            ...edited,
          })
          .where(one(id))
          .returning(),
      );
      if (!row) throw new Error(`wheel ${id} is not there to update`);
      return toWheel(row);
    },

    /** Works out anew what an older version of the rules made of the wheels. Not an edit of any of them. */
    async refreshFacts(): Promise<void> {
      for (;;) {
        const rows = await tx
          .select()
          .from(wheels)
          .where(and(eq(wheels.shopId, shopId), lt(wheels.factsVersion, WHEEL_FACTS_VERSION)))
          .orderBy(asc(wheels.id))
          .limit(REFRESHED_AT_ONCE)
          .for('no key update');
        for (const row of rows)
          await tx
            .update(wheels)
            .set(factColumns(toRackWheel(row)))
            .where(one(row.id));
        if (rows.length < REFRESHED_AT_ONCE) return;
      }
    },
  };
};

export type WheelsRepository = ReturnType<typeof wheelsRepository>;

const tagFree = <T>(write: Promise<T>) =>
  keepingUnique(write, { wheels_tag: taken('tag', 'Another wheel of this shop has this tag.') });
