import type { Actor } from '@/shared/domain/appointments';
import type { WheelStep } from '@/shared/domain/wheel-life';
import { stepRefusalWords } from '@/shared/rules/wheel-step-words';
import { stepChoices, stepRefusal, type StepCase } from '@/shared/rules/wheel-steps';
import { formatQuantity } from '@/shared/units/format';

import { ARBOR, QUILL, SHAFT_GRINDER, TODAY } from '../../support/plan-inputs';
import {
  caseOf,
  CLEAR,
  DRESSED,
  lifeOf,
  MOUNTED,
  READY,
  RECORD,
  RETURNED,
  RUNNING,
  SCRAPPED,
  SET_ASIDE,
  SOUND,
  TAKEN_OFF,
  TRIAL_RUN,
  USED,
} from '../../support/wheel-lives';

type Life = Parameters<typeof lifeOf>;

const codeOf = (step: WheelStep, life: Life, extra: Partial<StepCase> = {}) =>
  stepRefusal(step, caseOf(lifeOf(...life), extra))?.code ?? 'taken';
const wordsOf = (step: WheelStep, life: Life, extra: Partial<StepCase> = {}) => {
  const refusal = stepRefusal(step, caseOf(lifeOf(...life), extra));
  return refusal && stepRefusalWords(refusal, (quantity) => formatQuantity(quantity, 'mm'));
};

const actor = (role: Actor['role'], tasks: Actor['tasks'] = []): Actor => ({
  personId: role,
  role,
  tasks,
});

describe('sizes', () => {
  const dress = (depthMm: number, passes: number): WheelStep => ({
    kind: 'dressed',
    depthMm,
    passes,
  });
  const worn = (diameterMm: number): Life => [
    ...RUNNING,
    { kind: 'used', minutes: null, diameterMm },
  ];

  it('end at the smallest usable diameter, and not a thousandth below', () => {
    // 80 mm is the smallest: 80.2 - 2 x 0.02 x 5 = 80 may be, 80.199 - 0.2 may not.
    expect(codeOf(dress(0.02, 5), worn(80.2))).toBe('taken');
    expect(codeOf(dress(0.02, 5), worn(80.199))).toBe('below-smallest');
    expect(wordsOf(dress(0.02, 5), worn(80.1))).toBe(
      'Dressing would leave 79.9\u00a0mm; the smallest usable diameter of this wheel is 80\u00a0mm.',
    );
  });

  it('end at the hole where no smallest diameter is written down', () => {
    const wheel = { ...RECORD, smallestUsableMm: null };
    expect(codeOf(dress(0.02, 5), worn(20.3), { wheel })).toBe('taken');
    expect(codeOf(dress(0.02, 5), worn(20.2), { wheel })).toBe('into-the-hole');
  });

  it('keep a wheel that is measured below its smallest from being used and mounted', () => {
    expect(codeOf(USED, worn(80))).toBe('taken');
    expect(codeOf(USED, worn(79.99))).toBe('wheel-worn-out');
    expect(codeOf(MOUNTED, [...worn(79.99), TAKEN_OFF, SOUND, CLEAR])).toBe('wheel-worn-out');
  });

  it.each([
    [125, 'taken'],
    [125.01, 'larger-than-new'],
    [20.01, 'taken'],
    [20, 'into-the-hole'],
  ])('measured as %d: %s', (diameterMm, code) => {
    expect(codeOf({ kind: 'inspected', look: 'sound', diameterMm }, READY)).toBe(code);
    expect(codeOf({ kind: 'used', minutes: null, diameterMm }, RUNNING)).toBe(code);
  });
});

