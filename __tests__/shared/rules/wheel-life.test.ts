import type { WheelStep } from '@/shared/domain/wheel-life';
import { foldWheelLife } from '@/shared/rules/wheel-life';

import {
  CLEAR,
  DRESSED,
  lifeOf,
  MOUNTED,
  READY,
  RECEIVED,
  RECORD,
  RETURNED,
  RUNNING,
  SCRAPPED,
  SET_ASIDE,
  SOUND,
  TAKEN_OFF,
  TRIAL_RUN,
} from '../../support/wheel-lives';

const fold = (...steps: Parameters<typeof lifeOf>) => foldWheelLife(RECORD, lifeOf(...steps));
const byApprentice = { personId: 'apprentice' };
const signs = (number: number): WheelStep => ({
  kind: 'countersigned',
  entryId: `entry-${number}`,
});
const corrects = (number: number): WheelStep => ({
  kind: 'correction',
  entryId: `entry-${number}`,
  reason: 'Of another wheel',
});

describe('a wheel', () => {
  it('that came is on the rack, as large as it came, and wants a look and a ring test', () => {
    expect(fold([RECEIVED, { happenedOn: '2026-01-05' }])).toMatchObject({
      state: 'on the rack',
      diameterNowMm: 125,
      looked: null,
      rung: null,
      receivedOn: '2026-01-05',
      due: { on: '2026-01-05', why: 'close look' },
      waiting: [],
    });
    expect(fold(RECEIVED, SOUND).due).toMatchObject({ why: 'ring test' });
    expect(fold(...READY)).toMatchObject({ looked: 'sound', rung: 'clear', due: null });
  });

  it('that has a mandrel of its own wants no ring test', () => {
    const mounted = {
      mandrelDiameterMm: 6,
      overhangMm: 13,
      threaded: false,
      makerMaximumRpm: 34_500,
    };
    expect(foldWheelLife({ ...RECORD, mounted }, lifeOf(RECEIVED, SOUND)).due).toBeNull();
  });

  it('is due when it expires, unless something is wanted earlier', () => {
    const expiring = { ...RECORD, expiresOn: '2026-06-30' };
    expect(foldWheelLife(expiring, lifeOf(...READY)).due).toEqual({
      on: '2026-06-30',
      why: 'expiry',
    });
    expect(foldWheelLife(expiring, lifeOf(RECEIVED)).due).toMatchObject({ why: 'close look' });
    const expired = { ...RECORD, expiresOn: '2026-01-01' };
    expect(foldWheelLife(expired, lifeOf(RECEIVED)).due).toMatchObject({ why: 'expiry' });
  });

  it('is mounted on the spindle named, run on trial there, and off it again', () => {
    const mounted = fold(...READY, MOUNTED);
    expect(mounted).toMatchObject({
      state: 'mounted',
      onSpindle: { grinderId: 'grinder', quillId: 'arbor' },
      lastTrialRun: null,
      mountings: 1,
    });
    // pi x 125 x 5 000 / 60 000 = 32.72 m/s (Groover, ch. 24).
    expect(fold(...RUNNING).lastTrialRun).toMatchObject({ minutes: 3, spindleRpm: 5000 });
    expect(fold(...RUNNING).lastTrialRun?.wheelSpeedMPerS).toBeCloseTo(32.72, 2);
    expect(fold(...RUNNING, TAKEN_OFF)).toMatchObject({
      state: 'on the rack',
      onSpindle: null,
      lastTrialRun: null,
    });
  });

  it('loses twice the depth of each dressing pass, and is as large as it was last measured', () => {
    // 125 - 2 x 0.02 x 5 = 124.8; again: 124.6.
    expect(fold(...RUNNING, DRESSED).diameterNowMm).toBeCloseTo(124.8, 9);
    expect(fold(...RUNNING, DRESSED, DRESSED)).toMatchObject({ dressings: 2 });
    expect(fold(...RUNNING, DRESSED, DRESSED).diameterNowMm).toBeCloseTo(124.6, 9);
    const measured: WheelStep = { kind: 'used', minutes: null, diameterMm: 123.9 };
    expect(fold(...RUNNING, DRESSED, measured, DRESSED).diameterNowMm).toBeCloseTo(123.7, 9);
    const seen: WheelStep = { kind: 'inspected', look: 'sound', diameterMm: 120 };
    expect(fold(...RUNNING, DRESSED, seen).diameterNowMm).toBe(120);
  });

  it('wants a new look and ring test when it comes off, for they count for one mounting', () => {
    expect(fold(...RUNNING)).toMatchObject({ looked: 'sound', rung: 'clear' });
    const off = fold(...RUNNING, [TAKEN_OFF, { happenedOn: '2026-03-05' }]);
    expect(off).toMatchObject({
      looked: null,
      rung: null,
      due: { on: '2026-03-05', why: 'close look' },
    });
  });

  it('keeps what speaks against it until it is looked at and rung anew', () => {
    const damaged: WheelStep = { kind: 'inspected', look: 'damaged', diameterMm: null };
    const dull: WheelStep = { kind: 'ring test', ring: 'dull' };
    const aside = fold(RECEIVED, damaged, dull, SET_ASIDE);
    expect(aside).toMatchObject({ looked: 'damaged', rung: 'dull', state: 'set aside' });
    const again = fold(RECEIVED, damaged, dull, SET_ASIDE, SOUND, CLEAR);
    expect(again).toMatchObject({ looked: 'sound', rung: 'clear', state: 'set aside' });
  });

  it('set aside says why, is still where it was, and owes nothing until it returns', () => {
    expect(fold(...RUNNING, SET_ASIDE)).toMatchObject({
      state: 'set aside',
      setAsideReason: 'A chip at the edge',
      onSpindle: { quillId: 'arbor' },
      looked: null,
      due: null,
    });
    expect(fold(...READY, SET_ASIDE, SOUND, RETURNED)).toMatchObject({
      state: 'on the rack',
      setAsideReason: null,
      looked: 'sound',
      rung: null,
      due: { why: 'ring test' },
    });
    expect(fold(...READY, SCRAPPED)).toMatchObject({
      state: 'scrapped',
      setAsideReason: null,
      due: null,
    });
  });
});

