import { and, asc, eq, sql, type InferSelectModel } from 'drizzle-orm';

import type { Transaction } from '@/db/client';
import { lathes } from '@/db/schema';
import type { CreateLatheRequest, Lathe } from '@/shared/contracts/machines';

import { taken } from '../refusals';
import { storedFields, type Lock } from '../stored-items';
import { keepingUnique } from '../unique';

type Content = Omit<CreateLatheRequest, 'id'>;

export const lathesRepository = (tx: Transaction, shopId: string) => {
  const one = (id: string) => and(eq(lathes.shopId, shopId), eq(lathes.id, id));

  return {
    async list(): Promise<Lathe[]> {
      const rows = await tx
        .select()
        .from(lathes)
        .where(eq(lathes.shopId, shopId))
        .orderBy(asc(sql`lower(${lathes.name})`));
      return rows.map(toLathe);
    },

    async find(id: string, lock?: Lock): Promise<Lathe | null> {
      const query = tx.select().from(lathes).where(one(id)).$dynamic();
      const [row] = await (lock ? query.for(lock) : query);
      return row ? toLathe(row) : null;
    },

    async creationDigest(id: string): Promise<string | null> {
      const [row] = await tx.select({ digest: lathes.creationDigest }).from(lathes).where(one(id));
      return row?.digest ?? null;
    },

    /** Null when the id is in use. */
    async insert(request: CreateLatheRequest, creationDigest: string): Promise<Lathe | null> {
      const [row] = await nameFree(
        tx
          .insert(lathes)
          .values({ shopId, id: request.id, ...columnsOf(request), creationDigest })
          .onConflictDoNothing({ target: [lathes.shopId, lathes.id] })
          .returning(),
      );
      return row ? toLathe(row) : null;
    },

    async update(id: string, content: Content): Promise<Lathe> {
      const [row] = await nameFree(
        tx
          .update(lathes)
          .set({
            ...columnsOf(content),
            version: sql`${lathes.version} + 1`,
            updatedAt: sql`now()`,
          })
          .where(one(id))
          .returning(),
      );
      if (!row) throw new Error(`lathe ${id} is not there to update`);
      return toLathe(row);
    },
  };
};

export type LathesRepository = ReturnType<typeof lathesRepository>;

const nameFree = <T>(write: Promise<T>) =>
  keepingUnique(write, { lathes_name: taken('name', 'Another lathe of this shop has this name.') });

const columnsOf = ({ name, data, typed }: Content) => ({ name, ...data, typed });

function toLathe(row: InferSelectModel<typeof lathes>): Lathe {
  return {
    ...storedFields(row),
    name: row.name,
    data: {
      spindleSpeedsRpm: row.spindleSpeedsRpm,
      feedsMmPerRev: row.feedsMmPerRev,
      crossSlideDivisionMm: row.crossSlideDivisionMm,
      crossSlideReads: row.crossSlideReads,
      crossSlideDivisionsPerTurn: row.crossSlideDivisionsPerTurn,
      compoundZero: row.compoundZero,
      compoundDivisionMm: row.compoundDivisionMm,
      compoundTravelMm: row.compoundTravelMm,
      compoundMmPerTurn: row.compoundMmPerTurn,
      spindleNose: row.spindleNose,
    },
    typed: row.typed,
  };
}
