import type { Actor } from '../domain/appointments';
import type { ShopRules } from '../domain/shop-rules';
import type { EntryKind, Signer, WheelEntry, WheelStanding, WheelStep } from '../domain/wheel-life';
import type { WheelRecord } from '../domain/wheels';
import { mayRecord } from '../roles/roles';
import { isOrganic, markingOf } from './bond';
import { quantity } from './figures';
import { limitRpm } from './limits';
import { isBelow, wheelFindings } from './wheel-checks';
import { diameterAfterDressing } from './wheel-life';
import { correctionRefusal, signatureRefusal, signerFor } from './wheel-signatures';
import { spindleUse, type Spindle } from './wheel-spindles';
import { orderRefusal } from './wheel-step-order';
import { refuse, type StepRefusal } from './wheel-step-words';

export interface StepCase {
  wheel: WheelRecord;
  /** All of the wheel's entries. */
  entries: readonly WheelEntry[];
  /** What they come to. */
  standing: WheelStanding;
  actor: Actor;
  /** ISO date of the shop. */
  today: string;
  /** ISO date, as entered. */
  happenedOn: string;
  rules: ShopRules;
  /** The one named by a mounting, or the one the wheel sits on; null where it is not known. */
  spindle: Spindle | null;
}

const RUNNING: readonly EntryKind[] = ['trial run', 'dressed', 'used'];
const SLACK_MM = 1e-9;

/**
 * Whether a person may record a step of a wheel's life, and if not, why.
 *
 * @param step - what happened.
 * @param given - the wheel, its entries and what they come to, who acts, when, and on which spindle.
 * @returns the first reason against it; null where it may be recorded.
 * @source osha-1910-215-d1
 * @example stepRefusal({ kind: 'dressed', depthMm: 0.02, passes: 3 }, stepCase).code // 'not-mounted'
 */
export function stepRefusal(step: WheelStep, given: StepCase): StepRefusal | null {
  const { standing, actor } = given;
  if (step.kind === 'countersigned') {
    if (!given.entries.some(({ id }) => id === step.entryId)) return refuse('no-such-entry');
    const waiting = standing.waiting.find(({ entryId }) => entryId === step.entryId);
    if (waiting === undefined) return refuse('nothing-to-sign');
    return signatureRefusal(waiting, actor) ?? dayRefusal(step.kind, given);
  }
  if (step.kind === 'correction')
    return (
      correctionRefusal({ ...given, entryId: step.entryId }, actor) ?? dayRefusal(step.kind, given)
    );
  return (
    kindRefusal(step.kind, given) ?? dayRefusal(step.kind, given) ?? amountRefusal(step, given)
  );
}

/**
 * Whether a person's role lets them record a step, whatever the wheel.
 *
 * @param kind - the step.
 * @param actor - who would record it.
 * @returns why not; null where it does.
 * @source none: the roles are our own
 * @example roleRefusal('returned', { personId: 'p', role: 'machinist', tasks: [] }).code // 'lead-returns'
 */
export function roleRefusal(kind: EntryKind, { role }: Actor): StepRefusal | null {
  // Who may sign hangs on what is signed.
  if (kind === 'countersigned' || mayRecord(role, kind)) return null;
  return refuse(kind === 'returned' ? 'lead-returns' : 'role');
}

export interface StepChoice {
  kind: EntryKind;
  refusal: StepRefusal | null;
  needs: Signer | null;
}

/** What a person chooses from; signing and correcting start at the entry they are about. */
const CHOICES: readonly EntryKind[] = [
  'inspected',
  'ring test',
  'mounted',
  'trial run',
  'dressed',
  'used',
  'taken off',
  'set aside',
  'returned',
  'scrapped',
];

/**
 * Which steps a person may record now, as far as the wheel alone tells: amounts and, for a mounting, the
 * spindle are judged once they are known.
 *
 * @param given - as for stepRefusal.
 * @returns every step, with the reason against it and the signature it would wait for.
 * @source osha-1910-215-d1
 * @example stepChoices(stepCase).find(({ kind }) => kind === 'set aside').refusal // null
 */
export function stepChoices(given: StepCase): StepChoice[] {
  return CHOICES.map((kind) => ({
    kind,
    refusal: kindRefusal(kind, given),
    needs: signerFor(kind, given.actor),
  }));
}

/** What stands against this kind of step, whatever its amounts. */
function kindRefusal(kind: EntryKind, given: StepCase): StepRefusal | null {
  const { standing, actor } = given;
  const inOrder = orderRefusal(standing, kind);
  if (inOrder !== null) return inOrder;
  const byRole = roleRefusal(kind, actor);
  if (byRole !== null) return byRole;
  if (kind === 'mounted') return soundRefusal(given);
  if (kind === 'returned') return returnRefusal(given);
  return RUNNING.includes(kind) ? runningRefusal(kind, given) : null;
}

