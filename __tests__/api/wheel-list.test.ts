import { wheelPage, type CreateWheelRequest } from '@/shared/contracts/wheels';

import { wheelBody } from '../support/bodies';
import { problemOf } from '../support/item-tests';
import { DRESSED, SET_ASIDE, TRIAL_RUN, wheelShop } from '../support/wheel-shop';

let on: Awaited<ReturnType<typeof wheelShop>>;
const ids: Record<string, string> = {};

type Facts = Partial<CreateWheelRequest['data']>;

/** A wheel that is sound, marked and in date, but for what is said of it. */
const put = async (
  tag: string,
  facts: Facts,
  received: Partial<CreateWheelRequest['received']> = {},
) => {
  const plain = wheelBody({ tag });
  const body = {
    ...plain,
    data: { ...plain.data, smallestUsableMm: null, expiresOn: null, ...facts },
    received: { ...plain.received, diameterMm: null, on: '2026-01-05', ...received },
  };
  await on.shop.as.lead.post(`${on.shop.path}/wheels`).send(body).expect(201);
  ids[tag] = body.id;
};

beforeAll(async () => {
  on = await wheelShop();
  await put('A1', { marking: 'A 60 K 7 V', diameterNewMm: 25, place: 'Peg 1' });
  await put('A2', { marking: 'WA 80 L 6 V', diameterNewMm: 40, markedRpm: 16_700 });
  await put('B1', { marking: 'C 60 J 8 V', diameterNewMm: 60, markedRpm: 11_140, place: 'peg 1' });
  await put('B2', { marking: null, markedRpm: null, markedSpeedMPerS: null });
  await put('C1', { marking: 'A 60 K 7 V', expiresOn: '2026-03-01' });
  await put('C2', { marking: 'A 60 K 7 V', expiresOn: '2026-03-02' });
  await put('D1', { marking: 'A 60 K 7 V' }, { rung: null, on: '2026-02-01' });
  await put('D2', { marking: 'B126 C100 V', diameterNewMm: 30 });
  await on.record(ids.D2 ?? '', SET_ASIDE);
});
afterAll(() => on.api.stop());

const page = async (query: Record<string, string | number>) =>
  wheelPage.parse(
    (await on.shop.as.apprentice.get(`${on.shop.path}/wheels`).query(query).expect(200)).body,
  );
const tags = async (query: Record<string, string | number>) =>
  (await page(query)).items.map(({ tag }) => tag);

describe('the rack', () => {
  it.each([
    ['usable today', { usable: 'yes' }, ['A1', 'A2', 'B1', 'C2']],
    ['of a state', { state: 'set aside' }, ['D2']],
    ['of aluminium oxide', { abrasive: 'aluminium oxide' }, ['A1', 'A2', 'C1', 'C2', 'D1']],
    ['of silicon carbide', { abrasive: 'silicon carbide' }, ['B1']],
    ['of cBN', { abrasive: 'cBN' }, ['D2']],
    ['of a grain', { grain: 80 }, ['A2']],
    ['at least as large', { diameterFromMm: 40 }, ['A2', 'B1']],
    ['at most as large', { diameterToMm: 40, diameterFromMm: 30 }, ['A2', 'D2']],
    // 60 000 x 35 / (pi x 40) = 16 711 rpm, and 16 700 is marked: the lower counts.
    ['at least as fast', { limitFromRpm: 16_700 }, ['A1', 'A2', 'C1', 'C2', 'D1', 'D2']],
    ['faster', { limitFromRpm: 16_701 }, ['A1', 'C1', 'C2', 'D1', 'D2']],
    ['due by a day', { dueBy: '2026-03-01' }, ['C1', 'D1']],
    ['due by an earlier day', { dueBy: '2026-01-31' }, []],
    ['in one place', { place: 'PEG 1' }, ['A1', 'B1']],
    ['of a text', { search: 'k 7' }, ['A1', 'C1', 'C2', 'D1']],
    ['of a short text', { search: 'c1' }, ['C1', 'D2']],
    ['of several filters', { search: 'a 60', usable: 'yes', dueBy: '2026-03-02' }, ['C2']],
  ])('lists those %s', async (_name, query, expected) => {
    expect(await tags(query)).toEqual(expected);
  });

  it.each([
    ['tag', ['A1', 'A2', 'B1', 'B2', 'C1', 'C2', 'D1', 'D2']],
    ['diameter', ['D2', 'A2', 'B1']],
    ['due', ['D1', 'C1', 'C2']],
    ['latest', ['D2', 'D1', 'C2', 'C1', 'B2', 'B1', 'A2', 'A1']],
  ])('sorts by %s, and turned round, and page by page', async (sort, some) => {
    const all = await tags({ sort });
    expect(all.filter((tag) => some.includes(tag))).toEqual(some);
    const turned = await tags({ sort, order: 'down' });
    expect(turned.filter((tag) => some.includes(tag))).toEqual([...some].reverse());
    for (const order of ['up', 'down']) {
      const seen: string[] = [];
      let after = '';
      do {
        const { items, next } = await page({ sort, order, limit: 3, ...(after ? { after } : {}) });
        seen.push(...items.map(({ tag }) => tag));
        after = next ?? '';
      } while (after);
      expect(seen).toEqual(order === 'up' ? all : turned);
    }
  });

  it('follows a wheel’s entries', async () => {
    const id = ids.A1 ?? '';
    await on.shop.as.lead
      .post(`${on.shop.path}/appointments`)
      .send({
        id,
        personId: on.shop.ids.lead,
        tasks: ['mount', 'dress', 'trial run'],
        wheelClass: 'All',
        from: '2026-01-01',
        until: null,
      })
      .expect(201);
    for (const step of [on.mounted, TRIAL_RUN, DRESSED]) await on.recorded(id, step);
    expect(await tags({ state: 'mounted' })).toEqual(['A1']);
    // 25 - 2 x 0.02 x 5 = 24.8
    expect(await tags({ diameterToMm: 24.9 })).toEqual(['A1']);
    expect((await tags({ sort: 'latest' }))[0]).toBe('A1');
    await on.recorded(id, { kind: 'taken off' });
    expect(await tags({ dueBy: '2026-03-02', search: 'A1' })).toEqual(['A1']);
    expect(await tags({ usable: 'yes', search: 'A1' })).toEqual([]);
  });

  it.each([
    ['usable', 'no'],
    ['state', 'lost'],
    ['abrasive', 'sand'],
    ['grain', 'coarse'],
    ['diameterFromMm', '-1'],
    ['limitFromRpm', 'fast'],
    ['dueBy', 'soon'],
    ['place', ''],
    ['sort', 'colour'],
    ['order', 'sideways'],
  ])('names what it cannot filter by: %s=%s', async (name, value) => {
    const answer = await on.shop.as.lead
      .get(`${on.shop.path}/wheels`)
      .query({ [name]: value })
      .expect(400);
    const paths = problemOf(answer).errors?.map(({ path }) => path);
    expect(new Set(paths)).toEqual(new Set([name]));
  });

  it('takes the key of a page by one order for no other', async () => {
    const { next } = await page({ sort: 'diameter', limit: 2 });
    for (const sort of ['tag', 'due', 'latest']) {
      const answer = await on.shop.as.lead
        .get(`${on.shop.path}/wheels`)
        .query({ sort, after: next ?? '' })
        .expect(400);
      expect(problemOf(answer).errors?.map(({ path }) => path)).toEqual(['after']);
    }
  });
});
