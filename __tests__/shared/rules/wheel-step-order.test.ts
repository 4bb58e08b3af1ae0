import type { EntryKind, WheelStep } from '@/shared/domain/wheel-life';
import { orderRefusal } from '@/shared/rules/wheel-step-order';
import { stepRefusalWords } from '@/shared/rules/wheel-step-words';
import { stepChoices, stepRefusal } from '@/shared/rules/wheel-steps';
import { formatQuantity } from '@/shared/units/format';

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
  USED,
} from '../../support/wheel-lives';

type Life = Parameters<typeof lifeOf>;

const codeOf = (step: WheelStep, life: Life) =>
  stepRefusal(step, caseOf(lifeOf(...life)))?.code ?? 'taken';
const wordsOf = (step: WheelStep, life: Life) => {
  const refusal = stepRefusal(step, caseOf(lifeOf(...life)));
  return refusal && stepRefusalWords(refusal, (quantity) => formatQuantity(quantity, 'mm'));
};

const damaged: WheelStep = { kind: 'inspected', look: 'damaged', diameterMm: null };
const dull: WheelStep = { kind: 'ring test', ring: 'dull' };
const silent: WheelStep = { kind: 'ring test', ring: 'silent' };

describe('the order of things', () => {
  it.each([
    ['mounted', READY, 'taken'],
    ['mounted', [RECEIVED, CLEAR], 'wheel-not-looked-at'],
    ['mounted', [RECEIVED, SOUND], 'ring-missing'],
    ['mounted', [RECEIVED, SOUND, dull], 'ring-dull'],
    ['mounted', [RECEIVED, damaged, CLEAR], 'wheel-damaged'],
    // 125 mm vitrified and silent; 4 in and under prove nothing by their sound (MIOSHA R 408.10113).
    ['mounted', [RECEIVED, SOUND, silent], 'ring-silent-large'],
    ['mounted', [...READY, MOUNTED], 'already-mounted'],
    ['mounted', [...READY, SET_ASIDE], 'wheel-set-aside'],
    ['mounted', [...READY, SCRAPPED], 'wheel-scrapped'],
    ['mounted', [...READY, MOUNTED, TAKEN_OFF], 'wheel-not-looked-at'],
    ['mounted', [...READY, MOUNTED, TAKEN_OFF, SOUND], 'ring-missing'],
    ['mounted', [...READY, MOUNTED, TAKEN_OFF, SOUND, CLEAR], 'taken'],
    ['trial run', [...READY, MOUNTED], 'taken'],
    ['trial run', READY, 'not-mounted'],
    ['trial run', [...READY, MOUNTED, SET_ASIDE], 'wheel-set-aside'],
    ['trial run', [...READY, MOUNTED, damaged], 'wheel-damaged'],
    ['dressed', RUNNING, 'taken'],
    ['dressed', READY, 'not-mounted'],
    ['dressed', [...READY, MOUNTED], 'trial-run-missing'],
    ['dressed', [...RUNNING, SET_ASIDE], 'wheel-set-aside'],
    ['used', RUNNING, 'taken'],
    ['used', READY, 'not-mounted'],
    ['used', [...READY, MOUNTED], 'trial-run-missing'],
    ['used', [...RUNNING, damaged], 'wheel-damaged'],
    ['used', [...RUNNING, SET_ASIDE], 'wheel-set-aside'],
    ['taken off', [...READY, MOUNTED], 'taken'],
    ['taken off', [...READY, MOUNTED, SET_ASIDE], 'taken'],
    ['taken off', READY, 'not-mounted'],
    ['ring test', READY, 'taken'],
    ['ring test', [...READY, SET_ASIDE], 'taken'],
    ['ring test', [...READY, MOUNTED], 'still-mounted'],
    ['ring test', [...READY, SCRAPPED], 'wheel-scrapped'],
    ['inspected', [...READY, MOUNTED], 'taken'],
    ['inspected', [...READY, SCRAPPED], 'wheel-scrapped'],
    ['set aside', READY, 'taken'],
    ['set aside', [...READY, MOUNTED], 'taken'],
    ['set aside', [...READY, SET_ASIDE], 'already-set-aside'],
    ['set aside', [...READY, SCRAPPED], 'wheel-scrapped'],
    ['returned', READY, 'not-set-aside'],
    ['returned', [...READY, SET_ASIDE], 'fresh-look-missing'],
    ['returned', [...READY, SET_ASIDE, SOUND], 'taken'],
    ['returned', [...READY, SET_ASIDE, damaged], 'wheel-damaged'],
    ['returned', [...READY, dull, SET_ASIDE, SOUND], 'ring-dull'],
    ['returned', [...READY, MOUNTED, SET_ASIDE, SOUND], 'still-mounted'],
    ['returned', [...READY, MOUNTED, SET_ASIDE, SOUND, TAKEN_OFF], 'fresh-look-missing'],
    ['returned', [...READY, SCRAPPED], 'wheel-scrapped'],
    ['scrapped', READY, 'taken'],
    ['scrapped', [...READY, SET_ASIDE], 'taken'],
    ['scrapped', [...READY, MOUNTED], 'still-mounted'],
    ['scrapped', [...READY, MOUNTED, SET_ASIDE], 'still-mounted'],
    ['scrapped', [...READY, SCRAPPED], 'wheel-scrapped'],
  ] as const)('%s after %j: %s', (kind, life, code) => {
    const all = [
      ...[SOUND, CLEAR, MOUNTED, TRIAL_RUN, DRESSED, USED],
      ...[TAKEN_OFF, SET_ASIDE, RETURNED, SCRAPPED],
    ];
    const step = all.find((one) => one.kind === kind);
    if (!step) throw new Error(kind);
    expect(codeOf(step, [...life])).toBe(code);
    const choice = stepChoices(caseOf(lifeOf(...life))).find((one) => one.kind === kind);
    expect(choice?.refusal?.code ?? 'taken').toBe(code);
  });

  it('says in words why not', () => {
    expect(wordsOf(MOUNTED, [...READY, SET_ASIDE])).toBe(
      'This wheel is set aside: A chip at the edge.',
    );
    expect(wordsOf(DRESSED, [...READY, MOUNTED])).toBe(
      'Since it was mounted the wheel has had no trial run of 3\u00a0min that counts.',
    );
  });

  it('asks nothing of what happens on paper', () => {
    const scrapped = { state: 'scrapped' as const, onSpindle: null, setAsideReason: null };
    for (const kind of ['countersigned', 'correction'] satisfies EntryKind[])
      expect(orderRefusal(scrapped, kind)).toBeNull();
  });
});
