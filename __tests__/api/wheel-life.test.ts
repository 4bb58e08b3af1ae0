import { wheelEntryPage } from '@/shared/contracts/wheel-entries';
import type { WheelEntry } from '@/shared/domain/wheel-life';
import { foldWheelLife } from '@/shared/rules/wheel-life';

import { auditOf } from '../support/api';
import { appointmentBody, grinderBody } from '../support/bodies';
import { wheelShop, DRESSED, LOOK, SET_ASIDE, TAKEN_OFF, TRIAL_RUN } from '../support/wheel-shop';

let on: Awaited<ReturnType<typeof wheelShop>>;
beforeAll(async () => {
  on = await wheelShop();
  await on.shop.as.lead
    .post(`${on.shop.path}/appointments`)
    .send(appointmentBody(on.shop.ids.lead))
    .expect(201);
});
afterAll(() => on.api.stop());

describe('the life of a wheel', () => {
  it('begins with how it came, and what was seen and heard then', async () => {
    const { entries, wheel: now } = await on.lifeOf(await on.make());
    expect(entries.items.map(({ step, number, happenedOn }) => [number, happenedOn, step])).toEqual(
      [
        [3, '2026-01-05', { kind: 'ring test', ring: 'clear' }],
        [2, '2026-01-05', { kind: 'inspected', look: 'sound', diameterMm: null }],
        [1, '2026-01-05', { kind: 'received', diameterMm: 24.5 }],
      ],
    );
    expect(now).toMatchObject({
      version: 1,
      data: { state: 'on the rack', diameterNowMm: 24.5, looked: 'sound', rung: 'clear' },
      life: { receivedOn: '2026-01-05', usable: true, due: { on: '2099-06-30', why: 'expiry' } },
    });
  });

  it('goes on with entries, each a new version of the wheel with an audit row of both', async () => {
    const id = await on.make();
    const { wheel: now, entry } = await on.recorded(id, on.mounted);
    expect(now).toMatchObject({ version: 2, data: { state: 'mounted' } });
    const { grinderId, quillId } = on.mounted;
    expect(now.life.onSpindle).toEqual({ grinderId, quillId });
    expect(entry).toMatchObject({ number: 4, needs: null, person: { personId: on.shop.ids.lead } });
    const [, row] = await auditOf(on.api, id);
    expect(row).toMatchObject({
      person_id: on.shop.ids.lead,
      action: 'record',
      subject: 'wheel',
      before: { version: 1 },
      after: { version: 2, entry: { id: entry.id } },
    });
  });

  it('makes the wheel smaller with each dressing', async () => {
    const id = await on.make([on.mounted, TRIAL_RUN, DRESSED, DRESSED]);
    // 24.5 - 2 (2 x 0.02 x 5) = 24.1
    expect((await on.read(id)).data.diameterNowMm).toBeCloseTo(24.1, 9);
    const { standing } = await on.lifeOf(id);
    expect(standing).toMatchObject({ dressings: 2, mountings: 1, waiting: [] });
    // pi x 24.5 x 9 000 / 60 000 = 11.545 m/s
    expect(standing.lastTrialRun?.wheelSpeedMPerS).toBeCloseTo(11.545, 3);
  });

  it('comes page by page, newest first', async () => {
    const id = await on.make([on.mounted, TRIAL_RUN, DRESSED, TAKEN_OFF]);
    const numbers: number[] = [];
    let after = '';
    do {
      const query = { limit: 3, ...(after ? { after } : {}) };
      const { body } = await on.shop.as.apprentice
        .get(on.at(id, '/entries'))
        .query(query)
        .expect(200);
      const page = wheelEntryPage.parse(body);
      numbers.push(...page.items.map(({ number }) => number));
      after = page.next ?? '';
    } while (after);
    expect(numbers).toEqual([7, 6, 5, 4, 3, 2, 1]);
    await on.shop.as.lead.get(on.at(id, '/entries?after=zzz')).expect(400);
  });

  it('says on which spindles and belt steps the wheel may turn, and why not', async () => {
    const small = grinderBody({ name: 'Small seat' });
    small.quills = small.quills.map((quill) => ({
      ...quill,
      data: { ...quill.data, seatDiameterMm: 6 },
    }));
    await on.shop.as.lead.post(`${on.shop.path}/grinders`).send(small).expect(201);
    const { spindles } = await on.lifeOf(await on.make());
    const misfit = spindles.find(({ grinderId }) => grinderId === small.id);
    expect(misfit?.refusal).toMatchObject({ code: 'hole-too-large' });
    const fit = spindles.find(({ quillId }) => quillId === on.mounted.quillId);
    // 2 900 x 140 / 40 = 10 150 and 2 900 x 160 / 32 = 14 500 rpm.
    expect(fit?.steps.map(({ name, rpm, allowed }) => [name, rpm, allowed])).toEqual([
      ['A', 10_150, true],
      ['B', 14_500, true],
    ]);
    expect(fit).toMatchObject({ refusal: null, limitOf: expect.any(String) });
  });

  it('keeps in the wheel’s row what its entries say, whatever happens', async () => {
    const id = await on.make([on.mounted, TRIAL_RUN, DRESSED, SET_ASIDE, TAKEN_OFF, LOOK]);
    await on.record(id, { kind: 'returned' });
    const { rows } = await on.api.owner.query(
      `select id, number, kind, LOOK, RING, diameter_mm as "diameterMm", grinder_id as "grinderId",
         quill_id as "quillId", minutes, spindle_rpm as "spindleRpm", depth_mm as "depthMm", passes, reason,
         to_char(happened_on, 'YYYY-MM-DD') as "happenedOn", person_id as "personId", needs
       from wheel_entries where wheel_id = $1`,
      [id],
    );
    const { data, life } = await on.read(id);
    const entries: WheelEntry[] = rows.map((row) => ({ ...row, step: row }));
    const standing = foldWheelLife(data, entries);
    const { state, diameterNowMm, looked, rung, setAsideReason, unsigned } = standing;
    expect(data).toMatchObject({ state, diameterNowMm, looked, rung, setAsideReason, unsigned });
    expect(life.due).toEqual(standing.due);
    expect(data).toMatchObject({ state: 'on the rack', looked: 'sound', rung: null });
  });
});
