import { v7 as uuidv7 } from 'uuid';

import { shop as shopContract, shopMembers } from '@/shared/contracts/shops';
import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';

import { auditOf, makeShop, startApi, visitorOf, type Api, type TestShop } from '../support/api';
import { problemOf } from '../support/item-tests';

describe('a shop', () => {
  let api: Api;
  let shop: TestShop;
  beforeEach(async () => {
    shop = await makeShop(api);
  });
  beforeAll(async () => {
    api = await startApi();
  });
  afterAll(() => api.stop());

  const edit = { version: 1, name: 'Hollin Bank', units: 'inch', timeZone: 'America/Halifax' };

  it('is read by each of its members', async () => {
    for (const visitor of Object.values(shop.as)) {
      const { body } = await visitor.get(shop.path).expect(200);
      expect(shopContract.parse(body)).toMatchObject({
        id: shop.shopId,
        name: 'Hollin Bank Tools',
        units: 'mm',
        timeZone: 'Europe/Lisbon',
        rules: DEFAULT_SHOP_RULES,
        version: 1,
      });
    }
  });

  it('shows its members to each other, without their addresses', async () => {
    const { body } = await shop.as.apprentice.get(`${shop.path}/members`).expect(200);
    expect(shopMembers.parse(body).items).toEqual([
      { personId: shop.ids.apprentice, name: 'apprentice person', role: 'apprentice' },
      { personId: shop.ids.lead, name: 'Lead Person', role: 'lead' },
      { personId: shop.ids.machinist, name: 'machinist person', role: 'machinist' },
    ]);
  });

  it('is edited by a lead, who leaves an audit row', async () => {
    const { body } = await shop.as.lead.patch(shop.path).send(edit).expect(200);
    expect(shopContract.parse(body)).toMatchObject({ ...edit, version: 2 });
    const audit = await auditOf(api, shop.shopId);
    expect(audit.map(({ action }) => action)).toEqual(['create', 'update']);
    expect(audit[1]).toMatchObject({
      person_id: shop.ids.lead,
      subject: 'shop',
      before: { name: 'Hollin Bank Tools' },
      after: { name: 'Hollin Bank' },
    });
  });

  it.each([
    ['version', { ...edit, version: 0 }],
    ['name', { ...edit, name: ' ' }],
    ['units', { ...edit, units: 'cubit' }],
    ['timeZone', { ...edit, timeZone: 'Mars/Olympus' }],
    ['rules', { ...edit, rules: DEFAULT_SHOP_RULES }],
  ])('names %s when it cannot be taken', async (field, body) => {
    const answer = await shop.as.lead.patch(shop.path).send(body).expect(400);
    expect(problemOf(answer).errors?.map(({ path }) => path)).toEqual([field]);
  });

  it('refuses an edit of an older version, and shows the current one', async () => {
    const { body: current } = await shop.as.lead.patch(shop.path).send(edit).expect(200);
    const answer = await shop.as.lead.patch(shop.path).send(edit).expect(409);
    expect(problemOf(answer)).toMatchObject({ code: 'stale-version', current });
  });

  it('is closed to machinist and apprentice where the lead decides', async () => {
    await shop.as.machinist.patch(shop.path).send(edit).expect(403);
    const answer = await shop.as.apprentice.patch(shop.path).send(edit).expect(403);
    expect(problemOf(answer).code).toBe('forbidden');
  });

  it('does not exist for anybody else', async () => {
    const stranger = (await makeShop(api)).as.lead;
    for (const visitor of [stranger, visitorOf(api)]) {
      const status = visitor === stranger ? 404 : 401;
      await visitor.get(shop.path).expect(status);
      await visitor.get(`${shop.path}/members`).expect(status);
      await visitor.patch(shop.path).send(edit).expect(status);
    }
    await stranger.get(`/api/shops/${uuidv7()}`).expect(404);
    await stranger.get('/api/shops/nowhere').expect(404);
  });
});
