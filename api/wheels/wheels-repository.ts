import { and, asc, eq, gt, ilike, or, sql, type InferSelectModel } from 'drizzle-orm';

import type { Transaction } from '@/db/client';
import { wheels } from '@/db/schema';
import type { CreateWheelRequest, Wheel } from '@/shared/contracts/wheels';
import type { WheelData } from '@/shared/domain/wheels';

import { containing, isText, keyOf, pageOf } from '../paging';
import { taken } from '../refusals';
import { storedFields, type Lock } from '../stored-items';
import { keepingUnique } from '../unique';

type Content = Omit<CreateWheelRequest, 'id'>;
type Row = InferSelectModel<typeof wheels>;

export interface WheelSearch {
  search?: string | undefined;
  after?: string | undefined;
  limit: number;
}

export const wheelsRepository = (tx: Transaction, shopId: string) => {
  const one = (id: string) => and(eq(wheels.shopId, shopId), eq(wheels.id, id));

  return {
    async list({ search, after, limit }: WheelSearch) {
      const [lastTag] = after === undefined ? [] : keyOf(after, isText);
      const pattern = search ? containing(search) : undefined;
      const rows = await tx
        .select()
        .from(wheels)
        .where(
          and(
            eq(wheels.shopId, shopId),
            lastTag === undefined ? undefined : gt(wheels.tagKey, lastTag),
            pattern ? or(ilike(wheels.tag, pattern), ilike(wheels.marking, pattern)) : undefined,
          ),
        )
        .orderBy(asc(wheels.tagKey))
        .limit(limit + 1);
      return pageOf(rows, limit, {
        item: toWheel,
        key: (row) => [row.tagKey],
      });
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

    async insert(request: CreateWheelRequest, creationDigest: string): Promise<Wheel | null> {
      const [row] = await tagFree(
        tx
          .insert(wheels)
          .values({ shopId, id: request.id, ...columnsOf(request), creationDigest })
          .onConflictDoNothing({ target: [wheels.shopId, wheels.id] })
          .returning(),
      );
      return row ? toWheel(row) : null;
    },

    async update(id: string, content: Content): Promise<Wheel> {
      const [row] = await tagFree(
        tx
          .update(wheels)
          .set({
            ...columnsOf(content),
            version: sql`${wheels.version} + 1`,
            updatedAt: sql`now()`,
          })
          .where(one(id))
          .returning(),
      );
      if (!row) throw new Error(`wheel ${id} is not there to update`);
      return toWheel(row);
    },
  };
};

export type WheelsRepository = ReturnType<typeof wheelsRepository>;

const tagFree = <T>(write: Promise<T>) =>
  keepingUnique(write, { wheels_tag: taken('tag', 'Another wheel of this shop has this tag.') });

function columnsOf({ tag, data: { mounted, ...columns }, typed }: Content) {
  return {
    tag,
    ...columns,
    mandrelDiameterMm: mounted?.mandrelDiameterMm ?? null,
    mandrelOverhangMm: mounted?.overhangMm ?? null,
    mandrelThreaded: mounted?.threaded ?? null,
    makerMaximumRpm: mounted?.makerMaximumRpm ?? null,
    typed,
  };
}

function toWheel(row: Row): Wheel {
  return {
    ...storedFields(row),
    tag: row.tag,
    data: {
      marking: row.marking,
      diameterNewMm: row.diameterNewMm,
      diameterNowMm: row.diameterNowMm,
      widthMm: row.widthMm,
      holeMm: row.holeMm,
      markedRpm: row.markedRpm,
      markedSpeedMPerS: row.markedSpeedMPerS,
      markingReadOn: row.markingReadOn,
      mounted: toMounted(row),
      looked: row.looked,
      rung: row.rung,
      expiresOn: row.expiresOn,
      state: row.state,
      setAsideReason: row.setAsideReason,
    },
    typed: row.typed,
  };
}

function toMounted(row: Row): WheelData['mounted'] {
  const { mandrelDiameterMm, mandrelOverhangMm, mandrelThreaded, makerMaximumRpm } = row;
  if (mandrelDiameterMm === null || mandrelOverhangMm === null || mandrelThreaded === null)
    return null;
  return {
    mandrelDiameterMm,
    overhangMm: mandrelOverhangMm,
    threaded: mandrelThreaded,
    makerMaximumRpm,
  };
}
