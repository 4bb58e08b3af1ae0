import { randomUUID } from 'node:crypto';

import { and, eq, sql } from 'drizzle-orm';

import { wheelsRepository } from '@/api/wheels/wheels-repository';
import { filtersOf, orderOf, type WheelSearch } from '@/api/wheels/wheels-search-repository';
import { wheels } from '@/db/schema';

import { insertShop, openTestDatabase, type TestDatabase } from '../support/database';
import { insertManyWheels } from '../support/many-wheels';

const WHEELS = 50_000;
const PAGE = 50;
const shop = { shopId: randomUUID(), personId: randomUUID() };
const other = { shopId: randomUUID(), personId: randomUUID() };

/** More rows than these no page may have to read: a few pages, or the few that a filter leaves. */
const FEW = 1200;

let db: TestDatabase;
beforeAll(async () => {
  db = await openTestDatabase();
  await insertShop(db.as.owner, shop);
  await insertShop(db.as.owner, other);
  await insertManyWheels(db.as.owner, other.shopId, 100);
  await insertManyWheels(db.as.owner, shop.shopId, WHEELS);
}, 120_000);
afterAll(() => db.drop());

const search = (over: Partial<WheelSearch>): WheelSearch => ({
  limit: PAGE,
  sort: 'tag',
  order: 'up',
  today: '2026-03-02',
  ...over,
});

interface PlanNode {
  'Node Type': string;
  'Index Name'?: string;
  'Actual Rows': number;
  'Rows Removed by Filter'?: number;
  'Rows Removed by Index Recheck'?: number;
  Plans?: PlanNode[];
}

const nodesOf = (node: PlanNode): PlanNode[] => [node, ...(node.Plans ?? []).flatMap(nodesOf)];

/** The page's own query, carried out by the application role: the indexes it enters, and the rows it reads. */
const explained = (asked: WheelSearch) =>
  db.database.withShop(shop.shopId, shop.personId, async (tx) => {
    const { start, orderBy } = orderOf(asked);
    const page = tx
      .select()
      .from(wheels)
      .where(and(eq(wheels.shopId, shop.shopId), start, filtersOf(asked)))
      .orderBy(...orderBy)
      .limit(PAGE + 1);
    const { rows } = await tx.execute<{ 'QUERY PLAN': { Plan: PlanNode }[] }>(
      sql`explain (analyze, format json) ${page.getSQL()}`,
    );
    const plan = rows[0]?.['QUERY PLAN'][0]?.Plan;
    const nodes = plan ? nodesOf(plan) : [];
    const read = nodes.map(
      (node) =>
        node['Actual Rows'] +
        (node['Rows Removed by Filter'] ?? 0) +
        (node['Rows Removed by Index Recheck'] ?? 0),
    );
    return {
      indexes: nodes.flatMap((node) => node['Index Name'] ?? []),
      kinds: nodes.map((node) => node['Node Type']),
      read: Math.max(...read),
    };
  });

/** The key of the page that starts after so many rows. */
const keyAfter = async (asked: WheelSearch, count: number) =>
  db.database.withShop(shop.shopId, shop.personId, async (tx) => {
    const { orderBy, key } = orderOf(asked);
    const [row] = await tx
      .select()
      .from(wheels)
      .where(eq(wheels.shopId, shop.shopId))
      .orderBy(...orderBy)
      .limit(1)
      .offset(count - 1);
    return Buffer.from(JSON.stringify(row ? key(row) : [])).toString('base64url');
  });

describe('of 50 000 wheels', () => {
  it.each([
    ['tag', 'wheels_tag'],
    ['diameter', 'wheels_diameter'],
    ['due', 'wheels_due'],
    ['latest', 'wheels_latest'],
  ] as const)('page 800 by %s is read from its index, like page 1', async (sort, index) => {
    for (const order of ['up', 'down'] as const) {
      const first = search({ sort, order });
      const after = await keyAfter(first, 799 * PAGE);
      for (const asked of [first, { ...first, after }]) {
        const { indexes, kinds, read } = await explained(asked);
        expect([indexes, read]).toEqual([[index], PAGE + 1]);
        expect(kinds).not.toContain('Sort');
      }
    }
  });

  it.each([
    ['state', { state: 'set aside' }, 'wheels_state'],
    ['abrasive', { abrasive: 'silicon carbide' }, 'wheels_abrasive'],
    ['grain', { grain: 220 }, 'wheels_grain'],
    ['diameter', { diameterFromMm: 120, diameterToMm: 120.3 }, 'wheels_diameter'],
    ['limit', { limitFromRpm: 10_000 }, 'wheels_limit'],
    ['due', { dueBy: '2025-12-31' }, 'wheels_due'],
    ['place', { place: 'SHELF 17' }, 'wheels_place'],
  ] as const)('the few of one %s are found by an index', async (_name, filter, index) => {
    for (const sort of ['tag', 'diameter', 'latest'] as const) {
      const { indexes, read } = await explained(search({ ...filter, sort }));
      expect(indexes).toEqual([index]);
      expect(read).toBeLessThan(FEW);
    }
  });

  it('the few usable ones of a rack that is not are found by an index', async () => {
    await db.as.owner.query('update wheels set usable = not usable where shop_id = $1', [
      shop.shopId,
    ]);
    await db.as.owner.query('vacuum analyze wheels');
    const { indexes, read } = await explained(search({ usable: 'yes' }));
    expect(indexes).toEqual(['wheels_usable']);
    expect(read).toBeLessThan(FEW);
  });

  it('those that hold a text are found by its trigrams, inside the shop', async () => {
    const { rows } = await db.as.owner.query<{ 'QUERY PLAN': string }>(
      `explain (costs off) select id from wheels where shop_id = $1 and search_text like '%012345%' limit 1001`,
      [shop.shopId],
    );
    const plan = rows.map((row) => row['QUERY PLAN']).join('\n');
    expect(plan).toMatch(/Bitmap Index Scan on wheels_search/);
    expect(plan).toMatch(/Index Cond: \(\(shop_id = .*search_text ~~/);
    const found = (text: string) =>
      db.database.withShop(shop.shopId, shop.personId, (tx) =>
        wheelsRepository(tx, shop.shopId).list(search({ search: text })),
      );
    expect((await found('t012345')).items.map(({ tag }) => tag)).toEqual(['T012345']);
    expect((await found('no such wheel')).items).toEqual([]);
    const many = await found('a 47');
    expect(many.items).toHaveLength(PAGE);
    expect(many.next).not.toBeNull();
  });

  it('the places are read leap by leap', async () => {
    const places = await db.database.withShop(shop.shopId, shop.personId, (tx) =>
      wheelsRepository(tx, shop.shopId).places(),
    );
    expect(places).toHaveLength(500);
    expect(new Set(places).size).toBe(500);
  });
});