describe('spindles', () => {
  const trial = (spindleRpm: number): WheelStep => ({ kind: 'trial run', minutes: 3, spindleRpm });
  const onTrial = (spindleRpm: number, extra: Partial<StepCase> = {}) =>
    codeOf(trial(spindleRpm), [...READY, MOUNTED], extra);

  it('hold a trial run to the lowest limit: the marked rpm', () => {
    // Marked 5 345 rpm and 35 m/s: 60 000 x 35 / (pi x 125) = 5 347.6 (Cal. Title 8 s. 3580).
    expect(onTrial(5345)).toBe('taken');
    expect(onTrial(5346)).toBe('trial-run-too-fast');
  });

  it('hold it to the grinder’s and the quill’s limit where those are lower', () => {
    const slow = { ...SHAFT_GRINDER, spindleMaximumRpm: 4000 };
    expect(onTrial(4000, { spindle: { grinder: slow, quill: ARBOR } })).toBe('taken');
    expect(onTrial(4001, { spindle: { grinder: slow, quill: ARBOR } })).toBe('trial-run-too-fast');
    const quill = { ...ARBOR, markedMaximumRpm: 3500 };
    expect(onTrial(3500, { spindle: { grinder: SHAFT_GRINDER, quill } })).toBe('taken');
    expect(onTrial(3501, { spindle: { grinder: SHAFT_GRINDER, quill } })).toBe(
      'trial-run-too-fast',
    );
  });

  it('refuse a wheel that every belt step would turn too fast', () => {
    // The slowest step gives 2 850 rpm.
    const marked = (markedRpm: number) => ({
      wheel: { ...RECORD, markedRpm, markedSpeedMPerS: null },
    });
    expect(codeOf(MOUNTED, READY, marked(2850))).toBe('taken');
    expect(codeOf(MOUNTED, READY, marked(2849))).toBe('no-step-within-limit');
  });

  it('refuse a wheel that does not go on, and one that nobody knows the place of', () => {
    const loose = { spindle: { grinder: SHAFT_GRINDER, quill: QUILL } };
    expect(codeOf(MOUNTED, READY, loose)).toBe('hole-too-large');
    expect(codeOf(MOUNTED, READY, { spindle: null })).toBe('spindle-unknown');
    expect(onTrial(3000, { spindle: null })).toBe('spindle-unknown');
  });

  it('refuse a wheel without a marking, and one that expired yesterday', () => {
    const unmarked = { ...RECORD, markedRpm: null, markedSpeedMPerS: null };
    expect(codeOf(MOUNTED, READY, { wheel: unmarked })).toBe('unmarked-wheel');
    expect(codeOf(MOUNTED, READY, { wheel: { ...RECORD, expiresOn: TODAY } })).toBe('taken');
    const expired = { ...RECORD, expiresOn: '2026-03-01' };
    expect(codeOf(MOUNTED, READY, { wheel: expired })).toBe('wheel-expired');
    expect(codeOf(USED, RUNNING, { wheel: expired })).toBe('wheel-expired');
  });
});

describe('trial runs', () => {
  const trial = (minutes: number, happenedOn = TODAY): Life[number] => [
    { kind: 'trial run', minutes, spindleRpm: 3000 },
    { happenedOn },
  ];
  const mounted: Life = [...READY, MOUNTED];

  it('last three minutes after a mounting (Japan, art. 118)', () => {
    expect(codeOf(USED, [...mounted, trial(3)])).toBe('taken');
    expect(codeOf(USED, [...mounted, trial(2.9)])).toBe('trial-run-missing');
    expect(codeOf(USED, [...mounted, trial(3), TAKEN_OFF, SOUND, CLEAR, MOUNTED])).toBe(
      'trial-run-missing',
    );
  });

  it('last one minute on each day (Japan, art. 118)', () => {
    const before: Life = READY.map((step) => [step, { happenedOn: '2026-03-01' }]);
    const yesterday: Life = [
      ...before,
      [MOUNTED, { happenedOn: '2026-03-01' }],
      trial(3, '2026-03-01'),
    ];
    expect(codeOf(USED, yesterday)).toBe('trial-run-of-the-day');
    expect(codeOf(DRESSED, yesterday)).toBe('trial-run-of-the-day');
    expect(codeOf(USED, yesterday, { happenedOn: '2026-03-01' })).toBe('taken');
    expect(codeOf(USED, [...yesterday, trial(1)])).toBe('taken');
    expect(codeOf(USED, [...yesterday, trial(0.9)])).toBe('trial-run-of-the-day');
  });

  it('are as long as the shop asks, where it asks for more', () => {
    const { rules } = caseOf([]);
    const strict = { rules: { ...rules, trialRunMinutes: 5 } };
    expect(codeOf(USED, [...mounted, trial(4)], strict)).toBe('trial-run-missing');
    expect(codeOf(USED, [...mounted, trial(5)], strict)).toBe('taken');
  });
});

