import { wheel, wheelPage, type Wheel } from '@/shared/contracts/wheels';

import { makeShop, startApi, type Api, type TestShop } from '../support/api';
import { wheelBody } from '../support/bodies';
import { describeItem, problemOf } from '../support/item-tests';

describeItem({
  place: 'wheels',
  subject: 'wheel',
  contract: wheel,
  body: () => wheelBody(),
  edited: (body) => ({ ...body, data: { ...body.data, place: 'Peg 11' } }),
  onlyAtFirst: ['received'],
  wrong: {
    tag: 'x'.repeat(21),
    'data.marking': '',
    'data.shape': '99',
    'data.diameterNewMm': 0,
    'data.widthMm': -5,
    'data.holeMm': 25,
    'data.markedRpm': 0,
    'data.markedSpeedMPerS': 201,
    'data.markingReadOn': 'memory',
    'data.mounted': { mandrelDiameterMm: 6 },
    'data.smallestUsableMm': 8,
    'data.madeOn': '2026-02-30',
    'data.expiresOn': '2025-11-02',
    'data.place': 'x'.repeat(41),
    'data.notes': '',
    'received.on': 'yesterday',
    'received.diameterMm': 25.1,
    'received.looked': 'fine',
    'received.rung': 'loud',
  },
});

describe('the wheels of a shop', () => {
  let api: Api;
  let shop: TestShop;
  beforeAll(async () => {
    api = await startApi();
    shop = await makeShop(api);
  });
  afterAll(() => api.stop());

  const at = (id = '') => `${shop.path}/wheels/${id}`.replace(/\/$/, '');
  const make = async (change: Partial<ReturnType<typeof wheelBody>> = {}) => {
    const body = wheelBody(change);
    await shop.as.lead.post(at()).send(body).expect(201);
    const { id, received: _received, ...content } = body;
    return { id, content };
  };
  const list = async (query: Record<string, string | number>) =>
    wheelPage.parse((await shop.as.apprentice.get(at()).query(query).expect(200)).body);

  it('have tags of their own', async () => {
    await make({ tag: 'Rack 7' });
    const answer = await shop.as.lead
      .post(at())
      .send(wheelBody({ tag: 'rack 7' }))
      .expect(409);
    const { code, errors } = problemOf(answer);
    expect(code).toBe('name-taken');
    expect(errors?.map(({ path }) => path)).toEqual(['tag']);
  });

  it('come page by page by tag, each once', async () => {
    const other = await makeShop(api);
    const tags = Array.from({ length: 7 }, (_, index) => `${index % 2 ? 'p' : 'P'}-${index}`);
    for (const tag of tags)
      await other.as.lead.post(`${other.path}/wheels`).send(wheelBody({ tag })).expect(201);
    const seen: Wheel[] = [];
    let after: string | null = null;
    do {
      const query: Record<string, string | number> = after ? { after, limit: 3 } : { limit: 3 };
      const response = await other.as.lead.get(`${other.path}/wheels`).query(query).expect(200);
      const page = wheelPage.parse(response.body);
      seen.push(...page.items);
      after = page.next;
    } while (after);
    expect(seen.map(({ tag }) => tag)).toEqual(tags);
  });

  it('are found by a part of tag or marking, whatever signs it holds', async () => {
    const plain = { ...wheelBody().data, marking: 'C 36 J 8 V' };
    const { id: byMarking } = await make({ tag: 'S1', data: plain });
    const { id: byTag } = await make({ tag: '50%_off\\' });
    expect((await list({ search: '36 j' })).items.map(({ id }) => id)).toEqual([byMarking]);
    expect((await list({ search: '%_OFF\\' })).items.map(({ id }) => id)).toEqual([byTag]);
    expect((await list({ search: '_' })).items.map(({ id }) => id)).toEqual([byTag]);
    expect((await list({ search: 'no such wheel' })).items).toEqual([]);
  });

  it('are not listed for a query that says something else', async () => {
    for (const query of ['limit=0', 'limit=101', 'limit=many', 'colour=red', 'after=zzz']) {
      const answer = await shop.as.lead.get(`${at()}?${query}`).expect(400);
      const { code, errors } = problemOf(answer);
      expect(code).toBe('invalid-query');
      expect(errors?.map(({ path }) => path)).toEqual([query.split('=')[0]]);
    }
  });

  it('keep the maker’s figures of a mounted wheel', async () => {
    const mounted = {
      mandrelDiameterMm: 6,
      overhangMm: 13,
      threaded: false,
      makerMaximumRpm: 34_500,
    };
    const { id } = await make({ data: { ...wheelBody().data, shape: '52', holeMm: 0, mounted } });
    const { body } = await shop.as.lead.get(at(id)).expect(200);
    expect(wheel.parse(body).data.mounted).toEqual(mounted);
  });

  it('say nothing in an edit of what their entries say', async () => {
    const { id, content } = await make();
    for (const field of [
      'state',
      'diameterNowMm',
      'looked',
      'rung',
      'setAsideReason',
      'unsigned',
    ]) {
      const data = { ...content.data, [field]: null };
      const answer = await shop.as.lead
        .put(at(id))
        .send({ version: 1, ...content, data })
        .expect(400);
      expect(problemOf(answer).errors?.map(({ path }) => path)).toEqual([`data.${field}`]);
    }
  });

  it('never become in an edit what their entries rule out', async () => {
    const { id, content } = await make();
    const edit = (data: Partial<typeof content.data>) =>
      shop.as.lead.put(at(id)).send({ version: 1, ...content, data: { ...content.data, ...data } });
    // It came with 24.5 mm.
    const smaller = await edit({ diameterNewMm: 24.4, smallestUsableMm: null }).expect(422);
    expect(problemOf(smaller).errors?.map(({ path }) => path)).toEqual(['data.diameterNewMm']);
    const hollow = await edit({ holeMm: 24.5, smallestUsableMm: null }).expect(422);
    expect(problemOf(hollow).errors?.map(({ path }) => path)).toEqual(['data.holeMm']);
    await edit({ diameterNewMm: 24.5, holeMm: 24.4, smallestUsableMm: null }).expect(200);
  });

  it('came on a day that has been', async () => {
    const received = { on: '2099-01-01', diameterMm: null, looked: null, rung: null };
    const answer = await shop.as.lead.post(at()).send(wheelBody({ received })).expect(422);
    expect(problemOf(answer).errors?.map(({ path }) => path)).toEqual(['received.on']);
  });
});
