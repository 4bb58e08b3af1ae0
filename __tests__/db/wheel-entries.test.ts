import { randomUUID } from 'node:crypto';

import { sql } from 'drizzle-orm';

import type { Transaction } from '@/db/client';

import { insertShop, openTestDatabase, type TestDatabase } from '../support/database';

const mine = { shopId: randomUUID(), personId: randomUUID() };
const theirs = { shopId: randomUUID(), personId: randomUUID() };

let db: TestDatabase;
/** By shop, the ids of its wheels. */
const wheels = new Map<string, string[]>();
beforeAll(async () => {
  db = await openTestDatabase();
  for (const shop of [mine, theirs]) {
    await insertShop(db.as.owner, { ...shop, wheels: 2 });
    const { rows } = await db.as.owner.query<{ id: string }>(
      'select id from wheels where shop_id = $1 order by tag',
      [shop.shopId],
    );
    wheels.set(
      shop.shopId,
      rows.map(({ id }) => id),
    );
  }
});
afterAll(() => db.drop());

type Row = Record<string, unknown>;

const wheelOf = ({ shopId }: typeof mine, index = 0) => wheels.get(shopId)?.[index] ?? '';

let count = 1;
const entry = (over: Row = {}): Row => {
  count += 1;
  return {
    shop_id: mine.shopId,
    id: randomUUID(),
    wheel_id: wheelOf(mine),
    number: count,
    kind: 'taken off',
    happened_on: '2026-03-02',
    person_id: mine.personId,
    creation_digest: 'digest',
    ...over,
  };
};

const insert = (row: Row, table = 'wheel_entries') => {
  const names = Object.keys(row);
  const values = names.map((_, index) => `$${index + 1}`);
  return db.as.owner.query(
    `insert into ${table} (${names.join(', ')}) values (${values.join(', ')})`,
    Object.values(row),
  );
};

const inMine = <T>(work: (tx: Transaction) => Promise<T>) =>
  db.database.withShop(mine.shopId, mine.personId, work);

describe('an entry of a wheel', () => {
  it.each([
    ['received', { number: 1, diameter_mm: 25 }],
    ['inspected', { look: 'sound' }],
    ['inspected', { look: 'sound', diameter_mm: 24 }],
    ['inspected', { look: 'sound', needs: 'skilled' }],
    ['ring test', { ring: 'silent' }],
    ['mounted', {}],
    ['mounted', { needs: 'appointed' }],
    ['trial run', { minutes: 3, spindle_rpm: 5000 }],
    ['dressed', { depth_mm: 0.02, passes: 3 }],
    ['used', {}],
    ['used', { minutes: 30, diameter_mm: 24 }],
    ['taken off', { note: 'At the end of the shift.' }],
    ['set aside', { reason: 'A chip.' }],
    ['returned', {}],
    ['scrapped', { reason: 'Worn out.' }],
  ])('is taken: %s with %j', async (kind, row) => {
    await expect(insert(entry({ kind, ...row }))).resolves.toMatchObject({ rowCount: 1 });
  });

  it.each([
    ['lost', {}, 'kind'],
    ['received', { diameter_mm: 25 }, 'first'],
    ['taken off', { number: 1 }, 'first'],
    ['inspected', {}, 'look'],
    ['inspected', { look: 'fine' }, 'look_result'],
    ['taken off', { look: 'sound' }, 'look'],
    ['ring test', {}, 'ring'],
    ['ring test', { ring: 'loud' }, 'ring_result'],
    ['ring test', { ring: 'clear', needs: 'appointed' }, 'needs_of_kind'],
    ['dressed', { depth_mm: 0.02, passes: 3, needs: 'skilled' }, 'needs_of_kind'],
    ['taken off', { needs: 'everybody' }, 'needs'],
    ['taken off', { diameter_mm: 24 }, 'diameter_of_kind'],
    ['inspected', { look: 'sound', diameter_mm: 1.9 }, 'diameter_mm'],
    ['mounted', { grinder_id: randomUUID() }, 'spindle'],
    ['taken off', { grinder_id: randomUUID(), quill_id: randomUUID() }, 'spindle'],
    ['mounted', { grinder_id: randomUUID(), quill_id: randomUUID() }, 'quill'],
    ['trial run', { spindle_rpm: 5000 }, 'minutes_of_kind'],
    ['trial run', { minutes: 3 }, 'rpm'],
    ['trial run', { minutes: 0.4, spindle_rpm: 5000 }, 'minutes'],
    ['dressed', { depth_mm: 0.02 }, 'dressing'],
    ['dressed', { depth_mm: 0.21, passes: 3 }, 'depth_mm'],
    ['dressed', { depth_mm: 0.02, passes: 51 }, 'passes'],
    ['used', { passes: 3 }, 'dressing'],
    ['set aside', {}, 'reason'],
    ['set aside', { reason: '' }, 'reason_length'],
    ['returned', { reason: 'It is fine.' }, 'reason'],
    ['countersigned', {}, 'signs_one'],
    ['correction', { reason: 'Wrong wheel.' }, 'corrects_one'],
    ['countersigned', { signs_id: randomUUID() }, 'signed'],
    ['correction', { corrects_id: randomUUID(), reason: 'Wrong wheel.' }, 'corrected'],
    ['taken off', { note: '' }, 'note_length'],
    ['taken off', { person_id: theirs.personId }, 'person'],
  ])('is refused: %s with %j', async (kind, row, constraint) => {
    await expect(insert(entry({ kind, ...row }))).rejects.toMatchObject({
      constraint: `wheel_entries_${constraint}`,
    });
  });

  it('belongs to a wheel of its shop, and points at entries of that wheel', async () => {
    await expect(insert(entry({ wheel_id: wheelOf(theirs) }))).rejects.toMatchObject({
      constraint: 'wheel_entries_wheel',
    });
    const wrong = entry();
    await insert(wrong);
    const correction = { kind: 'correction', corrects_id: wrong.id, reason: 'Wrong wheel.' };
    await expect(
      insert(entry({ ...correction, wheel_id: wheelOf(mine, 1) })),
    ).rejects.toMatchObject({ constraint: 'wheel_entries_corrected' });
    await insert(entry(correction));
    await expect(insert(entry(correction))).rejects.toMatchObject({
      constraint: 'wheel_entries_corrects',
    });
  });

  it('has a number of its own', async () => {
    const first = entry();
    await insert(first);
    await expect(insert(entry({ number: first.number }))).rejects.toMatchObject({
      constraint: 'wheel_entries_number',
    });
  });
});

