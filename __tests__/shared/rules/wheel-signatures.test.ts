import type { Actor, Appointment } from '@/shared/domain/appointments';
import type { WheelStep } from '@/shared/domain/wheel-life';
import { appointedTasks, appointmentHolds } from '@/shared/rules/wheel-signatures';
import { stepRefusalWords } from '@/shared/rules/wheel-step-words';
import { stepRefusal, type StepCase } from '@/shared/rules/wheel-steps';

import {
  caseOf,
  CLEAR,
  DRESSED,
  lifeOf,
  MOUNTED,
  READY,
  RECEIVED,
  RETURNED,
  RUNNING,
  SCRAPPED,
  SET_ASIDE,
  SOUND,
  TAKEN_OFF,
  TRIAL_RUN,
} from '../../support/wheel-lives';

type Life = Parameters<typeof lifeOf>;

const codeOf = (step: WheelStep, life: Life, extra: Partial<StepCase> = {}) =>
  stepRefusal(step, caseOf(lifeOf(...life), extra))?.code ?? 'taken';
const who = (
  personId: string,
  role: Actor['role'],
  tasks: Actor['tasks'] = [],
): Partial<StepCase> => ({ actor: { personId, role, tasks } });
const signs = (number: number): WheelStep => ({
  kind: 'countersigned',
  entryId: `entry-${number}`,
});
const corrects = (number: number): WheelStep => ({
  kind: 'correction',
  entryId: `entry-${number}`,
  reason: 'Of another wheel',
});

describe('a signature', () => {
  const rung: Life = [RECEIVED, [CLEAR, { personId: 'maren', needs: 'skilled' }]];
  const mounted: Life = [...READY, [MOUNTED, { personId: 'maren', needs: 'appointed' }]];
  const byMachinist: Life = [...READY, [MOUNTED, { personId: 'desmond', needs: 'appointed' }]];

  it.each([
    ['a ring test by a lead', signs(2), rung, who('l', 'lead'), 'taken'],
    ['a ring test by a machinist', signs(2), rung, who('m', 'machinist'), 'taken'],
    ['a ring test by an apprentice', signs(2), rung, who('a', 'apprentice'), 'not-skilled'],
    ['one’s own ring test', signs(2), rung, who('maren', 'machinist'), 'own-entry'],
    ['a mounting by who may mount', signs(4), mounted, who('m', 'machinist', ['mount']), 'taken'],
    [
      'a mounting by who may dress',
      signs(4),
      mounted,
      who('m', 'machinist', ['dress']),
      'not-appointed',
    ],
    ['a mounting by a lead nobody appointed', signs(4), mounted, who('l', 'lead'), 'not-appointed'],
    [
      'a mounting by an apprentice',
      signs(4),
      mounted,
      who('a', 'apprentice', ['mount']),
      'not-appointed',
    ],
    [
      'one’s own mounting, since appointed',
      signs(4),
      byMachinist,
      who('desmond', 'machinist', ['mount']),
      'own-entry',
    ],
    ['what waits for nobody', signs(2), READY, who('l', 'lead'), 'nothing-to-sign'],
    ['what is signed', signs(2), [...rung, signs(2)], who('l', 'lead'), 'nothing-to-sign'],
    ['what came off since', signs(4), [...mounted, TAKEN_OFF], who('l', 'lead'), 'nothing-to-sign'],
    ['what is not there', signs(9), rung, who('l', 'lead'), 'no-such-entry'],
  ] as const)('for %s', (_name, step, life, extra, code) => {
    expect(codeOf(step, [...life], extra)).toBe(code);
  });
});

