import { randomUUID } from 'node:crypto';

import { sql } from 'drizzle-orm';
import { drizzle } from 'drizzle-orm/node-postgres';
import fc from 'fast-check';
import type { PoolClient } from 'pg';

import type { Transaction } from '@/db/client';
import * as schema from '@/db/schema';

import { insertShop, openTestDatabase, type TestDatabase } from '../support/database';

const SHOPS = 3;
/** Fewer connections than work going on, so that each is lent to one shop after another. */
const POOL = 2;

interface Visit {
  shop: number;
  act: 'list' | 'rename' | 'fail' | 'insert';
  /** How long it dawdles inside its transaction, ms. */
  dawdle: number;
}

const visit = fc.record({
  shop: fc.nat(SHOPS - 1),
  act: fc.constantFrom('list', 'rename', 'fail', 'insert' as const),
  dawdle: fc.nat(3),
});

type WithShop = TestDatabase['database']['withShop'];

describe('work for several shops on few connections', () => {
  let db: TestDatabase;
  const shops = Array.from({ length: SHOPS }, () => ({
    shopId: randomUUID(),
    personId: randomUUID(),
  }));
  beforeAll(async () => {
    db = await openTestDatabase({ poolSize: POOL });
    for (const shop of shops) await insertShop(db.as.owner, { ...shop, wheels: 2 });
  });
  afterAll(() => db.drop());

  /** What of other shops somebody saw or changed; the queries forget the shop on purpose. */
  async function foreignRows(withShop: WithShop, visits: readonly Visit[]): Promise<number> {
    const foreign = await Promise.all(
      visits.map(async ({ shop, act, dawdle }) => {
        const { shopId, personId } = shops[shop] ?? { shopId: '', personId: '' };
        const work = async (tx: Transaction) => {
          await tx.execute(sql`select pg_sleep(${dawdle / 1000})`);
          if (act === 'fail') throw new Error('on purpose');
          if (act === 'insert')
            await tx.execute(sql`insert into audit_entries (shop_id, id, person_id, action, subject, subject_id)
              values (${shopId}, ${randomUUID()}, ${personId}, 'create', 'wheel', ${randomUUID()})`);
          const { rows } = await (act === 'rename'
            ? tx.execute<{ shop_id: string }>(
                sql`update wheels set marking = ${shopId} returning shop_id`,
              )
            : tx.execute<{ shop_id: string }>(
                sql`select shop_id from wheels union all select shop_id from audit_entries`,
              ));
          if (rows.length === 0) throw new Error('not even its own');
          return rows.filter((row) => row.shop_id !== shopId).length;
        };
        return withShop(shopId, personId, work).catch((error: Error) => {
          if (error.message !== 'on purpose') throw error;
          return 0;
        });
      }),
    );
    return foreign.reduce((sum, count) => sum + count, 0);
  }

  it('never shows or changes a row of another shop, however it interleaves', async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(visit, { minLength: 4, maxLength: 16 }), async (visits) => {
        expect(await foreignRows(db.database.withShop, visits)).toBe(0);
        const { rows } = await db.as.owner.query(
          'select 1 from wheels where marking is not null and marking <> shop_id::text',
        );
        expect(rows).toEqual([]);
      }),
      { numRuns: 25 },
    );
  });

  /** As withShop, but for what it does to the setting. */
  const mutant =
    (set: (client: PoolClient, shopId: string) => Promise<unknown>): WithShop =>
    async (shopId, _personId, work) => {
      const client = await db.database.pool.connect();
      try {
        await client.query('begin');
        await set(client, shopId);
        return await work(drizzle({ client, schema }));
      } finally {
        await client.query('rollback');
        client.release();
      }
    };

  const inTurn = Array.from({ length: 3 * SHOPS }, (_, index): Visit => ({
    shop: index % SHOPS,
    act: 'list',
    dawdle: 0,
  }));

  it('would see nothing at all if the setting were left out', async () => {
    const forgetting = mutant(async () => undefined);
    await expect(foreignRows(forgetting, inTurn)).rejects.toThrow('not even its own');
  });

  // The last one here: it leaves the connections as no other test wants them.
  it('would see another shop’s rows if a connection kept the setting', async () => {
    const seen = new WeakSet<PoolClient>();
    const keeping = mutant(async (client, shopId) => {
      if (seen.has(client)) return;
      seen.add(client);
      await client.query('commit');
      await client.query(`select set_config('app.shop_id', $1, false)`, [shopId]);
      await client.query('begin');
    });
    expect(await foreignRows(keeping, inTurn)).toBeGreaterThan(0);
  });
});
