import { OPERATIONS } from '@/shared/domain/setups';
import { seedDemo } from '@/api/seed-demo';
import { weaknessOf } from '@/api/auth/password-policy';
import { demoShop, signIns } from '@/db/seed';
import { droppedWheel, outsideWheel, untestedWheel, wornWheel } from '@/db/seed/wheels';
import { appointmentList } from '@/shared/contracts/appointments';
import { grinderList, latheList } from '@/shared/contracts/machines';
import { setupPage } from '@/shared/contracts/setups';
import { wheelLife } from '@/shared/contracts/wheel-entries';
import { wheelPage } from '@/shared/contracts/wheels';

import { signIn, startApi, type Api } from '../support/api';

describe('the demo shop', () => {
  let api: Api;
  const path = `/api/shops/${demoShop.id}`;
  beforeAll(async () => {
    api = await startApi();
    await seedDemo(api.services, demoShop);
  });
  afterAll(() => api.stop());

  const visit = (role: string) => {
    const who = signIns.find((person) => person.role === role);
    if (!who) throw new Error(`nobody in the demo is a ${role}`);
    return signIn(api, who.email, who.password);
  };

  it.each(['lead', 'machinist', 'apprentice'])('lets a %s look around', async (role) => {
    const visitor = await visit(role);
    const { body } = await visitor.get('/api/session').expect(200);
    expect(body.memberships).toEqual([{ shopId: demoShop.id, shopName: demoShop.name, role }]);
  });

  it('has a metric and an inch lathe, and grinders with a stepped and a carbide quill', async () => {
    const lead = await visit('lead');
    const lathes = latheList.parse((await lead.get(`${path}/lathes`)).body).items;
    expect(lathes).toHaveLength(2);
    const grinders = grinderList.parse((await lead.get(`${path}/grinders`)).body).items;
    expect(grinders.map(({ data }) => data.beltSteps.length).sort()).toEqual([4, 5]);
    const quills = grinders.flatMap((grinder) => grinder.quills);
    expect(quills.some(({ data }) => data.segments.length > 1)).toBe(true);
    expect(quills.some(({ data }) => data.material === 'carbide')).toBe(true);
  });

  it('has a dozen wheels, with each trouble a rack knows', async () => {
    const lead = await visit('lead');
    const { items } = wheelPage.parse((await lead.get(`${path}/wheels`)).body);
    expect(items).toHaveLength(12);
    const has = (test: (wheel: (typeof items)[number]['data']) => boolean) =>
      items.some(({ data }) => test(data));
    expect(has(({ state }) => state === 'set aside')).toBe(true);
    expect(has(({ expiresOn }) => expiresOn !== null && expiresOn < '2026-01-01')).toBe(true);
    expect(has(({ marking, markedRpm }) => marking === null && markedRpm === null)).toBe(true);
    expect(has(({ mounted }) => mounted !== null)).toBe(true);
    expect(has((wheel) => wheel.diameterNowMm < wheel.diameterNewMm)).toBe(true);
  });

  it('has wheels with a life: one that runs, one that waits for a signature, one set aside', async () => {
    const lead = await visit('lead');
    const lifeOf = async (id: string) =>
      wheelLife.parse((await lead.get(`${path}/wheels/${id}/life`).expect(200)).body);
    const running = await lifeOf(outsideWheel.id);
    expect(running.wheel.data).toMatchObject({ state: 'mounted', unsigned: false });
    // 125 - 2 x 0.02 x 3 = 124.88
    expect(running.wheel.data.diameterNowMm).toBeCloseTo(124.88, 9);
    expect(running.setups.map(({ name }) => name)).toContain('Pump shaft, 40 mm journal');
    const worn = await lifeOf(wornWheel.id);
    // 107.5 mm is what was measured last.
    expect(worn.wheel.data).toMatchObject({ diameterNowMm: 107.5, looked: 'sound', rung: 'clear' });
    const { standing } = await lifeOf(untestedWheel.id);
    expect(standing.waiting).toMatchObject([
      { kind: 'ring test', needs: 'skilled', refusal: null },
    ]);
    const dropped = await lifeOf(droppedWheel.id);
    expect(dropped.steps.find(({ kind }) => kind === 'mounted')?.refusal?.words).toMatch(/dropped/);
  });

  it('has appointed its lead and its machinist', async () => {
    const { body } = await (await visit('apprentice')).get(`${path}/appointments`).expect(200);
    const { items } = appointmentList.parse(body);
    expect(
      items
        .filter(({ holds }) => holds)
        .map(({ personName }) => personName)
        .sort(),
    ).toEqual(['Desmond Okafor-Lund', 'Ottilie Brandvik']);
  });

  it('has a setup for each operation that may run', async () => {
    const apprentice = await visit('apprentice');
    const { items } = setupPage.parse((await apprentice.get(`${path}/setups`)).body);
    expect(items.map(({ operation }) => operation).sort()).toEqual([...OPERATIONS].sort());
    for (const { name, verdict } of items)
      expect([name, verdict]).toEqual([name, expect.stringMatching(/^(clear|check)$/)]);
  });

  it('is put in once: again changes nothing, and undoes nobody’s work', async () => {
    const lead = await visit('lead');
    const edit = { version: 1, name: 'Renamed', units: 'mm', timeZone: 'UTC' };
    await lead.patch(path).send(edit).expect(200);
    const count = async () =>
      (await api.owner.query<{ count: string }>('select count(*) from audit_entries')).rows;
    const before = await count();
    await seedDemo(api.services, demoShop);
    expect(await count()).toEqual(before);
    expect((await lead.get(path)).body.name).toBe('Renamed');
  });

  it('is left as it stands where an earlier version, or its people, made it otherwise', async () => {
    const [lathe, ...lathes] = demoShop.lathes;
    if (!lathe) throw new Error('The demo shop has no lathe.');
    const other = { ...lathe, data: { ...lathe.data, compoundTravelMm: 95 } };
    await seedDemo(api.services, { ...demoShop, lathes: [other, ...lathes] });
    await seedDemo(api.services, { ...demoShop, password: 'walnut ferry under the bridge' });
    const lead = await visit('lead');
    const { items } = latheList.parse((await lead.get(`${path}/lathes`)).body);
    expect(items.find(({ id }) => id === lathe.id)?.data).toEqual(lathe.data);
  });

  it('has a password that anybody could have chosen', () => {
    const names = [demoShop.name, ...signIns.flatMap(({ name, email }) => [name, email])];
    expect(weaknessOf(demoShop.password, names)).toBeNull();
    expect(demoShop.password.length).toBeGreaterThanOrEqual(15);
  });
});