/** The first thing that keeps the wheel from running wherever it is. */
function soundRefusal({ wheel, standing, today }: StepCase): StepRefusal | null {
  const found = wheelFindings({
    wheel: { ...wheel, ...standing },
    quill: null,
    organicBond: isOrganic(markingOf(wheel.marking)),
    typed: false,
    today,
  });
  return found.find(({ level }) => level === 'stop') ?? null;
}

function returnRefusal(given: StepCase): StepRefusal | null {
  const { looked, rung } = given.standing;
  if (looked === null) return refuse('fresh-look-missing');
  const spokenAgainst = looked === 'damaged' || rung === 'dull';
  return spokenAgainst
    ? soundRefusal({ ...given, standing: { ...given.standing, state: 'on the rack' } })
    : null;
}

function runningRefusal(kind: EntryKind, given: StepCase): StepRefusal | null {
  const { standing, rules, happenedOn } = given;
  // A trial run that waits for a signature may be done again, by somebody whose own counts.
  const others = standing.waiting.filter((waiting) => waiting.kind !== 'trial run');
  const unsigned = others.some(({ needs }) => needs === 'appointed');
  const isTrial = kind === 'trial run';
  const sound = soundRefusal(isTrial ? { ...given, standing: { ...standing, unsigned } } : given);
  if (sound !== null || isTrial) return sound;
  const minutes = (value: number) => ({ figures: { minutes: quantity(value, 'min') } });
  const { lastTrialRun, longestTrialRunMinutes } = standing;
  if (lastTrialRun === null || longestTrialRunMinutes < rules.trialRunMinutes)
    return refuse('trial-run-missing', minutes(rules.trialRunMinutes));
  const daily = rules.dailyTrialRunMinutes;
  return lastTrialRun.happenedOn === happenedOn && lastTrialRun.minutes >= daily
    ? null
    : refuse('trial-run-of-the-day', minutes(daily));
}

/** Setting a wheel aside is never too late to be written down. */
function dayRefusal(kind: EntryKind, given: StepCase): StepRefusal | null {
  const { happenedOn, today, standing } = given;
  if (happenedOn > today) return refuse('in-the-future');
  return happenedOn < standing.latestOn && kind !== 'set aside'
    ? refuse('out-of-order', { names: { date: standing.latestOn } })
    : null;
}

function amountRefusal(step: WheelStep, given: StepCase): StepRefusal | null {
  const { wheel, standing, spindle, rules } = given;
  const now = { ...wheel, ...standing };
  switch (step.kind) {
    case 'mounted':
      return spindle === null ? refuse('spindle-unknown') : spindleUse(now, spindle, rules).refusal;
    case 'trial run': {
      if (spindle === null) return refuse('spindle-unknown');
      const limit = limitRpm(spindleUse(now, spindle, rules).governing);
      const figures = { rpm: quantity(step.spindleRpm, 'rpm'), limit: quantity(limit, 'rpm') };
      return step.spindleRpm > limit ? refuse('trial-run-too-fast', { figures }) : null;
    }
    case 'dressed':
      return dressingRefusal(wheel, diameterAfterDressing(standing.diameterNowMm, step));
    case 'inspected':
    case 'used':
      return step.diameterMm === null ? null : sizeRefusal(wheel, step.diameterMm);
    default:
      return null;
  }
}

function dressingRefusal(wheel: WheelRecord, leftMm: number): StepRefusal | null {
  const { smallestUsableMm } = wheel;
  if (smallestUsableMm === null || !isBelow(leftMm, smallestUsableMm))
    return sizeRefusal(wheel, leftMm);
  const figures = {
    left: quantity(leftMm, 'mm'),
    smallest: quantity(smallestUsableMm, 'mm'),
  };
  return refuse('below-smallest', { figures });
}

/** What a wheel's diameter cannot be, however it was come by. */
function sizeRefusal({ diameterNewMm, holeMm }: WheelRecord, leftMm: number): StepRefusal | null {
  if (leftMm > diameterNewMm + SLACK_MM)
    return refuse('larger-than-new', { figures: { fresh: quantity(diameterNewMm, 'mm') } });
  return leftMm > holeMm + SLACK_MM
    ? null
    : refuse('into-the-hole', {
        figures: { left: quantity(leftMm, 'mm'), hole: quantity(holeMm, 'mm') },
      });
}