describe('days', () => {
  it('are not in the future, nor before the latest entry', () => {
    expect(codeOf(SOUND, READY, { happenedOn: '2026-03-03' })).toBe('in-the-future');
    expect(codeOf(SOUND, READY, { happenedOn: '2026-03-01' })).toBe('out-of-order');
    expect(codeOf(SOUND, READY, { happenedOn: TODAY })).toBe('taken');
  });

  it('are never too early for setting a wheel aside', () => {
    expect(codeOf(SET_ASIDE, READY, { happenedOn: '2026-02-01' })).toBe('taken');
    expect(codeOf(SET_ASIDE, READY, { happenedOn: '2026-03-03' })).toBe('in-the-future');
  });
});

describe('roles', () => {
  const life = [...READY, SET_ASIDE, SOUND];
  it.each([
    ['lead', RETURNED, life, 'taken'],
    ['machinist', RETURNED, life, 'lead-returns'],
    ['apprentice', RETURNED, life, 'lead-returns'],
    ['machinist', SCRAPPED, READY, 'taken'],
    ['apprentice', SCRAPPED, READY, 'role'],
    ['apprentice', SET_ASIDE, READY, 'taken'],
    ['apprentice', CLEAR, READY, 'taken'],
    ['apprentice', MOUNTED, READY, 'taken'],
    ['machinist', MOUNTED, READY, 'taken'],
  ] as const)('let a %s do %j: %s', (role, step, before, code) => {
    expect(codeOf(step, [...before], { actor: actor(role) })).toBe(code);
  });

  it('decide whose signature a step waits for', () => {
    const needs = (who: Actor) =>
      Object.fromEntries(
        stepChoices(caseOf(lifeOf(...READY), { actor: who })).flatMap(({ kind, needs: signer }) =>
          signer === null ? [] : [[kind, signer]],
        ),
      );
    const appointed = { mounted: 'appointed', 'trial run': 'appointed', dressed: 'appointed' };
    expect(needs(actor('lead', ['mount', 'dress', 'trial run']))).toEqual({});
    expect(needs(actor('lead'))).toEqual(appointed);
    expect(needs(actor('machinist', ['mount']))).toEqual({
      'trial run': 'appointed',
      dressed: 'appointed',
    });
    const tests = { inspected: 'skilled', 'ring test': 'skilled' };
    expect(needs(actor('apprentice'))).toEqual({ ...tests, ...appointed });
    expect(needs(actor('apprentice', ['mount', 'dress', 'trial run']))).toEqual({
      ...tests,
      ...appointed,
    });
  });
});

describe('unsigned work', () => {
  const unsigned = { personId: 'apprentice', needs: 'appointed' as const };

  it('keeps the wheel from everything but coming off and being set aside', () => {
    const life: Life = [...READY, [MOUNTED, unsigned]];
    expect(codeOf(TRIAL_RUN, life)).toBe('wheel-unsigned');
    expect(codeOf(USED, life)).toBe('wheel-unsigned');
    expect(codeOf(TAKEN_OFF, life)).toBe('taken');
    expect(codeOf(SET_ASIDE, life)).toBe('taken');
    const dressed: Life = [...RUNNING, [DRESSED, unsigned]];
    expect(codeOf(USED, dressed)).toBe('wheel-unsigned');
    expect(codeOf(DRESSED, dressed)).toBe('wheel-unsigned');
  });

  it('may be a trial run that somebody appointed does again', () => {
    const life: Life = [...READY, MOUNTED, [TRIAL_RUN, unsigned]];
    expect(codeOf(USED, life)).toBe('wheel-unsigned');
    expect(codeOf(TRIAL_RUN, life)).toBe('taken');
    expect(codeOf(USED, [...life, TRIAL_RUN])).toBe('taken');
  });
});