describe('a correction', () => {
  const damaged: WheelStep = { kind: 'inspected', look: 'damaged', diameterMm: null };
  const dull: WheelStep = { kind: 'ring test', ring: 'dull' };

  it.each([
    ['a look', corrects(2), READY, 'taken'],
    ['a dressing', corrects(6), [...RUNNING, DRESSED], 'taken'],
    ['a mounting with nothing after it', corrects(4), [...READY, MOUNTED], 'taken'],
    ['a return', corrects(6), [...READY, SET_ASIDE, SOUND, RETURNED], 'taken'],
    ['a scrapping', corrects(4), [...READY, SCRAPPED], 'taken'],
    ['how it came', corrects(1), READY, 'received-stays'],
    ['a setting aside', corrects(4), [...READY, SET_ASIDE], 'return-instead'],
    ['damage seen', corrects(2), [RECEIVED, damaged], 'test-again'],
    ['a dull ring', corrects(2), [RECEIVED, dull], 'test-again'],
    ['a correction', corrects(4), [...READY, corrects(3)], 'correction-stays'],
    ['what is corrected', corrects(3), [...READY, corrects(3)], 'corrected-already'],
    ['what is not there', corrects(9), READY, 'no-such-entry'],
    ['a mounting that a trial run rests on', corrects(4), RUNNING, 'later-entries'],
    ['a coming off before another mounting', corrects(5), remounted(), 'later-entries'],
    ['a return before a mounting', corrects(6), returnedAndMounted(), 'later-entries'],
    ['a ring test before a mounting', corrects(3), [...READY, MOUNTED], 'taken'],
  ] as const)('of %s', (_name, step, life, code) => {
    expect(codeOf(step, [...life])).toBe(code);
  });

  function remounted(): Life {
    return [...READY, MOUNTED, TAKEN_OFF, SOUND, CLEAR, MOUNTED];
  }

  function returnedAndMounted(): Life {
    return [...READY, SET_ASIDE, SOUND, RETURNED, CLEAR, MOUNTED];
  }

  it('names the later entry that rests on it', () => {
    const refusal = stepRefusal(corrects(4), caseOf(lifeOf(...RUNNING)));
    expect(refusal && stepRefusalWords(refusal, String)).toBe(
      'A later entry rests on it: trial run, 2026-03-02. Correct that one first.',
    );
    expect(codeOf(corrects(4), [...RUNNING, corrects(5)])).toBe('taken');
  });

  it('that leaves a mounted wheel without a ring test keeps it from running', () => {
    expect(codeOf(TRIAL_RUN, [...READY, MOUNTED, corrects(3)])).toBe('ring-missing');
  });

  it.each([
    ['its author', who('maren', 'apprentice'), 'taken'],
    ['another apprentice', who('nils', 'apprentice'), 'others-entry'],
    ['a machinist', who('desmond', 'machinist'), 'taken'],
  ] as const)('is made by %s', (_name, extra, code) => {
    expect(codeOf(corrects(2), [RECEIVED, [CLEAR, { personId: 'maren' }]], extra)).toBe(code);
  });

  it('of a scrapping is a lead’s', () => {
    expect(codeOf(corrects(4), [...READY, SCRAPPED], who('m', 'machinist'))).toBe('lead-unscraps');
  });
});

describe('an appointment', () => {
  const appointment: Appointment = {
    id: 'a',
    personId: 'desmond',
    tasks: ['mount', 'dress'],
    wheelClass: 'All wheels',
    from: '2026-03-02',
    until: '2026-03-31',
    revoked: false,
  };

  it.each([
    ['2026-03-01', false],
    ['2026-03-02', true],
    ['2026-03-31', true],
    ['2026-04-01', false],
  ])('holds on %s: %s', (today, holds) => {
    expect(appointmentHolds(appointment, today)).toBe(holds);
    expect(appointmentHolds({ ...appointment, revoked: true }, today)).toBe(false);
  });

  it('has no end where none is given', () => {
    expect(appointmentHolds({ ...appointment, until: null }, '2199-12-31')).toBe(true);
  });

  it('gives its person its tasks, each once', () => {
    const more: Appointment = { ...appointment, id: 'b', tasks: ['dress', 'trial run'] };
    const tasks = (personId: string) =>
      appointedTasks([appointment, more], personId, '2026-03-02').sort();
    expect(tasks('desmond')).toEqual(['dress', 'mount', 'trial run']);
    expect(tasks('ottilie')).toEqual([]);
  });
});
