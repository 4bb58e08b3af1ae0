import { randomUUID } from 'node:crypto';

import { Client } from 'pg';

import { createDatabase, type Database } from '@/db/client';
import type { DatabaseUrls } from '@/db/provision';

import { copyTemplate } from './template';

export interface TestDatabase {
  urls: DatabaseUrls;
  /** As the application uses it. */
  database: Database;
  /** A plain connection of each role. */
  as: Record<keyof DatabaseUrls, Client>;
  drop(): Promise<void>;
}

/** A migrated database of its own, and a way in for each role. */
export async function openTestDatabase(options: { poolSize?: number } = {}): Promise<TestDatabase> {
  const { urls, drop } = await copyTemplate(`test_${randomUUID().replaceAll('-', '')}`);
  const connect = async (url: string) => {
    const client = new Client({ connectionString: url });
    await client.connect();
    return client;
  };
  const as = {
    owner: await connect(urls.owner),
    app: await connect(urls.app),
    backup: await connect(urls.backup),
  };
  const database = createDatabase(urls.app, options);
  return {
    urls,
    database,
    as,
    async drop() {
      await database.close();
      await Promise.all(Object.values(as).map((client) => client.end()));
      await drop();
    },
  };
}

interface NewShop {
  shopId: string;
  personId: string;
  wheels?: number;
}

/** Puts in a shop with one person and some wheels, past every policy. */
export async function insertShop(owner: Client, { shopId, personId, wheels = 0 }: NewShop) {
  await owner.query(
    `insert into persons (id, name, email, password_hash) values ($1, 'Person', $2, 'hash')`,
    [personId, `${personId}@example.test`],
  );
  await owner.query(
    `insert into shops (id, name, units, time_zone, rules) values ($1, 'Shop', 'mm', 'UTC', '{}')`,
    [shopId],
  );
  await owner.query(`insert into memberships (shop_id, person_id, role) values ($1, $2, 'lead')`, [
    shopId,
    personId,
  ]);
  for (let number = 0; number < wheels; number += 1)
    await owner.query(INSERT_WHEEL, [shopId, randomUUID(), `W${number}`]);
}

/** Parameters: shop, id, tag. */
export const INSERT_WHEEL = `
  insert into wheels (shop_id, id, tag, diameter_new_mm, diameter_now_mm, width_mm, hole_mm, state, typed,
    creation_digest)
  values ($1, $2, $3, 25, 24, 20, 8, 'on the rack', '{}', 'digest')`;
