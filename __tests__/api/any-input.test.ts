import fc from 'fast-check';

import { makeShop, startApi, type Api, type TestShop } from '../support/api';
import { grinderBody, latheBody, setupBody, wheelBody } from '../support/bodies';
import { leavesOf, withValue } from '../support/field-paths';
import { problemOf } from '../support/item-tests';

/** What a slip, a script or a curious person may send; `-0` and the likes of it are JSON too. */
const anything = fc.oneof(
  fc.jsonValue(),
  fc.double(),
  fc.string({ unit: 'binary' }),
  fc.constantFrom('0000-01-01', '2026-02-29', '', '\u0000', 'NaN', -0, 1e308, 5e-324, null),
);

const cursor = (key: string[]) => Buffer.from(JSON.stringify(key)).toString('base64url');

const BODIES: Record<string, () => { id: string }> = {
  lathes: latheBody,
  grinders: grinderBody,
  wheels: wheelBody,
  setups: setupBody,
};

describe('whatever is sent', () => {
  let api: Api;
  let shop: TestShop;
  beforeAll(async () => {
    api = await startApi();
    shop = await makeShop(api);
  });
  afterAll(() => api.stop());

  const expectAnswer = (response: { status: number; type: string; body: unknown }) => {
    expect(response.status).toBeLessThan(500);
    if (response.status >= 400) problemOf(response);
  };

  it.each(Object.keys(BODIES))(
    'as a field of one of the %s is stored or refused',
    async (place) => {
      const body = BODIES[place] ?? latheBody;
      const fields = fc.constantFrom(...leavesOf(body()));
      await fc.assert(
        fc.asyncProperty(fields, anything, async (field, value) => {
          const sent = withValue(body(), field, value);
          expectAnswer(await shop.as.lead.post(`${shop.path}/${place}`).send(sent));
        }),
        { numRuns: 120 },
      );
    },
  );

  it('as a whole body is refused', async () => {
    const places = fc.constantFrom('', ...Object.keys(BODIES).map((place) => `/${place}`));
    await fc.assert(
      fc.asyncProperty(places, fc.jsonValue(), async (place, value) => {
        const method = place === '' ? 'patch' : 'post';
        const response = await shop.as.lead[method](`${shop.path}${place}`)
          .set('Content-Type', 'application/json')
          .send(JSON.stringify(value));
        expect(response.status).toBe(400);
        problemOf(response);
      }),
      { numRuns: 60 },
    );
  });

  it('as a search, a place in a list or a part of an address finds something or nothing', async () => {
    const text = fc.string({ unit: 'binary', maxLength: 60 });
    await fc.assert(
      fc.asyncProperty(text, async (value) => {
        const coded = encodeURIComponent(value.toWellFormed());
        for (const where of [
          `/wheels?search=${coded}`,
          `/setups?search=${coded}`,
          `/wheels?after=${coded}`,
          `/setups?after=${cursor([value, value])}`,
          `/setups?after=${cursor(['2026-02-30T00:00:00.000Z', shop.shopId])}`,
          `/wheels?after=${cursor([value])}`,
          `/wheels/${coded}`,
        ])
          expectAnswer(await shop.as.lead.get(`${shop.path}${where}`));
      }),
      { numRuns: 60 },
    );
  });
});
