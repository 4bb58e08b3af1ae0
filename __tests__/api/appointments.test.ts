import { v7 as uuidv7 } from 'uuid';

import { appointmentList, appointment as contract } from '@/shared/contracts/appointments';
import type { Role } from '@/shared/domain/people';

import { auditOf, makeShop, visitorOf, type TestShop } from '../support/api';
import { appointmentBody, setupBody } from '../support/bodies';
import { problemOf } from '../support/item-tests';
import { DRESSED, LOOK, RING, TAKEN_OFF, TRIAL_RUN, wheelShop } from '../support/wheel-shop';

let stranger: TestShop;
let on: Awaited<ReturnType<typeof wheelShop>>;
beforeEach(async () => {
  on = await wheelShop();
  stranger = await makeShop(on.api, 'Another shop');
});
afterEach(() => on.api.stop());

const place = () => `${on.shop.path}/appointments`;
const appoint = async (role: Role, over: Parameters<typeof appointmentBody>[1] = {}) => {
  const body = appointmentBody(on.shop.ids[role], over);
  const answer = await on.shop.as.lead.post(place()).send(body).expect(201);
  return contract.parse(answer.body);
};
const end = (id: string, version = 1) =>
  on.shop.as.lead.post(`${place()}/${id}/end`).send({ version });
const list = async (role: Role = 'apprentice') =>
  appointmentList.parse((await on.shop.as[role].get(place()).expect(200)).body).items;

describe('an appointment', () => {
  it('is made by a lead, told to everybody, and leaves an audit row', async () => {
    const made = await appoint('machinist', { until: '2026-03-02', tasks: ['dress', 'mount'] });
    expect(made).toMatchObject({
      version: 1,
      personName: 'machinist person',
      tasks: ['mount', 'dress'],
      appointedBy: { personId: on.shop.ids.lead, name: 'Lead Person' },
      holds: true,
      endedAt: null,
    });
    expect(await list()).toEqual([made]);
    expect(await auditOf(on.api, made.id)).toMatchObject([
      { person_id: on.shop.ids.lead, action: 'create', subject: 'appointment', before: null },
    ]);
  });

  it('holds from its first day to its last, those that hold first', async () => {
    const past = await appoint('machinist', { until: '2026-03-01' });
    const now = await appoint('machinist', { from: '2026-03-02' });
    const future = await appoint('machinist', { from: '2026-03-03' });
    expect((await list()).map(({ id, holds }) => [id, holds])).toEqual([
      [now.id, true],
      [future.id, false],
      [past.id, false],
    ]);
  });

  it('sent again is the same; with another body its id is refused', async () => {
    const body = appointmentBody(on.shop.ids.lead);
    const { body: first } = await on.shop.as.lead.post(place()).send(body).expect(201);
    const { body: again } = await on.shop.as.lead.post(place()).send(body).expect(200);
    expect(again).toEqual(first);
    const other = { ...body, wheelClass: 'None' };
    const answer = await on.shop.as.lead.post(place()).send(other).expect(409);
    expect(problemOf(answer).code).toBe('id-reused');
  });

  it('ends once, by its newest version, with an audit row', async () => {
    const { id } = await appoint('machinist');
    expect(problemOf(await end(id, 2).expect(409)).code).toBe('stale-version');
    const { body } = await end(id).expect(200);
    expect(contract.parse(body)).toMatchObject({ version: 2, holds: false });
    expect(contract.parse(body).endedAt).not.toBeNull();
    await end(id, 2).expect(422);
    expect((await auditOf(on.api, id)).map(({ action }) => action)).toEqual(['create', 'end']);
  });

  it('is of a skilled person of the shop', async () => {
    for (const personId of [on.shop.ids.apprentice, stranger.ids.lead, uuidv7()]) {
      const answer = await on.shop.as.lead
        .post(place())
        .send(appointmentBody(personId))
        .expect(422);
      expect(problemOf(answer).errors?.map(({ path }) => path)).toEqual(['personId']);
    }
  });

  it.each([
    [{ tasks: [] }, 'tasks'],
    [{ tasks: ['weld'] }, 'tasks.0'],
    [{ wheelClass: ' ' }, 'wheelClass'],
    [{ from: '2026-02-30' }, 'from'],
    [{ until: '2026-01-04' }, 'until'],
    [{ personId: 'me' }, 'personId'],
  ])('with %j is refused at its field', async (over, path) => {
    const body = { ...appointmentBody(on.shop.ids.lead), ...over };
    const answer = await on.shop.as.lead.post(place()).send(body).expect(400);
    expect(problemOf(answer).errors?.map((error) => error.path)).toEqual([path]);
  });

  it('is a lead’s of this shop to make and to end', async () => {
    const { id } = await appoint('machinist');
    const body = appointmentBody(on.shop.ids.lead);
    for (const role of ['machinist', 'apprentice'] as const) {
      await on.shop.as[role].post(place()).send(body).expect(403);
      await on.shop.as[role].post(`${place()}/${id}/end`).send({ version: 1 }).expect(403);
    }
    await visitorOf(on.api).get(place()).expect(401);
    await stranger.as.lead.get(place()).expect(404);
    await stranger.as.lead.post(place()).send(body).expect(404);
    await stranger.as.lead
      .post(`${stranger.path}/appointments/${id}/end`)
      .send({ version: 1 })
      .expect(404);
    expect((await stranger.as.lead.get(`${stranger.path}/appointments`)).body.items).toEqual([]);
  });
});

