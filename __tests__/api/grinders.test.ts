import { v7 as uuidv7 } from 'uuid';

import { grinder, grinderList, type Grinder } from '@/shared/contracts/machines';

import { makeShop, startApi, type Api } from '../support/api';
import { grinderBody, quillBody } from '../support/bodies';
import { describeItem, problemOf } from '../support/item-tests';

describeItem({
  place: 'grinders',
  subject: 'grinder',
  contract: grinder,
  body: () => grinderBody(),
  edited: (body) => ({ ...body, name: `${body.name}, rewound` }),
  wrong: {
    name: '',
    'data.motorNoLoadRpm': 0,
    'data.motorPowerW': -1,
    'data.spindleMaximumRpm': 200_001,
    'data.beltSteps': [],
    'data.beltSteps.0.name': 'eleven char',
    'data.beltSteps.0.drivenPulleyMm': 0,
    'data.beltSteps.0.measured.measuredOn': '0000-01-01',
    'data.guard': 'half',
    'quills.0.data.segments': [],
    'quills.0.data.segments.0.diameterMm': 0,
    'quills.0.data.material': 'wood',
    'quills.0.id': 'q1',
  },
});

describe('a grinder', () => {
  let api: Api;
  beforeAll(async () => {
    api = await startApi();
  });
  afterAll(() => api.stop());

  const stored = async () => {
    const shop = await makeShop(api);
    const body = grinderBody();
    await shop.as.lead.post(`${shop.path}/grinders`).send(body).expect(201);
    const { id, ...content } = body;
    const put = (version: number, change: Partial<typeof content>) =>
      shop.as.lead.put(`${shop.path}/grinders/${id}`).send({ version, ...content, ...change });
    return { shop, id, content, put };
  };

  it('is listed with its belt steps and quills in their order', async () => {
    const { shop, id, content } = await stored();
    const { body } = await shop.as.apprentice.get(`${shop.path}/grinders`).expect(200);
    const [listed] = grinderList.parse(body).items;
    expect(listed).toMatchObject({ id, ...content });
  });

  it('loses a quill that is left out, and has it back under the same id', async () => {
    const { content, put } = await stored();
    const [first] = content.quills;
    const second = { ...quillBody(), name: 'Carbide quill' };
    const { body: swapped } = await put(1, { quills: [second] }).expect(200);
    expect(swapped.quills).toEqual([second]);
    const { body: both } = await put(2, { quills: [second, ...content.quills] }).expect(200);
    expect(grinder.parse(both).quills).toEqual([second, first]);
  });

  it('lets two quills, and two belt steps, swap their names', async () => {
    const { content, put } = await stored();
    const other = { ...quillBody(), name: 'Other quill' };
    await put(1, { quills: [...content.quills, other] }).expect(200);
    const quills = [...content.quills, other];
    const names = quills.map(({ name }) => name).reverse();
    const swapped = quills.map((quill, index) => ({ ...quill, name: names[index] ?? '' }));
    const beltSteps = content.data.beltSteps.map((step, index, all) => ({
      ...step,
      name: all[1 - index]?.name ?? '',
    }));
    const { body } = await put(2, {
      quills: swapped,
      data: { ...content.data, beltSteps },
    }).expect(200);
    const answer: Grinder = grinder.parse(body);
    expect(answer.quills).toEqual(swapped);
    expect(answer.data.beltSteps).toEqual(beltSteps);
  });

  it('refuses two belt steps or two quills of one name or id', async () => {
    const { content, put } = await stored();
    const [step] = content.data.beltSteps;
    const [quill] = content.quills;
    if (!step || !quill) throw new Error('the body has both');
    const twoSteps = [step, { ...step, id: uuidv7(), name: step.name.toLowerCase() }];
    const steps = await put(1, { data: { ...content.data, beltSteps: twoSteps } }).expect(400);
    expect(problemOf(steps).errors?.map(({ path }) => path)).toEqual(['data.beltSteps.1.name']);
    const twoQuills = [quill, { ...quill, name: 'Another' }];
    const quills = await put(1, { quills: twoQuills }).expect(400);
    expect(problemOf(quills).errors?.map(({ path }) => path)).toEqual(['quills.1.id']);
  });

  it('may carry the quill ids of another grinder without touching them', async () => {
    const { shop, id, content } = await stored();
    const twin = grinderBody({ quills: content.quills.map((q) => ({ ...q, name: 'Twin' })) });
    await shop.as.lead.post(`${shop.path}/grinders`).send(twin).expect(201);
    const { body } = await shop.as.lead.get(`${shop.path}/grinders/${id}`).expect(200);
    expect(body.quills).toEqual(content.quills);
  });
});
