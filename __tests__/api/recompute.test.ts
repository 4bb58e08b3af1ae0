import { setup, setupPage, type Setup } from '@/shared/contracts/setups';
import type { RecordEntryRequest } from '@/shared/contracts/wheel-entries';
import { demoShop } from '@/db/seed';
import { RULES_VERSION } from '@/shared/rules';

import { auditOf, makeShop, startApi, type Api, type TestShop } from '../support/api';
import { entryBody } from '../support/bodies';

const [lathe] = demoShop.lathes;
const [, grinder] = demoShop.grinders;
const [jaws] = demoShop.setups;
const wheel = demoShop.wheels.find(({ id }) => id === jaws?.inputs.wheel.wheelId);

/** A shop that has the demo's machines and wheels, and its setup for chuck jaws. */
async function shopWithJaws(api: Api): Promise<TestShop & { setupId: string }> {
  if (!jaws) throw new Error('the demo has a setup for jaws');
  const shop = await makeShop(api);
  const typed = {};
  for (const data of demoShop.lathes)
    await shop.as.lead
      .post(`${shop.path}/lathes`)
      .send({ ...data, typed })
      .expect(201);
  for (const data of demoShop.grinders)
    await shop.as.lead
      .post(`${shop.path}/grinders`)
      .send({ ...data, typed })
      .expect(201);
  for (const data of demoShop.wheels)
    await shop.as.lead
      .post(`${shop.path}/wheels`)
      .send({ ...data, typed })
      .expect(201);
  await shop.as.lead
    .post(`${shop.path}/setups`)
    .send({ ...jaws, typed })
    .expect(201);
  return { ...shop, setupId: jaws.id };
}

