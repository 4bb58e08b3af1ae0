import { Writable } from 'node:stream';

import { pino } from 'pino';

import { makeShop, PASSWORD, startApi, visitorOf, type Api } from '../support/api';
import { latheBody } from '../support/bodies';

interface Line {
  level: number;
  msg: string;
  req?: { id: string; method: string; path: string };
  res?: { statusCode: number };
  personId?: string;
  event?: string;
  err?: unknown;
}

describe('the log', () => {
  let api: Api;
  let text = '';
  beforeAll(async () => {
    const destination = new Writable({
      write(chunk, _encoding, done) {
        text += String(chunk);
        done();
      },
    });
    api = await startApi({ logger: pino({ level: 'info' }, destination) });
  });
  afterAll(() => api.stop());
  beforeEach(() => {
    text = '';
  });

  const lines = (): Line[] =>
    text
      .trim()
      .split('\n')
      .map((line) => JSON.parse(line));

  it('says who asked for what, under the id that the answer carries', async () => {
    const { as, ids, path } = await makeShop(api);
    text = '';
    const response = await as.lead.get(`${path}/wheels?search=secret`).expect(200);
    expect(lines()).toMatchObject([
      {
        req: { id: response.headers['x-request-id'], method: 'GET', path: `${path}/wheels` },
        res: { statusCode: 200 },
        personId: ids.lead,
      },
    ]);
    expect(text).not.toContain('secret');
  });

  it('holds no password, cookie, address or body', async () => {
    const { as, path, ids } = await makeShop(api);
    const wrong = { email: `lead-${ids.lead}@example.test`, password: 'a wrong password' };
    await visitorOf(api).post('/api/session').send(wrong).expect(401);
    await as.lead
      .post(`${path}/lathes`)
      .set('Content-Type', 'application/json')
      .send('{"name": "half a body')
      .expect(400);
    expect(lines().some(({ event }) => event === 'sign-in failed')).toBe(true);
    for (const secret of [
      PASSWORD,
      'a wrong password',
      'ringtrue=',
      '@example.test',
      'half a body',
    ])
      expect(text).not.toContain(secret);
  });

  it('takes no request id from outside', async () => {
    const response = await visitorOf(api).get('/api/session').set('X-Request-Id', 'mine');
    expect(response.headers['x-request-id']).not.toBe('mine');
  });

  it('keeps quiet about being alive', async () => {
    await visitorOf(api).get('/api/health').expect(200);
    expect(text).toBe('');
  });

  it('tells of a failed query and its cause, and not what was sent with it', async () => {
    const { as, path } = await makeShop(api);
    await api.owner.query('alter table lathes add constraint never check (false) not valid');
    text = '';
    await as.lead
      .post(`${path}/lathes`)
      .send(latheBody({ name: 'The secret lathe' }))
      .expect(500);
    const [failure] = lines().filter(({ level }) => level >= 50);
    expect(failure?.err).toMatchObject({
      message: expect.stringContaining('violates check constraint'),
      constraint: 'never',
      query: expect.stringContaining('insert into "lathes"'),
      stack: expect.stringMatching(/^\s+at /),
    });
    expect(text).not.toContain('The secret lathe');
  });
});
