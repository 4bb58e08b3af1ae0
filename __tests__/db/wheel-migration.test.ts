import { randomUUID } from 'node:crypto';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { Client } from 'pg';

import { wheelEntriesRepository } from '@/api/wheels/wheel-entries-repository';
import { wheelsRepository } from '@/api/wheels/wheels-repository';
import { createDatabase } from '@/db/client';
import { runMigrations } from '@/db/migrate';
import { provision } from '@/db/provision';
import { foldWheelLife } from '@/shared/rules/wheel-life';

import { insertShop } from '../support/database';

const MIGRATIONS = path.resolve(__dirname, '../../db/migrations');
const FIRST_WITH_ENTRIES = 'rack';
/** As the template's: the roles are the whole cluster's. */
const PASSWORDS = { owner: 'owner', app: 'app', backup: 'backup' };

interface Journal {
  entries: { tag: string }[];
}

/** The migrations as they were before wheels had entries. */
function earlierMigrations(): string {
  const copy = fs.mkdtempSync(path.join(os.tmpdir(), 'ringtrue-earlier-'));
  fs.cpSync(MIGRATIONS, copy, { recursive: true });
  const file = path.join(copy, 'meta/_journal.json');
  const journal = JSON.parse(fs.readFileSync(file, 'utf8')) as Journal;
  const first = journal.entries.findIndex(({ tag }) => tag.endsWith(`_${FIRST_WITH_ENTRIES}`));
  if (first < 1) throw new Error('the migration that brings entries is not there');
  const entries = journal.entries.slice(0, first);
  fs.writeFileSync(file, JSON.stringify({ ...journal, entries }));
  return copy;
}

type Row = Record<string, unknown>;

const ROWS: Row[] = [
  { looked: 'sound', rung: 'clear' },
  { looked: 'sound', rung: 'clear', diameter_now_mm: 23.7 },
  { looked: null, rung: null },
  { looked: 'sound', rung: null },
  { looked: null, rung: 'silent', expires_on: '2027-01-01' },
  { looked: 'sound', rung: 'clear', expires_on: '2020-01-01' },
  { looked: null, rung: null, expires_on: '2020-01-01' },
  { looked: 'sound', rung: 'clear', state: 'mounted' },
  { looked: 'sound', rung: 'clear', state: 'set aside', set_aside_reason: 'Dropped.' },
  { looked: 'damaged', rung: 'dull', state: 'set aside', set_aside_reason: 'Cracked.' },
  { looked: 'sound', rung: null, state: 'scrapped', expires_on: '2027-01-01' },
  {
    looked: 'sound',
    rung: null,
    hole_mm: 0,
    mandrel_diameter_mm: 6,
    mandrel_overhang_mm: 13,
    mandrel_threaded: false,
  },
];

describe('wheels from before entries were kept', () => {
  const name = `earlier_${randomUUID().replaceAll('-', '')}`;
  const shop = { shopId: randomUUID(), personId: randomUUID() };
  const adminUrl = process.env.TEST_DATABASE_ADMIN_URL ?? '';
  const admin = new Client({ connectionString: adminUrl });
  let urls: Awaited<ReturnType<typeof provision>>;
  let owner: Client;

  beforeAll(async () => {
    await admin.connect();
    urls = await provision(adminUrl, name, PASSWORDS);
    const earlier = earlierMigrations();
    await runMigrations(urls.owner, earlier);
    fs.rmSync(earlier, { recursive: true });
    owner = new Client({ connectionString: urls.owner });
    await owner.connect();
    await insertShop(owner, shop);
    for (const [index, row] of ROWS.entries()) {
      const whole = {
        ...{ shop_id: shop.shopId, id: randomUUID(), tag: `W${index}`, typed: '{}' },
        ...{ marking: 'A 60 K 7 V', diameter_new_mm: 25, diameter_now_mm: 25, width_mm: 20 },
        ...{ hole_mm: 8, marked_rpm: 20_000, state: 'on the rack', creation_digest: 'digest' },
        ...row,
      };
      const names = Object.keys(whole);
      await owner.query(
        `insert into wheels (${names.join(', ')})
         values (${names.map((_, at) => `$${at + 1}`).join(', ')})`,
        Object.values(whole),
      );
    }
    await runMigrations(urls.owner);
  });
  afterAll(async () => {
    await owner.end();
    await admin.query(`drop database ${name} with (force)`);
    await admin.end();
  });

  it('have entries that say what their rows said, and are found by what is worked out of them', async () => {
    const database = createDatabase(urls.app);
    await database.withShop(shop.shopId, shop.personId, async (tx) => {
      const wheels = wheelsRepository(tx, shop.shopId);
      const list = { limit: 100, sort: 'tag', order: 'up', today: '2026-03-02' } as const;
      const { items } = await wheels.list(list);
      expect(items).toHaveLength(ROWS.length);
      for (const { id, tag, data, life } of items) {
        const entries = await wheelEntriesRepository(tx, shop.shopId).of(id);
        const { onSpindle, due, receivedOn, ...standing } = foldWheelLife(data, entries);
        const { state, diameterNowMm, looked, rung, setAsideReason, unsigned } = standing;
        const folded = { state, diameterNowMm, looked, rung, setAsideReason, unsigned };
        expect([tag, data]).toEqual([tag, { ...data, ...folded }]);
        expect([tag, life]).toEqual([
          tag,
          {
            ...life,
            receivedOn,
            due,
            onSpindle: onSpindle && { grinderId: null, quillId: null },
          },
        ]);
        expect(entries.every(({ personId }) => personId === shop.personId)).toBe(true);
      }
      const usable = { ...list, usable: 'yes' as const };
      expect((await wheels.list(usable)).items).toEqual([]);
      await wheels.refreshFacts();
      expect((await wheels.list(usable)).items.map(({ tag }) => tag)).toEqual(['W0', 'W1', 'W7']);
      const fast = { ...list, limitFromRpm: 20_000, grain: 60 };
      expect((await wheels.list(fast)).items).toHaveLength(ROWS.length - 1);
    });
    await database.close();
  });
});
