import { v7 as uuidv7 } from 'uuid';

import { appointmentBody, entryBody, wheelBody } from '../support/bodies';
import { problemOf } from '../support/item-tests';
import {
  wheelShop,
  DRESSED,
  LOOK,
  RING,
  SET_ASIDE,
  TRIAL_RUN,
  type Step,
} from '../support/wheel-shop';

let on: Awaited<ReturnType<typeof wheelShop>>;
beforeAll(async () => {
  on = await wheelShop();
  await on.shop.as.lead
    .post(`${on.shop.path}/appointments`)
    .send(appointmentBody(on.shop.ids.lead))
    .expect(201);
});
afterAll(() => on.api.stop());

describe('a step that cannot be', () => {
  const cases: [string, Step[], () => Step, string][] = [
    ['mounting a wheel set aside', [SET_ASIDE], () => on.mounted, 'wheel-set-aside'],
    [
      'mounting a wheel scrapped',
      [{ kind: 'scrapped', reason: 'Worn out.' }],
      () => on.mounted,
      'wheel-scrapped',
    ],
    [
      'using one that is not mounted',
      [],
      () => ({ kind: 'used', minutes: null, diameterMm: null }),
      'not-mounted',
    ],
    ['dressing one that is not mounted', [], () => DRESSED, 'not-mounted'],
    ['a trial run of one that is not mounted', [], () => TRIAL_RUN, 'not-mounted'],
    ['taking off one that is not mounted', [], () => ({ kind: 'taken off' }), 'not-mounted'],
    ['returning one that is not set aside', [], () => ({ kind: 'returned' }), 'not-set-aside'],
    [
      'returning without a fresh look',
      [SET_ASIDE],
      () => ({ kind: 'returned' }),
      'fresh-look-missing',
    ],
    ['setting aside twice', [SET_ASIDE], () => SET_ASIDE, 'already-set-aside'],
    ['a diameter above the new one', [], () => ({ ...LOOK, diameterMm: 25.1 }), 'larger-than-new'],
  ];
  it.each(cases)('is refused: %s', async (_name, before, step, code) => {
    const id = await on.make(before);
    const version = (await on.read(id)).version;
    expect(await on.refusalOf(id, step())).toEqual([422, code]);
    expect((await on.read(id)).version).toBe(version);
  });

  const onSpindle: [string, Step[], () => Step, string][] = [
    ['mounting twice', [], () => on.mounted, 'already-mounted'],
    ['scrapping a mounted one', [], () => ({ kind: 'scrapped', reason: 'Worn.' }), 'still-mounted'],
    ['ringing a mounted one', [], () => RING, 'still-mounted'],
    ['dressing before the trial run', [], () => DRESSED, 'trial-run-missing'],
    [
      'a trial run above the limit',
      [],
      () => ({ ...TRIAL_RUN, spindleRpm: 26_001 }),
      'trial-run-too-fast',
    ],
    // 24.5 - 2 x 0.2 x 32 = 11.7; the smallest is 12.
    [
      'dressing below the smallest diameter',
      [TRIAL_RUN],
      () => ({ kind: 'dressed', depthMm: 0.2, passes: 32 }),
      'below-smallest',
    ],
  ];
  it.each(onSpindle)('is refused: %s', async (_name, before, step, code) => {
    const id = await on.make([on.mounted, ...before]);
    expect(await on.refusalOf(id, step())).toEqual([422, code]);
  });

  it('is refused: mounting without a look or a ring test, or after a bad one', async () => {
    expect(await on.refusalOf(await on.make([], { rung: null }), on.mounted)).toEqual([
      422,
      'ring-missing',
    ]);
    expect(await on.refusalOf(await on.make([], { looked: null }), on.mounted)).toEqual([
      422,
      'wheel-not-looked-at',
    ]);
    expect(await on.refusalOf(await on.make([], { rung: 'dull' }), on.mounted)).toEqual([
      422,
      'ring-dull',
    ]);
  });

  it('is refused: mounting where every belt step is above the limit', async () => {
    const body = wheelBody();
    body.data = { ...body.data, markedRpm: 10_149, markedSpeedMPerS: null };
    await on.shop.as.lead.post(`${on.shop.path}/wheels`).send(body).expect(201);
    expect(await on.refusalOf(body.id, on.mounted)).toEqual([422, 'no-step-within-limit']);
  });

  it('names the spindle that the shop does not have', async () => {
    const id = await on.make();
    for (const [elsewhere, path] of [
      [{ grinderId: uuidv7() }, 'step.grinderId'],
      [{ quillId: uuidv7() }, 'step.quillId'],
    ] as const) {
      const response = await on.record(id, { ...on.mounted, ...elsewhere });
      expect(problemOf(response)).toMatchObject({ status: 422, errors: [{ path }] });
    }
  });

  it('is refused: a day to come, and a day before the latest entry', async () => {
    const id = await on.make();
    for (const [happenedOn, rule] of [
      ['2026-03-03', 'in-the-future'],
      ['2026-01-04', 'out-of-order'],
    ]) {
      const response = await on.post(id, entryBody(RING, { happenedOn })).expect(422);
      expect(problemOf(response).rule).toBe(rule);
    }
  });

  it('is no step at all: named at its field', async () => {
    const id = await on.make();
    const bad = async (body: object) =>
      problemOf(
        await on.shop.as.lead.post(on.at(id, '/entries')).send(body).expect(400),
      ).errors?.map(({ path }) => path);
    const good = entryBody(RING);
    expect(await bad({ ...good, step: { kind: 'received', diameterMm: 20 } })).toEqual([
      'step.kind',
    ]);
    expect(await bad({ ...good, step: { kind: 'dressed', depthMm: 0.3, passes: 0 } })).toEqual([
      'step.depthMm',
      'step.passes',
    ]);
    expect(await bad({ ...good, step: { kind: 'set aside', reason: ' ' } })).toEqual([
      'step.reason',
    ]);
    expect(await bad({ ...good, version: null })).toEqual(['version']);
    expect(await bad({ ...good, happenedOn: '2026-02-30' })).toEqual(['happenedOn']);
    expect(await bad({ ...good, colour: 'green' })).toEqual(['colour']);
  });
});
