import { lathe, latheList } from '@/shared/contracts/machines';

import { makeShop, startApi, type Api } from '../support/api';
import { latheBody } from '../support/bodies';
import { describeItem, problemOf } from '../support/item-tests';

describeItem({
  place: 'lathes',
  subject: 'lathe',
  contract: lathe,
  body: () => latheBody(),
  edited: (body) => ({ ...body, name: `${body.name}, moved` }),
  wrong: {
    name: '  ',
    'data.spindleSpeedsRpm': [],
    'data.spindleSpeedsRpm.0': 0,
    'data.feedsMmPerRev.0': 21,
    'data.crossSlideDivisionMm': -0.02,
    'data.crossSlideReads': 'circumference',
    'data.crossSlideDivisionsPerTurn': 100.5,
    'data.compoundTravelMm': 1e9,
    'data.spindleNose': '',
    'typed.compoundTravelMm': 'x'.repeat(41),
  },
});

describe('the lathes of a shop', () => {
  let api: Api;
  beforeAll(async () => {
    api = await startApi();
  });
  afterAll(() => api.stop());

  it('are listed by name, whatever its case', async () => {
    const { as, path } = await makeShop(api);
    for (const name of ['b lathe', 'A lathe', 'C lathe'])
      await as.machinist.post(`${path}/lathes`).send(latheBody({ name })).expect(201);
    const { body } = await as.apprentice.get(`${path}/lathes`).expect(200);
    expect(latheList.parse(body).items.map(({ name }) => name)).toEqual([
      'A lathe',
      'b lathe',
      'C lathe',
    ]);
  });

  it('have names of their own', async () => {
    const { as, path } = await makeShop(api);
    await as.lead
      .post(`${path}/lathes`)
      .send(latheBody({ name: 'Long one' }))
      .expect(201);
    const other = latheBody({ name: 'Short one' });
    await as.lead.post(`${path}/lathes`).send(other).expect(201);
    const { id, ...content } = other;
    const answers = [
      await as.lead.post(`${path}/lathes`).send(latheBody({ name: 'LONG ONE' })),
      await as.lead.put(`${path}/lathes/${id}`).send({ version: 1, ...content, name: 'Long One' }),
    ];
    for (const answer of answers) {
      expect(answer.status).toBe(409);
      const { code, errors } = problemOf(answer);
      expect(code).toBe('name-taken');
      expect(errors?.map((error) => error.path)).toEqual(['name']);
    }
  });

  it('keep ten-thousandths of an inch to the last bit', async () => {
    const { as, path } = await makeShop(api);
    const body = latheBody();
    body.data.feedsMmPerRev = [0.0011, 0.0015, 0.0055].map((inches) => inches * 25.4);
    body.data.crossSlideDivisionMm = 0.0001 * 25.4;
    const { body: item } = await as.lead.post(`${path}/lathes`).send(body).expect(201);
    expect(item.data.crossSlideDivisionMm).toBe(body.data.crossSlideDivisionMm);
    expect(item.data.feedsMmPerRev).toEqual(body.data.feedsMmPerRev);
  });
});
