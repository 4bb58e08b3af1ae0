import { createHash } from 'node:crypto';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { createDatabase } from '@/db/client';

import { makeShop, ORIGIN, startApi, visitorOf, type Api, type TestShop } from '../support/api';
import { latheBody } from '../support/bodies';
import { problemOf } from '../support/item-tests';

const INLINE = 'document.documentElement.dataset.theme = "day";';

function exportedApp(): string {
  const root = fs.mkdtempSync(path.join(os.tmpdir(), 'ringtrue-web-'));
  fs.mkdirSync(path.join(root, '_expo/static/js'), { recursive: true });
  fs.writeFileSync(
    path.join(root, 'index.html'),
    `<!doctype html><script>${INLINE}</script><script src="/_expo/static/js/app-1f2e.js"></script>`,
  );
  fs.writeFileSync(path.join(root, '_expo/static/js/app-1f2e.js'), 'void 0;'.repeat(400));
  fs.writeFileSync(path.join(root, 'icon.svg'), '<svg/>');
  return root;
}

describe('the server', () => {
  let api: Api;
  let shop: TestShop;
  const webRoot = exportedApp();
  beforeAll(async () => {
    api = await startApi({ webRoot });
    shop = await makeShop(api);
  });
  afterAll(async () => {
    await api.stop();
    fs.rmSync(webRoot, { recursive: true });
  });
  const lathes = () => `${shop.path}/lathes`;

  describe('reads JSON and nothing else', () => {
    it.each([
      ['broken', '{"name": '],
      ['not an object', '"name"'],
      ['with a character no text holds', '{"name": "a\\u0000b"}'],
      ['with half a character', '{"name": "\\ud800"}'],
    ])('refuses a body that is %s with 400', async (_what, body) => {
      const response = await shop.as.lead
        .post(lathes())
        .set('Content-Type', 'application/json')
        .send(body)
        .expect(400);
      expect(problemOf(response).code).toBe('invalid-json');
    });

    it.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data; boundary=x'])(
      'refuses %s with 415',
      async (type) => {
        const response = await shop.as.lead
          .post(lathes())
          .set('Content-Type', type)
          .send('{"name":"x"}')
          .expect(415);
        expect(problemOf(response).code).toBe('unsupported-media-type');
      },
    );

    it('refuses another character set and an unknown compression with 415', async () => {
      const post = () => shop.as.lead.post(lathes());
      await post().set('Content-Type', 'application/json; charset=latin1').send('{}').expect(415);
      await post()
        .set('Content-Type', 'application/json')
        .set('Content-Encoding', 'compress')
        .send('{}')
        .expect(415);
    });

    it('refuses more than it reads with 413', async () => {
      const body = { ...latheBody(), note: 'x'.repeat(300_000) };
      const response = await shop.as.lead.post(lathes()).send(body).expect(413);
      expect(problemOf(response).code).toBe('too-large');
    });

    it('refuses no body at all with 400', async () => {
      const response = await shop.as.lead.post(lathes()).expect(400);
      expect(problemOf(response).code).toBe('invalid-body');
    });
  });

  describe('answers with problem details', () => {
    it('405 and the methods there are, for another one', async () => {
      const response = await shop.as.lead.delete(lathes()).expect(405);
      expect(response.headers.allow).toBe('GET, POST, HEAD');
      expect(problemOf(response)).toMatchObject({
        type: '/problems/method-not-allowed',
        status: 405,
        code: 'method-not-allowed',
        requestId: response.headers['x-request-id'],
      });
    });

    it.each(['/api', '/api/nothing', '/api/shops', '/api/Session'])('404 at %s', async (where) => {
      const response = await shop.as.lead.get(where).expect(404);
      expect(problemOf(response).code).toBe('not-found');
    });

    it('404 or 400 for an address that is broken', async () => {
      problemOf(await shop.as.lead.get('/api/shops/%E0%A4%A').expect(404));
      problemOf(await shop.as.lead.get(`${shop.path}/wheels?search=%00`).expect(400));
      problemOf(await shop.as.lead.get(`${shop.path}/wheels?search=a&search=b`).expect(400));
    });

    it('503 while the database does not answer, without a word of why', async () => {
      const cutOff = await startApi({
        database: createDatabase('postgres://ringtrue_app:x@127.0.0.1:1/nowhere'),
      });
      const credentials = { email: 'a@example.test', password: 'x' };
      for (const response of [
        await visitorOf(cutOff).post('/api/session').send(credentials).expect(503),
        await visitorOf(cutOff).get('/api/ready').expect(503),
      ]) {
        expect(problemOf(response).code).toBe('unavailable');
        expect(JSON.stringify(response.body)).not.toMatch(/ECONN|postgres|127|nowhere|at /);
      }
      await visitorOf(cutOff).get('/api/health').expect(200);
      await cutOff.stop();
    });

    it('500 for what nobody foresaw, without a word of why', async () => {
      const broken = await startApi();
      const other = await makeShop(broken);
      await broken.owner.query('alter table wheels rename to gone');
      const response = await other.as.lead.get(`${other.path}/wheels`).expect(500);
      expect(problemOf(response).code).toBe('internal');
      expect(JSON.stringify(response.body)).not.toMatch(/wheels|select|relation|\.ts/);
      await broken.stop();
    });
  });

  describe('is written to from its own pages alone', () => {
    const post = (headers: Record<string, string>) =>
      shop.as.lead.post(lathes()).set(headers).send(latheBody());

    it.each([
      [{ 'Sec-Fetch-Site': 'cross-site' }],
      [{ 'Sec-Fetch-Site': 'same-site' }],
      [{ 'Sec-Fetch-Site': 'cross-site', Origin: ORIGIN }],
      [{ Origin: 'https://elsewhere.test' }],
      [{ Origin: 'null' }],
    ])('refuses %j with 403', async (headers) => {
      const response = await post(headers).expect(403);
      expect(problemOf(response).code).toBe('cross-site');
    });

    it('takes its own pages, and callers that are no browser', async () => {
      await post({ 'Sec-Fetch-Site': 'same-origin' }).expect(201);
      await post({ Origin: ORIGIN }).expect(201);
      await post({}).expect(201);
    });

    it('refuses signing in and out from elsewhere', async () => {
      const headers = { 'Sec-Fetch-Site': 'cross-site' };
      await visitorOf(api).post('/api/session').set(headers).send({}).expect(403);
      await shop.as.machinist.delete('/api/session').set(headers).expect(403);
      await shop.as.machinist.get(shop.path).set(headers).expect(200);
    });
  });

  describe('serves the pages', () => {
    it('the one page at every address of a page, to be asked for anew', async () => {
      for (const where of ['/', '/sign-in', `/shops/${shop.shopId}/setups/1`]) {
        const response = await visitorOf(api).get(where).set('Accept', 'text/html').expect(200);
        expect(response.text).toContain('<!doctype html>');
        expect(response.headers['cache-control']).toBe('no-cache');
        expect(response.headers.etag).toBeDefined();
      }
    });

    it('hashed files for ever, compressed, and other files until they change', async () => {
      const script = await visitorOf(api).get('/_expo/static/js/app-1f2e.js').expect(200);
      expect(script.headers['cache-control']).toBe('public, max-age=31536000, immutable');
      expect(script.headers['content-encoding']).toBe('gzip');
      const icon = await visitorOf(api).get('/icon.svg').expect(200);
      expect(icon.headers['cache-control']).toBe('no-cache');
    });

    it('no page for what is no page', async () => {
      await visitorOf(api).get('/_expo/static/js/old.js').set('Accept', 'text/html').expect(404);
      await visitorOf(api).get('/robots.txt').expect(404);
      await visitorOf(api).post('/sign-in').expect(404);
      await visitorOf(api).get('/data').set('Accept', 'application/json').expect(404);
    });

    it('with a policy that runs no script but its own', async () => {
      const { headers } = await visitorOf(api).get('/').set('Accept', 'text/html').expect(200);
      const policy = String(headers['content-security-policy']);
      const hash = createHash('sha256').update(INLINE).digest('base64');
      expect(policy).toContain(`script-src 'self' 'sha256-${hash}';`);
      expect(policy).toContain("object-src 'none'");
      expect(policy).toContain("frame-ancestors 'none'");
      expect(headers['x-content-type-options']).toBe('nosniff');
      expect(headers['x-powered-by']).toBeUndefined();
      expect(headers['strict-transport-security']).toBeUndefined();
    });
  });

  it('says that answers about a shop are not kept', async () => {
    const { headers } = await shop.as.lead.get(shop.path).expect(200);
    expect(headers['cache-control']).toBe('no-store');
  });

  it('is ready until it is told to stop', async () => {
    await visitorOf(api).get('/api/ready').expect(200, { status: 'ready' });
    const other = await startApi();
    other.announceStop();
    const response = await visitorOf(other).get('/api/ready').expect(503);
    expect(problemOf(response).code).toBe('unavailable');
    await other.stop();
  });
});