describe('who is not appointed', () => {
  it('mounts, and the wheel stands still until somebody appointed has signed', async () => {
    await appoint('machinist');
    const id = await on.make();
    const setup = setupBody();
    setup.inputs.wheel.wheelId = id;
    await on.shop.as.lead.post(`${on.shop.path}/setups`).send(setup).expect(201);
    const verdict = async () =>
      (await on.shop.as.lead.get(`${on.shop.path}/setups/${setup.id}`)).body.plan.verdict;
    expect(await verdict()).toBe('incomplete');

    const { entry, wheel } = await on.recorded(id, on.mounted, 'apprentice');
    expect(entry).toMatchObject({ needs: 'appointed', signedBy: null });
    expect(wheel).toMatchObject({
      data: { state: 'mounted', unsigned: true },
      life: { usable: false },
    });
    expect(await verdict()).toBe('stop');
    expect(await on.refusalOf(id, TRIAL_RUN, 'machinist')).toEqual([422, 'wheel-unsigned']);

    const signature = { kind: 'countersigned' as const, entryId: entry.id };
    expect(await on.refusalOf(id, signature, 'apprentice')).toEqual([403, 'own-entry']);
    expect(await on.refusalOf(id, signature, 'lead')).toEqual([403, 'not-appointed']);
    const waiting = async (role: Role) =>
      (await on.lifeOf(id, role)).standing.waiting.map(({ refusal }) => refusal?.code ?? null);
    expect(await waiting('lead')).toEqual(['not-appointed']);
    expect(await waiting('machinist')).toEqual([null]);
    const signed = await on.recorded(id, signature, 'machinist');
    expect(signed.wheel.data.unsigned).toBe(false);
    expect(await verdict()).toBe('incomplete');
    const { entries } = await on.lifeOf(id);
    expect(entries.items.find((one) => one.id === entry.id)?.signedBy).toEqual({
      personId: on.shop.ids.machinist,
      name: 'machinist person',
    });
    expect(await on.refusalOf(id, signature, 'machinist')).toEqual([422, 'nothing-to-sign']);
  });

  it('is everybody whose appointment has ended, from that moment on', async () => {
    const { id: appointmentId } = await appoint('machinist');
    const id = await on.make();
    const mounted = await on.recorded(id, on.mounted, 'machinist');
    expect(mounted.entry.needs).toBeNull();
    await end(appointmentId).expect(200);
    const tried = await on.recorded(id, TRIAL_RUN, 'machinist');
    expect(tried.entry.needs).toBe('appointed');
    // What was done before stays as it was.
    expect((await on.lifeOf(id)).standing.waiting.map(({ kind }) => kind)).toEqual(['trial run']);
  });

  it('dresses a wheel that is smaller at once, and runs again when it is signed for', async () => {
    await appoint('lead');
    const id = await on.make([on.mounted, TRIAL_RUN]);
    const { wheel } = await on.recorded(id, DRESSED, 'machinist');
    expect(wheel.data.diameterNowMm).toBeCloseTo(24.3, 9);
    expect(wheel.data.unsigned).toBe(true);
    expect(await on.refusalOf(id, DRESSED)).toEqual([422, 'wheel-unsigned']);
  });
});

