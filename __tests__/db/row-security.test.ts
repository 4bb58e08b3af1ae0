import { randomUUID } from 'node:crypto';

import { sql } from 'drizzle-orm';
import { Client } from 'pg';

import { createDatabase, type Transaction } from '@/db/client';

import { INSERT_WHEEL, insertShop, openTestDatabase, type TestDatabase } from '../support/database';

/** Outside every shop: read before a shop is known. What guards them stands in the tests below. */
const OUTSIDE = ['persons', 'rate_limits', 'sessions', 'shops'];

const mine = { shopId: randomUUID(), personId: randomUUID() };
const theirs = { shopId: randomUUID(), personId: randomUUID() };

let db: TestDatabase;
beforeAll(async () => {
  db = await openTestDatabase();
  await insertShop(db.as.owner, { ...mine, wheels: 2 });
  await insertShop(db.as.owner, { ...theirs, wheels: 3 });
});
afterAll(() => db.drop());

const namesOf = async (query: string, parameters: unknown[] = []): Promise<string[]> => {
  const { rows } = await db.as.owner.query<{ name: string }>(query, parameters);
  return rows.map(({ name }) => name);
};

const TABLES = `select c.relname as name from pg_class c
  join pg_namespace n on n.oid = c.relnamespace
  where n.nspname = 'public' and c.relkind in ('r', 'p', 'f', 'v', 'm')`;
const HAS_SHOP = `exists (select from pg_attribute a where a.attrelid = c.oid and a.attname = 'shop_id')`;

describe('the catalogue', () => {
  it('knows a shop in every table but the few that stand outside', async () => {
    expect(await namesOf(`${TABLES} and not ${HAS_SHOP} order by 1`)).toEqual(OUTSIDE);
  });

  it('enables and forces row security on every table of a shop, and on persons and shops', async () => {
    const loose = `${TABLES} and (${HAS_SHOP} or c.relname in ('persons', 'shops'))
      and not (c.relrowsecurity and c.relforcerowsecurity)`;
    expect(await namesOf(loose)).toEqual([]);
  });

  it('guards each such table by one policy for reading and writing, and others for reading only', async () => {
    const { rows } = await db.as.owner.query<{ table: string; command: string; guarded: boolean }>(
      `select tablename as table, cmd as command, qual is not null and with_check is not null as guarded
       from pg_policies where schemaname = 'public' order by 1, 2`,
    );
    const tables = await namesOf(
      `${TABLES} and (${HAS_SHOP} or c.relname in ('persons', 'shops'))`,
    );
    for (const table of tables) {
      const policies = rows.filter((policy) => policy.table === table);
      expect([table, policies.filter(({ command }) => command === 'ALL')]).toEqual([
        table,
        [{ table, command: 'ALL', guarded: true }],
      ]);
      const others = policies.filter(({ command }) => command !== 'ALL');
      expect(others.every(({ command }) => command === 'SELECT')).toBe(true);
    }
  });

  it('binds every policy to the transaction’s shop or person, and to nothing when there is none', async () => {
    const { rows } = await db.as.owner.query<{ policyname: string; qual: string; check: string }>(
      `select policyname, qual, coalesce(with_check, qual) as check from pg_policies
       where schemaname = 'public'`,
    );
    const bound =
      /SELECT \(NULLIF\(current_setting\('app\.(shop|person)_id'::text, true\), ''::text\)\)::uuid/;
    for (const { policyname, qual, check } of rows) {
      expect([policyname, qual]).toEqual([policyname, expect.stringMatching(bound)]);
      expect([policyname, check]).toEqual([policyname, qual]);
    }
  });

  it('puts the shop into every unique key and every reference of a shop’s table', async () => {
    const shopless = (keys: string, of: string) => `
      select ${of}.conname as name from pg_constraint ${of} join pg_class c on c.oid = ${of}.conrelid
      join pg_namespace n on n.oid = c.relnamespace
      where n.nspname = 'public' and ${HAS_SHOP} and ${of}.contype in (${keys})
      and not exists (select from pg_attribute a
        where a.attrelid = c.oid and a.attname = 'shop_id' and a.attnum = any (${of}.conkey))`;
    expect(await namesOf(shopless("'p', 'u', 'x'", 'k'))).toEqual([]);
    // A membership is what ties a person, who is nobody's, to a shop.
    expect(await namesOf(shopless("'f'", 'f'))).toEqual(['memberships_person']);
    const indexes = `
      select i.indexrelid::regclass::text as name from pg_index i join pg_class c on c.oid = i.indrelid
      join pg_namespace n on n.oid = c.relnamespace
      where n.nspname = 'public' and ${HAS_SHOP} and i.indisunique
      and not exists (select from pg_attribute a
        where a.attrelid = c.oid and a.attname = 'shop_id' and a.attnum = any (i.indkey))`;
    expect(await namesOf(indexes)).toEqual([]);
  });

  it('gives the application a role that policies bind, and that owns nothing', async () => {
    const { rows } = await db.as.owner.query(
      `select rolname, rolsuper, rolbypassrls, rolcreaterole, rolcreatedb, rolreplication
       from pg_roles where rolname like 'ringtrue%' order by 1`,
    );
    const none = {
      rolsuper: false,
      rolcreaterole: false,
      rolcreatedb: false,
      rolreplication: false,
    };
    expect(rows).toEqual([
      { rolname: 'ringtrue_app', ...none, rolbypassrls: false },
      { rolname: 'ringtrue_backup', ...none, rolbypassrls: true },
      { rolname: 'ringtrue_owner', ...none, rolbypassrls: true },
    ]);
    const owned = `${TABLES} and pg_get_userbyid(c.relowner) <> 'ringtrue_owner'`;
    expect(await namesOf(owned)).toEqual([]);
    const member = `select r.rolname as name from pg_auth_members m join pg_roles r on r.oid = m.roleid
      where m.member = 'ringtrue_app'::regrole`;
    expect(await namesOf(member)).toEqual([]);
  });

  it('grants no right that policies do not bind', async () => {
    const unbound = `select table_name || ' ' || privilege_type as name
      from information_schema.table_privileges
      where table_schema = 'public' and grantee in ('ringtrue_app', 'PUBLIC')
      and privilege_type in ('TRUNCATE', 'REFERENCES', 'TRIGGER')`;
    expect(await namesOf(unbound)).toEqual([]);
    const audit = `select privilege_type as name from information_schema.table_privileges
      where table_name = 'audit_entries' and grantee = 'ringtrue_app' order by 1`;
    expect(await namesOf(audit)).toEqual(['INSERT', 'SELECT']);
    const views = `${TABLES} and c.relkind in ('v', 'm')`;
    expect(await namesOf(views)).toEqual([]);
  });

  it('lets nobody run a function with the owner’s rights but those that find credentials and wheels', async () => {
    const definers = `select p.proname as name from pg_proc p join pg_namespace n on n.oid = p.pronamespace
      where n.nspname = 'public' and p.prosecdef`;
    expect(await namesOf(`${definers} order by 1`)).toEqual(['credentials_of', 'wheels_holding']);
    for (const call of ["credentials_of('a@example.test')", "wheels_holding('%', 10)"])
      await expect(db.as.backup.query(`select * from ${call}`)).rejects.toThrow(
        'permission denied',
      );
  });
});

