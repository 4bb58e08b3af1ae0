import { v7 as uuidv7 } from 'uuid';

import { PASSWORD_COST } from '@/api/auth/passwords';
import { session } from '@/shared/contracts/session';

import { auditOf, makeShop, PASSWORD, startApi, visitorOf, type Api } from '../support/api';
import { problemOf } from '../support/item-tests';

describe('signing up', () => {
  let api: Api;
  beforeAll(async () => {
    api = await startApi({ passwordCost: PASSWORD_COST });
  });
  afterAll(() => api.stop());

  const request = (over: Record<string, unknown> = {}) => {
    const personId = uuidv7();
    return {
      personId,
      shopId: uuidv7(),
      name: 'Winifred Asketh',
      email: `${personId}@example.test`,
      password: PASSWORD,
      shopName: 'Cold Harbour Grinding',
      units: 'inch',
      timeZone: 'Pacific/Auckland',
      ...over,
    };
  };
  const signUp = (body: object) => visitorOf(api).post('/api/sign-up').send(body);

  it('makes a person and the shop they lead, signs them in, and leaves audit rows', async () => {
    const body = request();
    const visitor = visitorOf(api);
    const response = await visitor.post('/api/sign-up').send(body).expect(201);
    const { personId, shopId, name, email, shopName } = body;
    const memberships = [{ shopId, shopName, role: 'lead' }];
    expect(session.parse(response.body)).toEqual({ personId, name, email, memberships });
    const shop = await visitor.get(`/api/shops/${shopId}`).expect(200);
    expect(shop.body).toMatchObject({ units: 'inch', timeZone: 'Pacific/Auckland' });
    expect(await auditOf(api, shopId)).toMatchObject([
      { person_id: personId, action: 'create', subject: 'shop' },
    ]);
    expect(await auditOf(api, personId)).toMatchObject([
      { person_id: personId, action: 'create', subject: 'membership', after: { role: 'lead' } },
    ]);
  });

  it('sent again makes nothing new', async () => {
    const body = request();
    const first = await signUp(body).expect(201);
    const again = await signUp(body).expect(200);
    expect(again.body).toEqual(first.body);
    expect(await auditOf(api, body.shopId)).toHaveLength(1);
  });

  it('sent twice at once makes one person', async () => {
    const body = request();
    const both = await Promise.all([signUp(body), signUp(body)]);
    expect(both.filter(({ status }) => status === 201)).toHaveLength(1);
    expect(both.every(({ status }) => [200, 201, 409].includes(status))).toBe(true);
  });

  it('refuses an address that has an account, and another password with the same ids', async () => {
    const body = request();
    await signUp(body).expect(201);
    for (const other of [
      request({ email: body.email.toUpperCase() }),
      { ...body, password: 'other quiet herons wait' },
    ]) {
      const response = await signUp(other).expect(409);
      const { code, errors } = problemOf(response);
      expect(code).toBe('name-taken');
      expect(errors?.map(({ path }) => path)).toEqual(['email']);
    }
  });

  it('never makes anyone a member of a shop that is there already', async () => {
    const { shopId, ids, as, path } = await makeShop(api);
    const intruder = request({ shopId });
    const response = await signUp(intruder).expect(409);
    expect(problemOf(response).code).toBe('id-reused');
    expect((await as.lead.get(`${path}/members`)).body.items).toHaveLength(3);
    expect(await auditOf(api, intruder.personId)).toEqual([]);
    const impostor = await signUp(request({ personId: ids.lead })).expect(409);
    expect(problemOf(impostor).code).toBe('id-reused');
  });

  it.each([
    ['personId', 'me'],
    ['shopId', ''],
    ['name', ' '],
    ['name', 'x'.repeat(81)],
    ['email', 'winifred'],
    ['email', `${'x'.repeat(250)}@example.test`],
    ['password', 'fourteen chars'],
    ['password', 'x'.repeat(129)],
    ['shopName', ''],
    ['units', 'metric'],
    ['timeZone', 'Here'],
  ])('names %s when it is %j', async (field, value) => {
    const response = await signUp(request({ [field]: value })).expect(400);
    expect(problemOf(response).errors?.map(({ path }) => path)).toEqual([field]);
  });

  it.each([
    ['found in breaches', 'passwordpassword'],
    ['two found in breaches', 'Password12345678'],
    ['one thing again and again', 'abcabcabcabcabcabc'],
    ['the shop’s name', 'Cold Harbour Grinding 1'],
    ['the person’s name', 'winifredasketh!!!!'],
    ['the product’s name and a breached one', 'ringtrue12345678'],
  ])('refuses a password that is %s', async (_what, password) => {
    const response = await signUp(request({ password })).expect(400);
    expect(problemOf(response).errors?.map(({ path }) => path)).toEqual(['password']);
  });

  it.each(['grey lantern under seven', 'correct horse battery staple', 'ünïcödé is fine too 木'])(
    'takes %j',
    async (password) => {
      const body = request({ password });
      await signUp(body).expect(201);
      await visitorOf(api).post('/api/session').send({ email: body.email, password }).expect(200);
    },
  );

  it('keeps no password as it was typed', async () => {
    const body = request();
    await signUp(body).expect(201);
    const { rows } = await api.owner.query<{ password_hash: string }>(
      'select password_hash from persons where id = $1',
      [body.personId],
    );
    expect(rows[0]?.password_hash).toMatch(/^\$argon2id\$v=19\$m=65536,t=3,p=1\$/);
  });
});