describe('a draft', () => {
  let api: Api;
  let shop: Awaited<ReturnType<typeof shopWithJaws>>;
  let now = new Date('2026-03-02T08:00:00Z');
  beforeAll(async () => {
    api = await startApi({ now: () => now });
  });
  afterAll(() => api.stop());
  beforeEach(async () => {
    now = new Date('2026-03-02T08:00:00Z');
    shop = await shopWithJaws(api);
  });

  const read = async (): Promise<Setup> =>
    setup.parse((await shop.as.lead.get(`${shop.path}/setups/${shop.setupId}`).expect(200)).body);
  const listedVerdict = async () => {
    const { body } = await shop.as.lead.get(`${shop.path}/setups`).expect(200);
    return setupPage.parse(body).items[0]?.verdict;
  };
  const put = (place: string, thing: object | undefined) =>
    shop.as.lead.put(`${shop.path}/${place}`).send({ version: 1, typed: {}, ...thing });
  const putWheel = (data: object) =>
    put(`wheels/${wheel?.id}`, { tag: wheel?.tag, data: { ...wheel?.data, ...data } });
  const codes = ({ plan }: Setup) =>
    (plan.findings as { code: string; level: string }[])
      .filter(({ level }) => level === 'stop')
      .map(({ code }) => code);

  const record = (step: RecordEntryRequest['step'], over: Partial<RecordEntryRequest> = {}) =>
    shop.as.lead
      .post(`${shop.path}/wheels/${wheel?.id}/entries`)
      .send({ ...entryBody(step), happenedOn: '2026-03-02', ...over });
  const setAside = () =>
    record({ kind: 'set aside', reason: 'A chip at the edge.' }, { version: null });

  it('reads Clear in the demo, from the rules as they are', async () => {
    expect(await read()).toMatchObject({ plan: { verdict: 'clear', rulesVersion: RULES_VERSION } });
    expect(await listedVerdict()).toBe('clear');
  });

  it('stops at once when its wheel is set aside, and says so in the trail', async () => {
    const before = await read();
    await setAside().expect(201);
    const { rows } = await api.owner.query('select verdict from setups where shop_id = $1', [
      shop.shopId,
    ]);
    expect(rows).toEqual([{ verdict: 'stop' }]);
    const after = await read();
    expect(after.plan.verdict).toBe('stop');
    expect(codes(after)).toContain('wheel-set-aside');
    // It was not edited: nobody's edit in progress becomes stale by it.
    expect(after).toMatchObject({ version: before.version, updatedAt: before.updatedAt });
    expect(
      (await auditOf(api, shop.setupId)).filter(({ action }) => action === 'recompute'),
    ).toEqual([
      expect.objectContaining({
        person_id: shop.ids.lead,
        subject: 'setup',
        before: { verdict: 'clear' },
        after: { verdict: 'stop', rulesVersion: RULES_VERSION },
      }),
    ]);
    await record({ kind: 'inspected', look: 'sound', diameterMm: null }, { version: 2 }).expect(
      201,
    );
    await record({ kind: 'returned' }, { version: 3 }).expect(201);
    // It is on the rack again, and not rung since.
    expect(codes(await read())).toEqual(['ring-missing']);
    await record({ kind: 'ring test', ring: 'silent' }, { version: 4 }).expect(201);
    expect(await listedVerdict()).toBe('clear');
  });

  it('stops when its belt step becomes too fast', async () => {
    const chosen = jaws?.inputs.machine.beltStepId;
    const beltSteps = grinder?.data.beltSteps.map((step) =>
      step.id === chosen ? { ...step, drivingPulleyMm: 400 } : step,
    );
    await put(`grinders/${grinder?.id}`, {
      ...grinder,
      id: undefined,
      data: { ...grinder?.data, beltSteps },
    }).expect(200);
    expect(await listedVerdict()).toBe('stop');
  });

  it('is incomplete when its quill is retired', async () => {
    await put(`grinders/${grinder?.id}`, { ...grinder, id: undefined, quills: [] }).expect(200);
    expect(await listedVerdict()).toBe('incomplete');
  });

  it('follows its lathe', async () => {
    const { plan } = await read();
    const spindleSpeedsRpm = [500];
    await put(`lathes/${lathe?.id}`, {
      name: lathe?.name,
      data: { ...lathe?.data, spindleSpeedsRpm },
    }).expect(200);
    expect((await read()).plan).not.toEqual(plan);
  });

  it('stops on the day after its wheel expired, in the shop’s own time zone', async () => {
    await putWheel({ expiresOn: '2026-03-02' }).expect(200);
    expect(await listedVerdict()).toBe('clear');
    now = new Date('2026-03-02T23:59:00Z');
    expect(await listedVerdict()).toBe('clear');
    now = new Date('2026-03-03T00:01:00Z');
    expect(await listedVerdict()).toBe('stop');
    expect((await read()).plan.verdict).toBe('stop');
  });

  it('stops as soon as the shop’s time zone makes it tomorrow', async () => {
    await putWheel({ expiresOn: '2026-03-02' }).expect(200);
    const { body } = await shop.as.lead.get(shop.path).expect(200);
    const { name, units, version } = body;
    now = new Date('2026-03-02T20:00:00Z');
    await shop.as.lead
      .patch(shop.path)
      .send({ name, units, version, timeZone: 'Pacific/Auckland' })
      .expect(200);
    expect(await listedVerdict()).toBe('stop');
  });

  it('is planned anew when it was planned by other rules', async () => {
    await api.owner.query(
      `update setups set rules_version = '0.0.1', verdict = 'stop', plan = '{"verdict": "stop", "rulesVersion": "0.0.1"}'
       where shop_id = $1`,
      [shop.shopId],
    );
    expect(await listedVerdict()).toBe('clear');
    expect((await read()).plan.rulesVersion).toBe(RULES_VERSION);
  });

  it('stays as it was once it is retired', async () => {
    const retire = `${shop.path}/setups/${shop.setupId}/retire`;
    await shop.as.lead.post(retire).send({ version: 1 }).expect(200);
    await setAside().expect(201);
    expect(await listedVerdict()).toBe('clear');
  });

  it('rests on the newest wheel, whichever of two writes at once comes first', async () => {
    const { name, inputs, typed } = await read();
    const [saved, changed] = await Promise.all([
      put(`setups/${shop.setupId}`, { name: `${name}, again`, inputs, typed }),
      setAside(),
    ]);
    expect([saved.status, changed.status]).toEqual([200, 201]);
    expect(await listedVerdict()).toBe('stop');
  });
});
