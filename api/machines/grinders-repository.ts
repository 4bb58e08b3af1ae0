import { and, asc, eq, inArray, isNull, sql } from 'drizzle-orm';

import type { Transaction } from '@/db/client';
import { beltSteps, grinders, quills } from '@/db/schema';
import type { CreateGrinderRequest, Grinder } from '@/shared/contracts/machines';

import { taken } from '../refusals';
import type { Lock } from '../stored-items';
import { keepingUnique } from '../unique';
import {
  beltStepRows,
  columnsOf,
  quillRows,
  toGrinder,
  type GrinderContent,
} from './grinder-mapping';

export const grindersRepository = (tx: Transaction, shopId: string) => {
  const one = (id: string) => and(eq(grinders.shopId, shopId), eq(grinders.id, id));
  type GrinderRow = typeof grinders.$inferSelect;

  async function withParts(rows: GrinderRow[]): Promise<Grinder[]> {
    const ids = rows.map((row) => row.id);
    if (ids.length === 0) return [];
    const steps = await tx
      .select()
      .from(beltSteps)
      .where(and(eq(beltSteps.shopId, shopId), inArray(beltSteps.grinderId, ids)))
      .orderBy(asc(beltSteps.position));
    const kept = await tx
      .select()
      .from(quills)
      .where(
        and(eq(quills.shopId, shopId), inArray(quills.grinderId, ids), isNull(quills.retiredAt)),
      )
      .orderBy(asc(quills.position));
    return rows.map((grinder) =>
      toGrinder({
        grinder,
        beltSteps: steps.filter((step) => step.grinderId === grinder.id),
        quills: kept.filter((quill) => quill.grinderId === grinder.id),
      }),
    );
  }

  async function only(rows: GrinderRow[]): Promise<Grinder | null> {
    const [grinder] = await withParts(rows);
    return grinder ?? null;
  }

  async function writeParts(id: string, content: GrinderContent): Promise<void> {
    await tx
      .delete(beltSteps)
      .where(and(eq(beltSteps.shopId, shopId), eq(beltSteps.grinderId, id)));
    await tx.insert(beltSteps).values(beltStepRows(shopId, id, content));
    // All retire first, and those still listed come back: so two may swap their names.
    await tx
      .update(quills)
      .set({ retiredAt: sql`now()` })
      .where(and(eq(quills.shopId, shopId), eq(quills.grinderId, id), isNull(quills.retiredAt)));
    const key = [quills.shopId, quills.grinderId, quills.id];
    for (const row of quillRows(shopId, id, content))
      await tx.insert(quills).values(row).onConflictDoUpdate({ target: key, set: row });
  }

  return {
    async list(): Promise<Grinder[]> {
      return withParts(
        await tx
          .select()
          .from(grinders)
          .where(eq(grinders.shopId, shopId))
          .orderBy(asc(sql`lower(${grinders.name})`)),
      );
    },

    async find(id: string, lock?: Lock): Promise<Grinder | null> {
      const query = tx.select().from(grinders).where(one(id)).$dynamic();
      return only(await (lock ? query.for(lock) : query));
    },

    async creationDigest(id: string): Promise<string | null> {
      const [row] = await tx
        .select({ digest: grinders.creationDigest })
        .from(grinders)
        .where(one(id));
      return row?.digest ?? null;
    },

    /** Whether the grinder ever had this quill, retired or not. */
    async hadQuill(grinderId: string, quillId: string): Promise<boolean> {
      const rows = await tx
        .select({ id: quills.id })
        .from(quills)
        .where(
          and(eq(quills.shopId, shopId), eq(quills.grinderId, grinderId), eq(quills.id, quillId)),
        );
      return rows.length > 0;
    },

    /** Null when the id is in use. */
    async insert(request: CreateGrinderRequest, creationDigest: string): Promise<Grinder | null> {
      const rows = await nameFree(
        tx
          .insert(grinders)
          .values({ shopId, id: request.id, ...columnsOf(request), creationDigest })
          .onConflictDoNothing({ target: [grinders.shopId, grinders.id] })
          .returning(),
      );
      if (rows.length > 0) await writeParts(request.id, request);
      return only(rows);
    },

    async update(id: string, content: GrinderContent): Promise<Grinder> {
      const rows = await nameFree(
        tx
          .update(grinders)
          .set({
            ...columnsOf(content),
            version: sql`${grinders.version} + 1`,
            updatedAt: sql`now()`,
          })
          .where(one(id))
          .returning(),
      );
      await writeParts(id, content);
      const grinder = await only(rows);
      if (!grinder) throw new Error(`grinder ${id} is not there to update`);
      return grinder;
    },
  };
};

export type GrindersRepository = ReturnType<typeof grindersRepository>;

const nameFree = <T>(write: Promise<T>) =>
  keepingUnique(write, {
    grinders_name: taken('name', 'Another grinder of this shop has this name.'),
  });
