import { v7 as uuidv7 } from 'uuid';

import { setup } from '@/shared/contracts/setups';
import { emptySetupInputs } from '@/shared/rules';

import { auditOf, makeShop, startApi, type Api, type TestShop } from '../support/api';
import { grinderBody, latheBody, setupBody, wheelBody } from '../support/bodies';
import { problemOf } from '../support/item-tests';

describe('a setup names only what its shop has', () => {
  let api: Api;
  let shop: TestShop;
  beforeAll(async () => {
    api = await startApi();
    shop = await makeShop(api);
  });
  afterAll(() => api.stop());

  const at = (id = '') => `${shop.path}/setups${id && `/${id}`}`;
  const ids = { latheId: uuidv7(), grinderId: uuidv7(), quillId: uuidv7(), wheelId: uuidv7() };

  const withParts = (parts: Partial<typeof ids>) => {
    const inputs = emptySetupInputs('jaws');
    const { wheelId = null, ...machine } = parts;
    return setupBody({
      inputs: {
        ...inputs,
        machine: { ...inputs.machine, ...machine },
        wheel: { wheelId, typed: null },
      },
    });
  };

  const refusedField = async (parts: Partial<typeof ids>) => {
    const answer = await shop.as.lead.post(at()).send(withParts(parts)).expect(422);
    const { code, errors } = problemOf(answer);
    expect(code).toBe('refused-by-rule');
    return errors?.map(({ path }) => path);
  };

  it('and refuses what is nowhere', async () => {
    expect(await refusedField({ latheId: ids.latheId })).toEqual(['inputs.machine.latheId']);
    expect(await refusedField({ grinderId: ids.grinderId })).toEqual(['inputs.machine.grinderId']);
    expect(await refusedField({ quillId: ids.quillId })).toEqual(['inputs.machine.quillId']);
    expect(await refusedField({ wheelId: ids.wheelId })).toEqual(['inputs.wheel.wheelId']);
  });

  it('and refuses what is another shop’s', async () => {
    const other = await makeShop(api);
    const lathe = latheBody();
    const wheel = wheelBody();
    await other.as.lead.post(`${other.path}/lathes`).send(lathe).expect(201);
    await other.as.lead.post(`${other.path}/wheels`).send(wheel).expect(201);
    expect(await refusedField({ latheId: lathe.id })).toEqual(['inputs.machine.latheId']);
    expect(await refusedField({ wheelId: wheel.id })).toEqual(['inputs.wheel.wheelId']);
  });

  it('and refuses another grinder’s quill, and keeps one that was retired', async () => {
    const [mine, other] = [grinderBody(), grinderBody()];
    for (const grinder of [mine, other])
      await shop.as.lead.post(`${shop.path}/grinders`).send(grinder).expect(201);
    const quillId = mine.quills[0]?.id ?? '';
    expect(await refusedField({ grinderId: other.id, quillId })).toEqual([
      'inputs.machine.quillId',
    ]);
    const { id, ...content } = mine;
    await shop.as.lead
      .put(`${shop.path}/grinders/${id}`)
      .send({ version: 1, ...content, quills: [] })
      .expect(200);
    const body = withParts({ grinderId: id, quillId });
    const answer = await shop.as.lead.post(at()).send(body).expect(201);
    const { plan } = setup.parse(answer.body);
    expect(plan.verdict).toBe('incomplete');
    expect(plan.needs).toContainEqual(expect.objectContaining({ field: 'machine.quillId' }));
  });

  it('and writes nothing of what it refuses', async () => {
    const body = withParts({ latheId: ids.latheId });
    await shop.as.lead.post(at()).send(body).expect(422);
    await shop.as.lead.get(at(body.id)).expect(404);
    expect(await auditOf(api, body.id)).toEqual([]);
  });
});
