import { setupPage } from '@/shared/contracts/setups';
import { wheelPlaces } from '@/shared/contracts/wheels';

import { makeShop, visitorOf, type TestShop } from '../support/api';
import { appointmentBody, entryBody, setupBody, wheelBody } from '../support/bodies';
import { problemOf } from '../support/item-tests';
import { wheelShop, RING, SET_ASIDE, TRIAL_RUN } from '../support/wheel-shop';

let stranger: TestShop;
let on: Awaited<ReturnType<typeof wheelShop>>;
beforeAll(async () => {
  on = await wheelShop();
  stranger = await makeShop(on.api, 'Another shop');
  await on.shop.as.lead
    .post(`${on.shop.path}/appointments`)
    .send(appointmentBody(on.shop.ids.lead))
    .expect(201);
});
afterAll(() => on.api.stop());

describe('setting aside', () => {
  it('stops every setup that uses the wheel at once, and says why', async () => {
    const id = await on.make();
    const setup = setupBody();
    setup.inputs.wheel.wheelId = id;
    await on.shop.as.lead.post(`${on.shop.path}/setups`).send(setup).expect(201);
    // Found on an old page: setting aside waits for no version.
    const request = entryBody(SET_ASIDE, { version: null, happenedOn: '2026-03-02' });
    await on.post(id, request, 'apprentice').expect(201);
    const { body } = await on.shop.as.lead.get(`${on.shop.path}/setups`).query({ wheelId: id });
    expect(setupPage.parse(body).items).toMatchObject([{ id: setup.id, verdict: 'stop' }]);
    expect((await on.lifeOf(id)).setups).toMatchObject([{ id: setup.id, verdict: 'stop' }]);
    const { body: stopped } = await on.shop.as.lead.get(`${on.shop.path}/setups/${setup.id}`);
    expect(stopped.plan.findings).toContainEqual(
      expect.objectContaining({
        code: 'wheel-set-aside',
        names: { reason: 'A chip at the edge.' },
      }),
    );
  });
});

describe('an entry', () => {
  it('sent again is the same entry, also after others', async () => {
    const id = await on.make();
    const request = entryBody(on.mounted, { happenedOn: '2026-03-02' });
    const { body: first } = await on.post(id, request).expect(201);
    const { body: again } = await on.post(id, request).expect(200);
    expect(again).toEqual(first);
    await on.record(id, TRIAL_RUN);
    const { body: later } = await on.post(id, request).expect(200);
    expect(later.entry).toEqual(first.entry);
    expect(later.wheel.version).toBe(3);
  });

  it('sent many times at once is one entry', async () => {
    const id = await on.make();
    const request = entryBody(SET_ASIDE, { happenedOn: '2026-03-02' });
    const answers = await Promise.all(Array.from({ length: 5 }, () => on.post(id, request)));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 200, 200, 201]);
    expect((await on.lifeOf(id)).entries.items).toHaveLength(4);
  });

  it('with an id in use is refused', async () => {
    const [id, other] = [await on.make(), await on.make()];
    const request = entryBody(RING, { happenedOn: '2026-03-02' });
    await on.post(id, request).expect(201);
    const changed = { ...request, note: 'Twice.' };
    expect(problemOf(await on.post(id, changed).expect(409)).code).toBe('id-reused');
    expect(problemOf(await on.post(other, request).expect(409)).code).toBe('id-reused');
  });

  it('on an older version is refused, with the wheel as it stands', async () => {
    const id = await on.make([RING]);
    const stale = entryBody(on.mounted, { version: 1, happenedOn: '2026-03-02' });
    const problem = problemOf(await on.post(id, stale).expect(409));
    expect(problem.code).toBe('stale-version');
    expect(problem.current).toEqual(await on.read(id));
  });

  it('is nobody’s who is not of the shop', async () => {
    const id = await on.make();
    const request = entryBody(SET_ASIDE, { version: null });
    const paths = [on.at(id, '/life'), on.at(id, '/entries'), `${on.shop.path}/wheel-places`];
    for (const path of paths) {
      await visitorOf(on.api).get(path).expect(401);
      await stranger.as.lead.get(path).expect(404);
    }
    await visitorOf(on.api).post(on.at(id, '/entries')).send(request).expect(401);
    await stranger.as.lead.post(on.at(id, '/entries')).send(request).expect(404);
    const theirs = `${stranger.path}/wheels/${id}`;
    await stranger.as.lead.post(`${theirs}/entries`).send(request).expect(404);
    await stranger.as.lead.get(`${theirs}/life`).expect(404);
    await stranger.as.lead.get(`${theirs}/entries`).expect(404);
    expect((await on.read(id)).version).toBe(1);
  });
});

it('the shop’s places are each named once, in order', async () => {
  const other = await makeShop(on.api);
  for (const place of ['Peg 2', 'peg 2', 'Drawer', null, 'Shelf']) {
    const body = wheelBody();
    await other.as.lead
      .post(`${other.path}/wheels`)
      .send({ ...body, data: { ...body.data, place } })
      .expect(201);
  }
  const { body } = await other.as.apprentice.get(`${other.path}/wheel-places`).expect(200);
  const { items } = wheelPlaces.parse(body);
  expect(items.map((place) => place.toLowerCase())).toEqual(['drawer', 'peg 2', 'shelf']);
});