describe('the application role', () => {
  const shopTables = () => namesOf(`${TABLES} and ${HAS_SHOP} order by 1`);

  it('sees no row of any shop while no shop is set, nor after one was', async () => {
    const counts = async () => {
      const found: Record<string, string> = {};
      for (const table of [...(await shopTables()), 'persons', 'shops']) {
        const { rows } = await db.as.app.query<{ count: string }>(`select count(*) from ${table}`);
        found[table] = rows[0]?.count ?? '';
      }
      return Object.values(found);
    };
    expect(new Set(await counts())).toEqual(new Set(['0']));
    await db.as.app.query('begin');
    await db.as.app.query(`select set_config('app.shop_id', $1, true)`, [mine.shopId]);
    const { rowCount } = await db.as.app.query('select id from wheels');
    expect(rowCount).toBe(2);
    await db.as.app.query('commit');
    expect(new Set(await counts())).toEqual(new Set(['0']));
  });

  it('writes nothing while no shop is set', async () => {
    await expect(db.as.app.query(INSERT_WHEEL, [mine.shopId, randomUUID(), 'X'])).rejects.toThrow(
      'row-level security',
    );
    const { rowCount } = await db.as.app.query(`update wheels set tag = 'gone'`);
    expect(rowCount).toBe(0);
  });

  const inMine = <T>(work: (tx: Transaction) => Promise<T>) =>
    db.database.withShop(mine.shopId, mine.personId, work);
  const insertWheel = (shopId: string, id: string, tag: string) => (tx: Transaction) =>
    tx.execute(sql`insert into wheels (shop_id, id, tag, diameter_new_mm, diameter_now_mm, width_mm, hole_mm,
      state, typed, creation_digest)
      values (${shopId}, ${id}, ${tag}, 25, 24, 20, 8, 'on the rack', '{}', 'digest')`);
  const refusedByPolicy = {
    cause: { message: expect.stringContaining('row-level security') },
  };

  it('can put no row into another shop, nor move one there', async () => {
    const { shopId } = theirs;
    await expect(inMine(insertWheel(shopId, randomUUID(), 'X'))).rejects.toMatchObject(
      refusedByPolicy,
    );
    await expect(
      inMine((tx) => tx.execute(sql`update wheels set shop_id = ${shopId}`)),
    ).rejects.toMatchObject(refusedByPolicy);
  });

  it('learns nothing of another shop from an id or a tag that it uses too', async () => {
    const { rows } = await db.as.owner.query<{ id: string; tag: string }>(
      `select id, 'W2' as tag from wheels where shop_id = $1 and tag = 'W2'`,
      [theirs.shopId],
    );
    const [wheel] = rows;
    await inMine(insertWheel(mine.shopId, wheel?.id ?? '', wheel?.tag ?? ''));
    const found = await inMine((tx) => tx.execute(sql`select id from wheels where tag = 'W2'`));
    expect(found.rows).toEqual([{ id: wheel?.id }]);
  });

  it('sees persons of the shop, their shops and memberships, and no stranger', async () => {
    const idsIn = async (tx: Transaction) => {
      const all = async (query: ReturnType<typeof sql>) =>
        (await tx.execute<{ id: string }>(query)).rows.map(({ id }) => id);
      return {
        persons: await all(sql`select id from persons`),
        shops: await all(sql`select id from shops`),
        memberships: await all(sql`select shop_id as id from memberships`),
      };
    };
    for (const { personId, shopId } of [mine, theirs]) {
      const only = { persons: [personId], shops: [shopId], memberships: [shopId] };
      expect(await db.database.withShop(shopId, personId, idsIn)).toEqual(only);
      expect(await db.database.withPerson(personId, idsIn)).toEqual(only);
    }
    const none = { persons: [], shops: [], memberships: [] };
    expect(await db.database.withNobody(idsIn)).toEqual(none);
  });

  it('reads a password’s hash by the exact address only', async () => {
    await expect(db.as.app.query('select password_hash from persons')).rejects.toThrow(
      'permission denied',
    );
    const find = (address: string) =>
      db.as.app.query('select person_id from credentials_of($1)', [address]);
    expect((await find(`${mine.personId}@example.test`)).rows).toEqual([
      { person_id: mine.personId },
    ]);
    expect((await find('%')).rows).toEqual([]);
  });

  it('can neither change nor remove what is written in the audit', async () => {
    for (const statement of [
      `update audit_entries set action = 'x'`,
      'delete from audit_entries',
      'truncate audit_entries',
      'truncate wheels',
      'create table mine (id int)',
      'alter table wheels disable row level security',
    ])
      await expect(db.as.app.query(statement)).rejects.toThrow(/permission denied|must be owner/);
  });
});

