import { eq, sql, type InferSelectModel } from 'drizzle-orm';

import type { Transaction } from '@/db/client';
import { shops } from '@/db/schema';
import type { Shop } from '@/shared/contracts/shops';

import { idReused } from '../refusals';
import { storedFields, type Lock } from '../stored-items';
import { keepingUnique } from '../unique';

type Content = Pick<Shop, 'name' | 'units' | 'timeZone'>;

export const shopsRepository = (tx: Transaction, shopId: string) => ({
  async find(lock?: Lock): Promise<Shop | null> {
    const query = tx.select().from(shops).where(eq(shops.id, shopId)).$dynamic();
    const [row] = await (lock ? query.for(lock) : query);
    return row ? toShop(row) : null;
  },

  async insert(shop: Content & Pick<Shop, 'rules'>): Promise<Shop> {
    const [row] = await keepingUnique(
      tx
        .insert(shops)
        .values({ id: shopId, ...shop })
        .returning(),
      { shops_pkey: idReused() },
    );
    if (!row) throw new Error(`shop ${shopId} was not stored`);
    return toShop(row);
  },

  async update({ name, units, timeZone }: Content): Promise<Shop> {
    const [row] = await tx
      .update(shops)
      .set({
        name,
        units,
        timeZone,
        version: sql`${shops.version} + 1`,
        updatedAt: sql`now()`,
      })
      .where(eq(shops.id, shopId))
      .returning();
    if (!row) throw new Error(`shop ${shopId} is not there to update`);
    return toShop(row);
  },
});

export type ShopsRepository = ReturnType<typeof shopsRepository>;

function toShop(row: InferSelectModel<typeof shops>): Shop {
  return {
    ...storedFields(row),
    name: row.name,
    units: row.units,
    timeZone: row.timeZone,
    rules: row.rules,
  };
}
