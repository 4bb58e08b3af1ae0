import { v7 as uuidv7 } from 'uuid';

import { setup, setupPage, type SetupSummary } from '@/shared/contracts/setups';
import { emptySetupInputs, RULES_VERSION } from '@/shared/rules';

import { auditOf, makeShop, startApi, type Api, type TestShop } from '../support/api';
import { setupBody } from '../support/bodies';
import { describeItem, problemOf } from '../support/item-tests';

describeItem({
  place: 'setups',
  subject: 'setup',
  contract: setup,
  body: () => setupBody(),
  edited: (body) => ({ ...body, name: `${body.name}, second try` }),
  wrong: {
    name: '',
    'inputs.operation': 'mill',
    'inputs.work.material': 'wood',
    'inputs.work.jawBoreMm': 0,
    'inputs.work.jawCount': 2.5,
    'inputs.machine.latheId': 'green one',
    'inputs.wheel.typed': { marking: 'A 60 K 7 V' },
    'inputs.cut.roughInfeedMm': 0.6,
    'inputs.dress.roughPasses': 0,
    typed: { 'work.jawBoreMm': 60 },
  },
});

describe('the setups of a shop', () => {
  let api: Api;
  let shop: TestShop;
  beforeAll(async () => {
    api = await startApi();
    shop = await makeShop(api);
  });
  afterAll(() => api.stop());

  const at = (id = '') => `${shop.path}/setups${id && `/${id}`}`;

  it('carry the plan the server made, its rules version, and who edited last', async () => {
    const body = setupBody();
    await shop.as.lead.post(at()).send(body).expect(201);
    const { id, ...content } = body;
    const response = await shop.as.apprentice
      .put(at(id))
      .send({ version: 1, ...content })
      .expect(200);
    const stored = setup.parse(response.body);
    expect(stored.plan).toMatchObject({ rulesVersion: RULES_VERSION, verdict: 'incomplete' });
    expect(stored.updatedBy).toEqual({ personId: shop.ids.apprentice, name: 'apprentice person' });
    const [, edit] = await auditOf(api, id);
    expect(edit?.after).toMatchObject({ verdict: 'incomplete', rulesVersion: RULES_VERSION });
    expect(edit?.after).not.toHaveProperty('plan');
  });

  it('take no plan from the client', async () => {
    const plan = { rulesVersion: RULES_VERSION, verdict: 'clear' };
    const answer = await shop.as.lead
      .post(at())
      .send({ ...setupBody(), plan })
      .expect(400);
    expect(problemOf(answer).errors?.map(({ path }) => path)).toEqual(['plan']);
  });

  describe('in their list', () => {
    let own: TestShop;
    const bodies = [
      setupBody({ name: 'Jaws, six inch' }),
      setupBody({ name: 'Hub bore', inputs: emptySetupInputs('bore') }),
      setupBody({ name: 'Pump shaft', inputs: emptySetupInputs('outside') }),
      setupBody({ name: 'Jaws, 100 % worn' }),
    ];
    const list = async (query: Record<string, string | number> = {}) =>
      setupPage.parse(
        (await own.as.apprentice.get(`${own.path}/setups`).query(query).expect(200)).body,
      );
    const names = (items: SetupSummary[]) => items.map(({ name }) => name);

    beforeAll(async () => {
      own = await makeShop(api);
      for (const body of bodies)
        await own.as.lead.post(`${own.path}/setups`).send(body).expect(201);
    });

    it('come newest edit first, with verdict and what it rests on', async () => {
      const { items, next } = await list();
      expect(names(items)).toEqual(bodies.map(({ name }) => name).reverse());
      expect(next).toBeNull();
      const [first] = items;
      const { body } = await own.as.lead.get(`${own.path}/setups/${first?.id}`).expect(200);
      const { plan } = setup.parse(body);
      expect(first).toMatchObject({ verdict: plan.verdict, state: 'draft', version: 1 });
      expect(first?.count).toBe(Array.isArray(plan.needs) ? plan.needs.length : NaN);
      expect(first?.count).toBeGreaterThan(0);
    });

    it('come page by page, each once', async () => {
      const seen: SetupSummary[] = [];
      let after: string | null = null;
      do {
        const page: Awaited<ReturnType<typeof list>> = await list(
          after ? { after, limit: 1 } : { limit: 1 },
        );
        seen.push(...page.items);
        after = page.next;
      } while (after);
      expect(names(seen)).toEqual(bodies.map(({ name }) => name).reverse());
    });

    it('are found by name, operation and state', async () => {
      expect(names((await list({ search: 'jaws' })).items)).toEqual([
        'Jaws, 100 % worn',
        'Jaws, six inch',
      ]);
      expect(names((await list({ search: '100 %' })).items)).toEqual(['Jaws, 100 % worn']);
      expect(names((await list({ operation: 'bore' })).items)).toEqual(['Hub bore']);
      expect(names((await list({ state: 'retired' })).items)).toEqual([]);
      expect(
        names((await list({ operation: 'jaws', search: 'six', state: 'draft' })).items),
      ).toEqual(['Jaws, six inch']);
    });

    it('are not listed for a query that says something else', async () => {
      const forged = Buffer.from('["yesterday","x"]').toString('base64url');
      for (const query of ['operation=mill', 'state=lost', `after=${forged}`]) {
        const answer = await own.as.lead.get(`${own.path}/setups?${query}`).expect(400);
        expect(problemOf(answer).errors?.map(({ path }) => path)).toEqual([query.split('=')[0]]);
      }
    });
  });

  describe('duplicated', () => {
    it('have the inputs as they stand under a new id and name, once', async () => {
      const source = setupBody();
      await shop.as.lead.post(at()).send(source).expect(201);
      const request = { id: uuidv7(), name: 'A copy' };
      const copy = await shop.as.apprentice
        .post(`${at(source.id)}/duplicate`)
        .send(request)
        .expect(201);
      expect(setup.parse(copy.body)).toMatchObject({
        ...request,
        inputs: source.inputs,
        typed: source.typed,
        state: 'draft',
        version: 1,
      });
      const again = await shop.as.apprentice
        .post(`${at(source.id)}/duplicate`)
        .send(request)
        .expect(200);
      expect(again.body).toEqual(copy.body);
      expect((await auditOf(api, request.id)).map(({ action }) => action)).toEqual(['create']);
    });

    it('refuse an id in use, an unknown source and a body without a name', async () => {
      const source = setupBody();
      await shop.as.lead.post(at()).send(source).expect(201);
      const duplicate = `${at(source.id)}/duplicate`;
      const used = await shop.as.lead
        .post(duplicate)
        .send({ id: source.id, name: 'X' })
        .expect(409);
      expect(problemOf(used).code).toBe('id-reused');
      await shop.as.lead
        .post(`${at(uuidv7())}/duplicate`)
        .send({ id: uuidv7(), name: 'X' })
        .expect(404);
      const nameless = await shop.as.lead.post(duplicate).send({ id: uuidv7() }).expect(400);
      expect(problemOf(nameless).errors?.map(({ path }) => path)).toEqual(['name']);
    });
  });

  describe('retired', () => {
    it('stay readable, leave an audit row, and take no edit', async () => {
      const body = setupBody();
      await shop.as.lead.post(at()).send(body).expect(201);
      const answer = await shop.as.machinist
        .post(`${at(body.id)}/retire`)
        .send({ version: 1 })
        .expect(200);
      expect(setup.parse(answer.body)).toMatchObject({ state: 'retired', version: 2 });
      expect((await auditOf(api, body.id)).at(-1)).toMatchObject({
        person_id: shop.ids.machinist,
        action: 'retire',
        before: { state: 'draft' },
        after: { state: 'retired' },
      });
      const { id, ...content } = body;
      const edit = await shop.as.lead
        .put(at(id))
        .send({ version: 2, ...content })
        .expect(422);
      expect(problemOf(edit).errors?.map(({ path }) => path)).toEqual(['state']);
      await shop.as.lead
        .post(`${at(id)}/retire`)
        .send({ version: 2 })
        .expect(422);
    });

    it('are retired on the version seen', async () => {
      const body = setupBody();
      await shop.as.lead.post(at()).send(body).expect(201);
      const stale = await shop.as.lead
        .post(`${at(body.id)}/retire`)
        .send({ version: 7 })
        .expect(409);
      expect(problemOf(stale).current).toMatchObject({ id: body.id, version: 1 });
    });
  });
});