describe('an appointment', () => {
  const appointment = (over: Row = {}): Row => ({
    shop_id: mine.shopId,
    id: randomUUID(),
    person_id: mine.personId,
    tasks: ['mount'],
    wheel_class: 'All wheels',
    appointed_by: mine.personId,
    from_on: '2026-03-02',
    creation_digest: 'digest',
    ...over,
  });

  it.each([
    [{ tasks: [] }, 'tasks'],
    [{ tasks: ['weld'] }, 'tasks'],
    [{ wheel_class: '' }, 'wheel_class_length'],
    [{ until_on: '2026-03-01' }, 'until'],
    [{ person_id: theirs.personId }, 'person'],
    [{ appointed_by: theirs.personId }, 'appointed_by'],
  ])('is refused with %j', async (over, constraint) => {
    await expect(insert(appointment(over), 'appointments')).rejects.toMatchObject({
      constraint: `appointments_${constraint}`,
    });
    await expect(
      insert(appointment({ until_on: '2026-03-02' }), 'appointments'),
    ).resolves.toBeDefined();
  });
});

describe('the application role', () => {
  it('can neither change nor remove an entry, nor an appointment but to end it', async () => {
    for (const statement of [
      `update wheel_entries set reason = 'x'`,
      'delete from wheel_entries',
      'truncate wheel_entries',
      'delete from appointments',
      `update appointments set tasks = '{dress}'`,
    ])
      await expect(db.as.app.query(statement)).rejects.toThrow('permission denied');
    const { rows } = await db.as.owner.query(
      `select privilege_type from information_schema.table_privileges
       where table_name = 'wheel_entries' and grantee = 'ringtrue_app' order by 1`,
    );
    expect(rows).toEqual([{ privilege_type: 'INSERT' }, { privilege_type: 'SELECT' }]);
  });

  it('sees no entry of another shop, and adds none', async () => {
    await insert(
      entry({
        shop_id: theirs.shopId,
        wheel_id: wheelOf(theirs),
        person_id: theirs.personId,
      }),
    );
    const seen = await inMine((tx) =>
      tx.execute<{ shop_id: string }>(sql`select distinct shop_id from wheel_entries`),
    );
    expect(seen.rows).toEqual([{ shop_id: mine.shopId }]);
    const foreign = inMine((tx) =>
      tx.execute(sql`insert into wheel_entries
        (shop_id, id, wheel_id, number, kind, happened_on, person_id, creation_digest)
        values (${theirs.shopId}, ${randomUUID()}, ${wheelOf(theirs)}, 99, 'taken off', '2026-03-02',
          ${theirs.personId}, 'digest')`),
    );
    await expect(foreign).rejects.toMatchObject({
      cause: { message: expect.stringContaining('row-level security') },
    });
  });

  it('finds by a part of a text in its own shop only, and in none where none is set', async () => {
    const find = (tx: Transaction) =>
      tx.execute<{ id: string }>(sql`select wheels_holding('%w1%', 100) as id`);
    expect((await inMine(find)).rows).toEqual([{ id: wheelOf(mine, 1) }]);
    expect((await db.database.withNobody(find)).rows).toEqual([]);
  });
});
