import fc from 'fast-check';

import type { WheelEntry, WheelStep } from '@/shared/domain/wheel-life';
import { foldWheelLife } from '@/shared/rules/wheel-life';
import { stepRefusal } from '@/shared/rules/wheel-steps';

import {
  caseOf,
  CLEAR,
  DRESSED,
  entry,
  lifeOf,
  MOUNTED,
  RECEIVED,
  RECORD,
  RETURNED,
  SCRAPPED,
  SET_ASIDE,
  SOUND,
  TAKEN_OFF,
  TRIAL_RUN,
  USED,
} from '../../support/wheel-lives';

const signs = (number: number): WheelStep => ({
  kind: 'countersigned',
  entryId: `entry-${number}`,
});
const corrects = (number: number): WheelStep => ({
  kind: 'correction',
  entryId: `entry-${number}`,
  reason: 'Of another wheel',
});

describe('whatever happens to a wheel', () => {
  const steps: fc.Arbitrary<WheelStep> = fc.oneof(
    fc.constantFrom<WheelStep>(
      ...[SOUND, CLEAR, MOUNTED, TRIAL_RUN, DRESSED, USED, TAKEN_OFF],
      ...[SET_ASIDE, RETURNED, SCRAPPED],
      { kind: 'ring test', ring: 'dull' },
      { kind: 'inspected', look: 'damaged', diameterMm: null },
    ),
    fc.nat(12).map((number) => corrects(number + 1)),
    fc.nat(12).map((number) => signs(number + 1)),
  );
  const people = fc.constantFrom('lead', 'apprentice');

  /** A life of those steps alone that may be recorded, one after the other. */
  const lives = fc.array(fc.tuple(steps, people), { maxLength: 25 }).map((tries) =>
    tries.reduce<WheelEntry[]>((life, [step, personId]) => {
      const isApprentice = personId === 'apprentice';
      const given = caseOf(life, {
        actor: isApprentice
          ? { personId, role: 'apprentice', tasks: [] }
          : { personId, role: 'lead', tasks: ['mount', 'dress', 'trial run'] },
      });
      if (stepRefusal(step, given) !== null) return life;
      const needs =
        isApprentice && (step.kind === 'inspected' || step.kind === 'ring test')
          ? ('skilled' as const)
          : isApprentice && ['mounted', 'dressed', 'trial run'].includes(step.kind)
            ? ('appointed' as const)
            : null;
      return [...life, entry(life.length + 1, step, { personId, needs })];
    }, lifeOf(RECEIVED)),
  );

  it('its entries say the same in whatever order they are handed over', () => {
    fc.assert(
      fc.property(lives, fc.infiniteStream(fc.nat()), (life, numbers) => {
        const shuffled = life
          .map((one) => ({ one, at: numbers.next().value ?? 0 }))
          .sort((a, b) => a.at - b.at)
          .map(({ one }) => one);
        expect(foldWheelLife(RECORD, shuffled)).toEqual(foldWheelLife(RECORD, life));
      }),
    );
  });

  it('its state, spindle, reason and size agree, and it never runs unsigned', () => {
    fc.assert(
      fc.property(lives, (life) => {
        const now = foldWheelLife(RECORD, life);
        expect(now.state === 'set aside').toBe(now.setAsideReason !== null);
        if (now.state === 'mounted') expect(now.onSpindle).not.toBeNull();
        if (now.state === 'on the rack' || now.state === 'scrapped')
          expect(now.onSpindle).toBeNull();
        if (now.onSpindle === null) expect(now.lastTrialRun).toBeNull();
        expect(now.diameterNowMm).toBeLessThanOrEqual(RECORD.diameterNewMm);
        expect(now.diameterNowMm).toBeGreaterThanOrEqual((RECORD.smallestUsableMm ?? 0) - 1e-9);
        expect(now.unsigned).toBe(now.waiting.some(({ needs }) => needs === 'appointed'));
        if (now.unsigned) expect(stepRefusal(USED, caseOf(life))).not.toBeNull();
        if (now.state === 'on the rack' && now.rung === null)
          expect(stepRefusal(MOUNTED, caseOf(life))).not.toBeNull();
      }),
      { numRuns: 300 },
    );
  });
});
