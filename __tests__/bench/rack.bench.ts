import { randomUUID } from 'node:crypto';
import { performance } from 'node:perf_hooks';

import { Client } from 'pg';

import { wheelsRepository } from '@/api/wheels/wheels-repository';
import type { WheelSearch } from '@/api/wheels/wheels-search-repository';
import { createDatabase } from '@/db/client';

import { openCluster } from '../../db/local-server.mjs';
import { insertShop } from '../support/database';
import { insertManyWheels } from '../support/many-wheels';
import { copyTemplate, createTemplate } from '../support/template';

const WARM_UP_ROUNDS = 20;
const ROUNDS = 200;
const PAGE = 50;
const FEW = 100;
const MANY = 50_000;
const FAR_PAGE = 800;

const asked = (over: Partial<WheelSearch> = {}): WheelSearch => ({
  limit: PAGE,
  sort: 'tag',
  order: 'up',
  today: '2026-03-02',
  ...over,
});

/** Lists asked for in both shops; the far page is the large one's alone. */
const LISTS: Record<string, WheelSearch> = {
  'by tag': asked(),
  'by diameter': asked({ sort: 'diameter' }),
  'by due date': asked({ sort: 'due' }),
  'latest first': asked({ sort: 'latest' }),
  'usable today': asked({ usable: 'yes' }),
  'set aside': asked({ state: 'set aside' }),
  'fast ones by diameter': asked({ limitFromRpm: 10_000, sort: 'diameter' }),
  'text of one wheel': asked({ search: 't000042' }),
  'text of many': asked({ search: 'a 47' }),
};

function quantile(times: readonly number[], share: number): number {
  const sorted = [...times].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? NaN;
}

async function measure(urls: { owner: string; app: string }): Promise<void> {
  const owner = new Client({ connectionString: urls.owner });
  await owner.connect();
  const shopOf = async (wheels: number) => {
    const shop = { shopId: randomUUID(), personId: randomUUID() };
    await insertShop(owner, shop);
    await insertManyWheels(owner, shop.shopId, wheels);
    return shop;
  };
  const small = await shopOf(FEW);
  const large = await shopOf(MANY);
  await owner.end();
  const database = createDatabase(urls.app);
  const listIn = ({ shopId, personId }: typeof small, search: WheelSearch) =>
    database.withShop(shopId, personId, (tx) => wheelsRepository(tx, shopId).list(search));
  const timed = async (shop: typeof small, search: WheelSearch) => {
    const started = performance.now();
    await listIn(shop, search);
    return performance.now() - started;
  };

  // Tags are numbered: the last of the page before stands in the key.
  const last = `t${String((FAR_PAGE - 1) * PAGE).padStart(6, '0')}`;
  const after = Buffer.from(JSON.stringify([last])).toString('base64url');
  const far = asked({ after });
  if ((await listIn(large, far)).items.length !== PAGE)
    throw new Error('The far page is not full.');

  const names = [...Object.keys(LISTS), `page ${FAR_PAGE} by tag`];
  const times = new Map(names.map((name) => [name, { few: [] as number[], many: [] as number[] }]));
  // Interleaved, so that whatever else the machine does in the meantime falls on all of them alike.
  for (let round = -WARM_UP_ROUNDS; round < ROUNDS; round += 1)
    for (const name of names) {
      const search = LISTS[name];
      const few = await timed(small, search ?? asked());
      const many = await timed(large, search ?? far);
      if (round < 0) continue;
      times.get(name)?.few.push(few);
      times.get(name)?.many.push(many);
    }
  await database.close();

  process.stdout.write(
    `${ROUNDS} interleaved rounds of pages of ${PAGE}: ${FEW} wheels beside ${MANY}; the far page beside page 1 of ${FEW}\n`,
  );
  console.table(
    names.map((name) => {
      const { few, many } = times.get(name) ?? { few: [], many: [] };
      const ratio = (share: number) => (quantile(many, share) / quantile(few, share)).toFixed(2);
      return {
        of: name,
        [`median at ${FEW}, ms`]: quantile(few, 0.5).toFixed(2),
        [`median at ${MANY}, ms`]: quantile(many, 0.5).toFixed(2),
        'median ratio': ratio(0.5),
        'p95 ratio': ratio(0.95),
      };
    }),
  );
  const median = (name: string) => quantile(times.get(name)?.many ?? [], 0.5);
  const ratio = median(`page ${FAR_PAGE} by tag`) / median('by tag');
  process.stdout.write(`page ${FAR_PAGE} / page 1 at ${MANY} wheels: ${ratio.toFixed(2)}\n`);
}

async function main(): Promise<void> {
  const { adminUrl, close } = await openCluster('test');
  try {
    process.env.TEST_DATABASE_ADMIN_URL = adminUrl;
    await createTemplate(adminUrl);
    const { urls, drop } = await copyTemplate(`bench_${randomUUID().replaceAll('-', '')}`);
    await measure(urls);
    await drop();
  } finally {
    await close();
  }
}

main().catch((error: unknown) => {
  process.stderr.write(
    `${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`,
  );
  process.exitCode = 1;
});
