import { v7 as uuidv7 } from 'uuid';

import { PASSWORD_COST } from '@/api/auth/passwords';
import { session } from '@/shared/contracts/session';

import {
  makeShop,
  ORIGIN,
  PASSWORD,
  signIn,
  startApi,
  visitorOf,
  type Api,
  type TestShop,
} from '../support/api';
import { problemOf } from '../support/item-tests';

const HOUR = 3_600_000;
const cookieOf = (response: { headers: Record<string, unknown> }): string =>
  String(response.headers['set-cookie'] ?? '');

describe('a session', () => {
  let api: Api;
  let shop: TestShop;
  let now = new Date('2026-03-02T08:00:00Z');
  const times = { idleMs: 2 * HOUR, absoluteMs: 5 * HOUR };
  const email = () => `lead-${shop.ids.lead}@example.test`;

  beforeAll(async () => {
    api = await startApi({
      now: () => now,
      sessionTimes: times,
      passwordCost: PASSWORD_COST,
    });
    shop = await makeShop(api);
  });
  afterAll(() => api.stop());

  it('is null while nobody is signed in, without an error and without a cookie', async () => {
    const response = await visitorOf(api).get('/api/session').expect(200);
    expect(response.body).toBeNull();
    expect(cookieOf(response)).toBe('');
  });

  it('says who is signed in, and their shops', async () => {
    const visitor = await signIn(api, email());
    const { body } = await visitor.get('/api/session').expect(200);
    expect(session.parse(body)).toEqual({
      personId: shop.ids.lead,
      name: 'Lead Person',
      email: email(),
      memberships: [{ shopId: shop.shopId, shopName: 'Hollin Bank Tools', role: 'lead' }],
    });
  });

  it('starts whatever the case of the address', async () => {
    const shouted = { email: ` ${email().toUpperCase()} `, password: PASSWORD };
    await visitorOf(api).post('/api/session').send(shouted).expect(200);
  });

  it('lives in a cookie that scripts and other sites do not get', async () => {
    const response = await visitorOf(api)
      .post('/api/session')
      .send({ email: email(), password: PASSWORD });
    expect(cookieOf(response)).toMatch(
      /^ringtrue=s%3A[^;]+; Path=\/; Expires=[^;]+; HttpOnly; SameSite=Lax$/,
    );
  });

  it('never goes on under an id that was there before signing in', async () => {
    const visitor = await signIn(api, email());
    const before = cookieOf(await visitor.get('/api/session')).split(';')[0];
    const again = await visitor.post('/api/session').send({ email: email(), password: PASSWORD });
    expect(cookieOf(again).split(';')[0]).not.toBe(before);
    const old = await visitorOf(api).get('/api/session').set('Cookie', String(before));
    expect(old.body).toBeNull();
  });

  it('ends when the person signs out, also for who kept the cookie', async () => {
    const visitor = await signIn(api, email());
    const kept = cookieOf(await visitor.get('/api/session')).split(';')[0];
    const response = await visitor.delete('/api/session').expect(204);
    expect(cookieOf(response)).toContain('Expires=Thu, 01 Jan 1970');
    for (const cookie of [kept, ''])
      await visitorOf(api).get(shop.path).set('Cookie', String(cookie)).expect(401);
    await visitorOf(api).delete('/api/session').expect(204);
  });

  it('ends a fixed time after signing in, however busy it was', async () => {
    const visitor = await signIn(api, email());
    await visitor.get(shop.path).expect(200);
    now = new Date(now.getTime() + times.absoluteMs + 1000);
    await visitor.get(shop.path).expect(401);
  });

  it('ends when it was idle too long', async () => {
    const visitor = await signIn(api, email());
    await api.owner.query(
      `update sessions set expire = expire - interval '${times.idleMs / 1000 + 2} seconds'`,
    );
    await visitor.get(shop.path).expect(401);
  });

  it('does not last in the cookie of another secret', async () => {
    const cookie = cookieOf(await (await signIn(api, email())).get('/api/session')).split(';')[0];
    const forged = String(cookie).slice(0, -6) + 'AAAAAA';
    await visitorOf(api).get(shop.path).set('Cookie', forged).expect(401);
  });

  it.each([
    ['a wrong password', () => ({ email: email(), password: 'four noisy herons wait' })],
    ['an unknown address', () => ({ email: `${uuidv7()}@example.test`, password: PASSWORD })],
  ])('is refused with %s, in the same words', async (_what, credentials) => {
    const response = await visitorOf(api).post('/api/session').send(credentials()).expect(401);
    expect(problemOf(response)).toMatchObject({
      code: 'unauthenticated',
      detail: 'Address and password do not match.',
    });
    expect(cookieOf(response)).toBe('');
  });

  it('takes as long to refuse an unknown address as a wrong password', async () => {
    const median = async (address: () => string) => {
      const times: number[] = [];
      for (let count = 0; count < 5; count += 1) {
        const started = performance.now();
        const body = { email: address(), password: 'four noisy herons wait' };
        await visitorOf(api).post('/api/session').send(body).expect(401);
        times.push(performance.now() - started);
      }
      return times.sort((a, b) => a - b)[2] ?? NaN;
    };
    const known = await median(() => `machinist-${shop.ids.machinist}@example.test`);
    const unknown = await median(() => `${uuidv7()}@example.test`);
    // Without hashing, the unknown one would answer in a tenth of the time.
    expect(unknown / known).toBeGreaterThan(0.4);
    expect(unknown / known).toBeLessThan(2.5);
  });

  it.each([
    ['email', { email: 'nobody', password: PASSWORD }],
    ['password', { email: 'a@example.test', password: '' }],
    ['password', { email: 'a@example.test', password: 'x'.repeat(129) }],
    ['remember', { email: 'a@example.test', password: PASSWORD, remember: true }],
  ])('names %s when it cannot be taken', async (field, body) => {
    const response = await visitorOf(api).post('/api/session').send(body).expect(400);
    expect(problemOf(response).errors?.map(({ path }) => path)).toEqual([field]);
  });
});

describe('over TLS', () => {
  it('the cookie is bound to the host and to TLS, and the browser is told to stay with it', async () => {
    const api = await startApi({
      publicUrl: new URL(ORIGIN.replace('http:', 'https:')),
      trustProxy: 1,
    });
    try {
      const response = await visitorOf(api)
        .post('/api/sign-up')
        .set('X-Forwarded-Proto', 'https')
        .send({
          personId: uuidv7(),
          shopId: uuidv7(),
          name: 'A Person',
          email: 'a@example.test',
          password: PASSWORD,
          shopName: 'Hollin Bank Tools',
          units: 'mm',
          timeZone: 'UTC',
        })
        .expect(201);
      expect(cookieOf(response)).toMatch(
        /^__Host-ringtrue=[^;]+; Path=\/; Expires=[^;]+; HttpOnly; Secure; SameSite=Lax$/,
      );
      expect(response.headers['strict-transport-security']).toMatch(/^max-age=31536000/);
    } finally {
      await api.stop();
    }
  });
});