describe('the backup role', () => {
  it('reads every shop, the record of migrations included, and writes nothing', async () => {
    const { rows } = await db.as.backup.query<{ count: string }>('select count(*) from shops');
    expect(rows[0]?.count).toBe('2');
    await db.as.backup.query('select * from drizzle.__drizzle_migrations');
    await expect(db.as.backup.query(`update shops set name = 'x'`)).rejects.toThrow('read-only');
    await db.as.backup.query('set default_transaction_read_only = off');
    await expect(db.as.backup.query(`update shops set name = 'x'`)).rejects.toThrow(
      'permission denied',
    );
  });
});

describe('the server', () => {
  it('refuses to work with a role that sees every shop', async () => {
    for (const role of ['owner', 'backup'] as const) {
      const database = createDatabase(db.urls[role]);
      await expect(database.check()).rejects.toThrow('use the application role');
      await database.close();
    }
    await expect(db.database.check()).resolves.toBeUndefined();
  });

  it('is let in with its password only', async () => {
    const wrong = new URL(db.urls.app);
    wrong.password = 'wrong';
    const client = new Client({ connectionString: wrong.toString() });
    await expect(client.connect()).rejects.toThrow('password authentication failed');
    const { rows } = await db.as.owner.query<{ auth: string }>(
      `select current_setting('password_encryption') as auth`,
    );
    expect(rows).toEqual([{ auth: 'scram-sha-256' }]);
  });
});
