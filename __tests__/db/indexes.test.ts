import { randomUUID } from 'node:crypto';

import { sql, type SQL } from 'drizzle-orm';

import { insertShop, openTestDatabase, type TestDatabase } from '../support/database';

const shop = { shopId: randomUUID(), personId: randomUUID() };

/** Enough for the planner to prefer an index that narrows by more than the shop. */
const MANY_SETUPS = `
  insert into setups (shop_id, id, name, operation, inputs, typed, plan, verdict, verdict_count, rules_version,
    updated_by, creation_digest, updated_at)
  select $1, gen_random_uuid(), 'Jaws', 'jaws', '{"operation": "jaws"}', '{}', '{}', 'clear', 0, '1',
    $2, 'digest', now() - n * interval '1 minute'
  from generate_series(1, 3000) n`;

describe('under row security an index still serves', () => {
  let db: TestDatabase;
  beforeAll(async () => {
    db = await openTestDatabase();
    await insertShop(db.as.owner, { ...shop, wheels: 1 });
    await db.as.owner.query(MANY_SETUPS, [shop.shopId, shop.personId]);
    await db.as.owner.query('analyze');
  });
  afterAll(() => db.drop());

  /** The conditions by which indexes are entered; a function that might leak is left to a filter instead. */
  const indexConditions = (query: SQL): Promise<string> =>
    db.database.withShop(shop.shopId, shop.personId, async (tx) => {
      await tx.execute(sql`set local enable_seqscan = off`);
      const { rows } = await tx.execute<{ 'QUERY PLAN': string }>(
        sql`explain (costs off) ${query}`,
      );
      const lines = rows.map((row) => row['QUERY PLAN']);
      return lines.filter((line) => line.includes('Index Cond')).join('\n');
    });

  it('the next page of wheels', async () => {
    const page = sql`select * from wheels where shop_id = ${shop.shopId} and tag_key > 'w7'
      order by tag_key limit 51`;
    expect(await indexConditions(page)).toMatch(/shop_id = .* AND \(tag_key > 'w7'::text\)/);
  });

  it('the next page of setups', async () => {
    const page = sql`select id from setups where shop_id = ${shop.shopId}
      and (updated_at, id) < ('2026-03-02T08:00:00Z'::timestamptz, ${shop.personId}::uuid)
      order by updated_at desc, id desc limit 51`;
    expect(await indexConditions(page)).toMatch(/shop_id = .* AND \(ROW\(updated_at, id\) < ROW/);
  });

  it('the drafts whose plan is out of date', async () => {
    const outdated = sql`select id from setups where shop_id = ${shop.shopId}
      and (rules_version < '1' or rules_version > '1' or good_until < '2026-03-02')`;
    const conditions = await indexConditions(outdated);
    for (const condition of [/rules_version < '1'/, /rules_version > '1'/, /good_until < '2026/])
      expect(conditions).toMatch(condition);
  });

  it.each(['lathe_id', 'grinder_id', 'wheel_id'])('the drafts that use a %s', async (column) => {
    const users = sql`select id from setups where shop_id = ${shop.shopId}
      and ${sql.identifier(column)} = ${randomUUID()}`;
    expect(await indexConditions(users)).toMatch(new RegExp(`shop_id = .* AND \\(${column} =`));
  });
});