describe('an apprentice’s ring test', () => {
  it('counts once a lead or a machinist has signed', async () => {
    const id = await on.make([], { rung: null });
    const { entry, wheel } = await on.recorded(id, RING, 'apprentice');
    expect(entry.needs).toBe('skilled');
    expect(wheel).toMatchObject({ data: { rung: null }, life: { usable: false } });
    expect(await on.refusalOf(id, on.mounted)).toEqual([422, 'ring-missing']);
    const signature = { kind: 'countersigned' as const, entryId: entry.id };
    const signed = await on.recorded(id, signature, 'machinist');
    expect(signed.wheel).toMatchObject({ data: { rung: 'clear' }, life: { usable: true } });
  });

  it('counts at once when it is dull', async () => {
    const id = await on.make();
    const { wheel } = await on.recorded(id, { kind: 'ring test', ring: 'dull' }, 'apprentice');
    expect(wheel).toMatchObject({ data: { rung: 'dull' }, life: { usable: false } });
  });
});

describe('a correction', () => {
  it('points back at the entry, which then no longer counts', async () => {
    const id = await on.make([on.mounted]);
    const { entries } = await on.lifeOf(id);
    const [wrong] = entries.items;
    const correction = {
      kind: 'correction' as const,
      entryId: wrong?.id ?? '',
      reason: 'It was another wheel.',
    };
    const { wheel, entry } = await on.recorded(id, correction, 'machinist');
    expect(wheel).toMatchObject({ data: { state: 'on the rack' }, life: { onSpindle: null } });
    const after = (await on.lifeOf(id)).entries.items;
    expect(after.find((one) => one.id === wrong?.id)?.correctedBy).toBe(entry.id);
    expect(await on.refusalOf(id, correction)).toEqual([422, 'corrected-already']);
    expect(await on.refusalOf(id, { ...correction, entryId: entry.id })).toEqual([
      422,
      'correction-stays',
    ]);
    expect(await on.refusalOf(id, { ...correction, entryId: uuidv7() })).toEqual([
      422,
      'no-such-entry',
    ]);
  });

  it('is not for an apprentice, but of their own entries', async () => {
    const id = await on.make([LOOK]);
    const latest = async () => (await on.lifeOf(id)).entries.items[0]?.id ?? '';
    const reason = 'Wrong wheel.';
    const of = (entryId: string) => ({ kind: 'correction' as const, entryId, reason });
    expect(await on.refusalOf(id, of(await latest()), 'apprentice')).toEqual([403, 'others-entry']);
    await on.recorded(id, RING, 'apprentice');
    await on.recorded(id, of(await latest()), 'apprentice');
  });
});

describe('roles', () => {
  it('decide who returns and who scraps', async () => {
    const scrap = { kind: 'scrapped' as const, reason: 'Worn out.' };
    const id = await on.make([{ kind: 'set aside', reason: 'Dropped.' }, LOOK]);
    for (const role of ['machinist', 'apprentice'] as const)
      expect(await on.refusalOf(id, { kind: 'returned' }, role)).toEqual([403, 'lead-returns']);
    await on.recorded(id, { kind: 'returned' }, 'lead');
    expect(await on.refusalOf(id, scrap, 'apprentice')).toEqual([403, 'role']);
    const { entry } = await on.recorded(id, scrap, 'machinist');
    const back = { kind: 'correction' as const, entryId: entry.id, reason: 'Not that one.' };
    expect(await on.refusalOf(id, back, 'machinist')).toEqual([403, 'lead-unscraps']);
    const { wheel } = await on.recorded(id, back, 'lead');
    expect(wheel.data).toMatchObject({ state: 'set aside', setAsideReason: 'Not that one.' });
  });

  it('let an apprentice take a wheel off and set it aside without a signature', async () => {
    await appoint('lead');
    const id = await on.make([on.mounted]);
    const aside = { kind: 'set aside' as const, reason: 'It hums.' };
    expect((await on.recorded(id, aside, 'apprentice')).entry.needs).toBeNull();
    expect((await on.recorded(id, TAKEN_OFF, 'apprentice')).entry.needs).toBeNull();
  });
});