describe('an entry that waits for a signature', () => {
  const needsSkilled = { ...byApprentice, needs: 'skilled' as const };
  const needsAppointed = { ...byApprentice, needs: 'appointed' as const };

  it('counts for nothing while it speaks for the wheel', () => {
    const waiting = fold(RECEIVED, [SOUND, needsSkilled], [CLEAR, needsSkilled]);
    expect(waiting).toMatchObject({ looked: null, rung: null, unsigned: false });
    expect(waiting.waiting.map(({ entryId, needs }) => [entryId, needs])).toEqual([
      ['entry-2', 'skilled'],
      ['entry-3', 'skilled'],
    ]);
    const signed = fold(RECEIVED, [SOUND, needsSkilled], [CLEAR, needsSkilled], signs(3));
    expect(signed).toMatchObject({ looked: null, rung: 'clear' });
    expect(signed.waiting.map(({ entryId }) => entryId)).toEqual(['entry-2']);
  });

  it('counts at once while it speaks against it', () => {
    const dull: WheelStep = { kind: 'ring test', ring: 'dull' };
    expect(fold(...READY, [dull, needsSkilled])).toMatchObject({ rung: 'dull', waiting: [] });
    const damaged: WheelStep = { kind: 'inspected', look: 'damaged', diameterMm: null };
    expect(fold(...READY, [damaged, needsSkilled])).toMatchObject({ looked: 'damaged' });
  });

  it('is worth no signature once the wheel was tested again, or came off', () => {
    expect(fold(RECEIVED, [CLEAR, needsSkilled], CLEAR).waiting).toEqual([]);
    expect(fold(RECEIVED, [CLEAR, needsSkilled], [CLEAR, needsSkilled]).waiting).toHaveLength(1);
    expect(fold(RECEIVED, [CLEAR, needsSkilled], SET_ASIDE).waiting).toEqual([]);
    const off = fold(...READY, [MOUNTED, needsAppointed], TAKEN_OFF);
    expect(off).toMatchObject({ waiting: [], unsigned: false });
    // A signature that comes too late counts where the test stands: before it lapsed.
    expect(fold(RECEIVED, [CLEAR, needsSkilled], SET_ASIDE, signs(2)).rung).toBeNull();
  });

  it('leaves work as done, and the wheel as not to be run', () => {
    const mounted = fold(...READY, [MOUNTED, needsAppointed]);
    expect(mounted).toMatchObject({ state: 'mounted', unsigned: true });
    expect(fold(...READY, [MOUNTED, needsAppointed], signs(4)).unsigned).toBe(false);
    const dressed = fold(...RUNNING, [DRESSED, needsAppointed]);
    expect(dressed.unsigned).toBe(true);
    expect(dressed.diameterNowMm).toBeCloseTo(124.8, 9);
    const tried = fold(...READY, MOUNTED, [TRIAL_RUN, needsAppointed]);
    expect(tried).toMatchObject({ unsigned: true, lastTrialRun: null });
    const triedAgain = fold(...READY, MOUNTED, [TRIAL_RUN, needsAppointed], TRIAL_RUN);
    expect(triedAgain).toMatchObject({ unsigned: false, waiting: [] });
    expect(triedAgain.lastTrialRun).not.toBeNull();
  });

  it('waits again when its signature is taken back', () => {
    const life = fold(...READY, [MOUNTED, needsAppointed], signs(4), corrects(5));
    expect(life.unsigned).toBe(true);
  });
});

describe('a correction', () => {
  it('takes an entry out, as if it had never been made', () => {
    const dressedWrong: WheelStep = { kind: 'dressed', depthMm: 0.2, passes: 5 };
    const life = fold(...RUNNING, dressedWrong, corrects(6), DRESSED);
    expect(life.diameterNowMm).toBeCloseTo(124.8, 9);
    expect(life.dressings).toBe(1);
    expect(fold(...READY, corrects(3)).rung).toBeNull();
    expect(fold(...READY, MOUNTED, corrects(4)).state).toBe('on the rack');
  });

  it('of a scrapping leaves the wheel set aside, for somebody to look at', () => {
    expect(fold(...READY, SCRAPPED, corrects(4))).toMatchObject({
      state: 'set aside',
      setAsideReason: 'Of another wheel',
      looked: null,
    });
    const asideBefore = fold(...READY, SET_ASIDE, SCRAPPED, corrects(5));
    expect(asideBefore).toMatchObject({ setAsideReason: 'A chip at the edge' });
  });
});
