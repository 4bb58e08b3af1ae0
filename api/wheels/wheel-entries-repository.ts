import { and, asc, desc, eq, lt, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';

import type { Transaction } from '@/db/client';
import { persons, wheelEntries } from '@/db/schema';
import type { WheelEntryPage, WheelEntryView } from '@/shared/contracts/wheel-entries';
import type { WheelEntry } from '@/shared/domain/wheel-life';

import { isNumber, keyOf, pageOf } from '../paging';
import { idReused } from '../refusals';
import { keepingUnique } from '../unique';
import { stepColumns, toStep } from './wheel-entry-mapping';

interface NewEntry extends WheelEntry {
  wheelId: string;
  note: string | null;
  creationDigest: string;
}

export const wheelEntriesRepository = (tx: Transaction, shopId: string) => {
  const correction = alias(wheelEntries, 'correction');
  const signature = alias(wheelEntries, 'signature');
  const takenBack = alias(wheelEntries, 'taken_back');
  const signer = alias(persons, 'signer');
  const ofShop = eq(wheelEntries.shopId, shopId);

  /** With the correction and the signature that point at it, and the names of who wrote and signed. */
  const views = () =>
    tx
      .select({
        row: wheelEntries,
        name: persons.name,
        correctedBy: correction.id,
        signerId: signer.id,
        signerName: signer.name,
      })
      .from(wheelEntries)
      .innerJoin(persons, eq(persons.id, wheelEntries.personId))
      .leftJoin(
        correction,
        and(eq(correction.shopId, shopId), eq(correction.correctsId, wheelEntries.id)),
      )
      .leftJoin(
        signature,
        and(
          eq(signature.shopId, shopId),
          eq(signature.signsId, wheelEntries.id),
          sql`not exists ${tx
            .select({ one: sql`1` })
            .from(takenBack)
            .where(and(eq(takenBack.shopId, shopId), eq(takenBack.correctsId, signature.id)))}`,
        ),
      )
      .leftJoin(signer, eq(signer.id, signature.personId));

  const find = async (id: string): Promise<WheelEntryView | null> => {
    const [found] = await views().where(and(ofShop, eq(wheelEntries.id, id)));
    return found ? toView(found) : null;
  };

  return {
    find,

    /** All that happened to a wheel, first things first. */
    async of(wheelId: string): Promise<WheelEntry[]> {
      const rows = await tx
        .select()
        .from(wheelEntries)
        .where(and(ofShop, eq(wheelEntries.wheelId, wheelId)))
        .orderBy(asc(wheelEntries.number));
      return rows.map((row) => ({
        id: row.id,
        number: row.number,
        personId: row.personId,
        happenedOn: row.happenedOn,
        needs: row.needs,
        step: toStep(row),
      }));
    },

    /** Newest first. */
    async page(
      wheelId: string,
      { after, limit }: { after?: string | undefined; limit: number },
    ): Promise<WheelEntryPage> {
      const [last] = after === undefined ? [] : keyOf(after, isNumber);
      const rows = await views()
        .where(
          and(
            ofShop,
            eq(wheelEntries.wheelId, wheelId),
            last === undefined ? undefined : lt(wheelEntries.number, Math.trunc(Number(last))),
          ),
        )
        .orderBy(desc(wheelEntries.number))
        .limit(limit + 1);
      return pageOf(rows, limit, { item: toView, key: ({ row }) => [String(row.number)] });
    },

    /** Of the request that made an entry; null where there is none of this id. */
    async creationDigest(id: string): Promise<string | null> {
      const [row] = await tx
        .select({ digest: wheelEntries.creationDigest })
        .from(wheelEntries)
        .where(and(ofShop, eq(wheelEntries.id, id)));
      return row?.digest ?? null;
    },

    async add(...entries: NewEntry[]): Promise<void> {
      await keepingUnique(
        tx
          .insert(wheelEntries)
          .values(
            entries.map(({ step, ...entry }) => ({ shopId, ...entry, ...stepColumns(step) })),
          ),
        { wheel_entries_pkey: idReused() },
      );
    },
  };
};

export type WheelEntriesRepository = ReturnType<typeof wheelEntriesRepository>;

interface Found {
  row: typeof wheelEntries.$inferSelect;
  name: string;
  correctedBy: string | null;
  signerId: string | null;
  signerName: string | null;
}

const toView = ({ row, name, correctedBy, signerId, signerName }: Found): WheelEntryView => ({
  id: row.id,
  number: row.number,
  at: row.at.toISOString(),
  happenedOn: row.happenedOn,
  person: { personId: row.personId, name },
  needs: row.needs,
  note: row.note,
  step: toStep(row),
  correctedBy,
  signedBy:
    signerId !== null && signerName !== null ? { personId: signerId, name: signerName } : null,
});
