import { LIMIT_POINTS } from '@/api/http/rate-limits';

import { makeShop, PASSWORD, signIn, startApi, visitorOf, type Api } from '../support/api';
import { problemOf } from '../support/item-tests';

const FEW = { ...LIMIT_POINTS, signInBurstPerMinute: 1000, signUpPerAddressPerHour: 1000 };

async function withApi(
  options: Parameters<typeof startApi>[0],
  check: (api: Api) => Promise<void>,
) {
  const api = await startApi(options);
  try {
    await check(api);
  } finally {
    await api.stop();
  }
}

function expectRefused(response: { status: number; headers: Record<string, string> }): number {
  expect(response.status).toBe(429);
  const seconds = Number(response.headers['retry-after']);
  expect(seconds).toBeGreaterThanOrEqual(1);
  return seconds;
}

describe('guessing a password', () => {
  it('pauses after five wrong ones, each time for longer, also for the right one', () =>
    withApi({ limitPoints: FEW }, async (api) => {
      const { ids } = await makeShop(api);
      const email = `lead-${ids.lead}@example.test`;
      const attempt = (password: string) =>
        visitorOf(api).post('/api/session').send({ email, password });
      for (let count = 0; count < 5; count += 1) await attempt('wrong').expect(401);
      const refused = await attempt(PASSWORD);
      expectRefused(refused);
      expect(problemOf(refused).code).toBe('too-many-requests');
      // Another account is not held up by it.
      await signIn(api, `machinist-${ids.machinist}@example.test`);

      const pauses: number[] = [];
      for (let count = 0; count < 3; count += 1) {
        await api.owner.query("delete from rate_limits where key like 'sign-in-pause%'");
        await attempt('wrong').expect(401);
        pauses.push(expectRefused(await attempt('wrong')));
      }
      expect(pauses).toEqual([2, 4, 8]);

      await api.owner.query("delete from rate_limits where key like 'sign-in-pause%'");
      await attempt(PASSWORD).expect(200);
      await attempt('wrong').expect(401);
      await attempt(PASSWORD).expect(200);
    }));

  it('goes no faster by asking many times at once', () =>
    withApi({ limitPoints: { ...LIMIT_POINTS, signInBurstPerMinute: 4 } }, async (api) => {
      const attempt = () =>
        visitorOf(api).post('/api/session').send({ email: 'a@example.test', password: 'wrong' });
      const answers = await Promise.all(Array.from({ length: 12 }, attempt));
      expect(answers.filter(({ status }) => status === 401).length).toBeLessThanOrEqual(4);
      expect(answers.filter(({ status }) => status === 429).length).toBeGreaterThanOrEqual(8);
    }));

  it('is bounded for one address, whatever the accounts', () =>
    withApi({ limitPoints: { ...FEW, signInPerAddressPerHour: 3 } }, async (api) => {
      const attempt = (name: string) =>
        visitorOf(api)
          .post('/api/session')
          .send({ email: `${name}@example.test`, password: 'wrong' });
      for (const name of ['a', 'b', 'c']) await attempt(name).expect(401);
      expectRefused(await attempt('d'));
    }));

  it('leaves no address of anybody in the table of limits', () =>
    withApi({ limitPoints: FEW }, async (api) => {
      const body = { email: 'somebody@example.test', password: 'wrong' };
      await visitorOf(api).post('/api/session').send(body).expect(401);
      const { rows } = await api.owner.query<{ key: string }>('select key from rate_limits');
      expect(rows.length).toBeGreaterThan(0);
      for (const { key } of rows) expect(key).not.toMatch(/somebody|127\.0\.0\.1/);
    }));
});

describe('the addresses of one subscriber', () => {
  const spread = (from: string[], points: number) =>
    new Promise<number[]>((resolve, reject) => {
      void withApi(
        { trustProxy: 1, limitPoints: { ...FEW, signInPerAddressPerHour: points } },
        async (api) => {
          const statuses: number[] = [];
          for (const address of from) {
            const { status } = await visitorOf(api)
              .post('/api/session')
              .set('X-Forwarded-For', address)
              .send({ email: `${statuses.length}@example.test`, password: 'wrong' });
            statuses.push(status);
          }
          resolve(statuses);
        },
      ).catch(reject);
    });

  it.each([
    [
      ['2001:db8:1:200::1', '2001:db8:1:2ff:a:b:c:d', '2001:0db8:0001:0234::'],
      [401, 401, 429],
    ],
    [
      ['2001:db8:1:200::1', '2001:db8:1:300::1', '2001:db8:1:400::1'],
      [401, 401, 401],
    ],
    [
      ['::1', '::2', '0:0:0:ff::3'],
      [401, 401, 429],
    ],
    [
      ['198.51.100.7', '::ffff:198.51.100.7', '198.51.100.7'],
      [401, 401, 429],
    ],
    [
      ['198.51.100.7', '198.51.100.8', '198.51.100.9'],
      [401, 401, 401],
    ],
  ])('%j count together where they should', async (addresses, expected) => {
    expect(await spread(addresses, 2)).toEqual(expected);
  });
});

describe('a flood', () => {
  it('of sign-ups from one address is refused', () =>
    withApi({ limitPoints: { ...LIMIT_POINTS, signUpPerAddressPerHour: 1 } }, async (api) => {
      const attempt = () => visitorOf(api).post('/api/sign-up').send(signUpBody());
      await attempt().expect(400);
      await attempt().expect(400);
      const weak = { ...signUpBody(), timeZone: 'UTC', password: 'passwordpassword' };
      await visitorOf(api).post('/api/sign-up').send(weak).expect(400);
      expectRefused(await visitorOf(api).post('/api/sign-up').send(weak));
    }));

  it('of requests from one person is refused, and nobody else’s', () =>
    withApi({ limitPoints: { ...FEW, requestsPerPersonPerMinute: 3 } }, async (api) => {
      const { path, as } = await makeShop(api);
      const answers = [];
      for (let count = 0; count < 4; count += 1) answers.push(await as.lead.get(path));
      expect(answers.map(({ status }) => status)).toEqual([200, 200, 200, 429]);
      await as.machinist.get(path).expect(200);
    }));
});

const signUpBody = () => ({
  personId: '01900000-0000-7000-8000-00000000f001',
  shopId: '01900000-0000-7000-8000-00000000f002',
  name: 'A Person',
  email: 'a@example.test',
  password: PASSWORD,
  shopName: 'A Shop',
  units: 'mm',
  timeZone: 'no such zone',
});
