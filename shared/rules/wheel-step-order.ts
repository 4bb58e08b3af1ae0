import type { EntryKind, WheelEntry } from '../domain/wheel-life';
import type { WheelRecord } from '../domain/wheels';
import { finding } from './findings';
import { placesBefore, type WheelPlace } from './wheel-life';
import { refuse, type StepRefusal } from './wheel-step-words';

/** On paper, and so possible whatever became of the wheel. */
const ON_PAPER: readonly EntryKind[] = ['countersigned', 'correction'];
const ON_A_SPINDLE: readonly EntryKind[] = ['trial run', 'dressed', 'used', 'taken off'];
const OFF_A_SPINDLE: readonly EntryKind[] = ['ring test', 'returned', 'scrapped'];
const IN_USE: readonly EntryKind[] = ['mounted', 'trial run', 'dressed', 'used'];

/**
 * Whether a step can follow where the wheel is: on the rack, on a spindle, set aside or scrapped.
 *
 * @param at - where the wheel is.
 * @param kind - the step.
 * @returns why not; null where it can.
 * @source none: the order of things
 * @example orderRefusal({ state: 'mounted', onSpindle: {}, setAsideReason: null }, 'scrapped').code // 'still-mounted'
 */
export function orderRefusal(at: WheelPlace, kind: EntryKind): StepRefusal | null {
  const { state, onSpindle, setAsideReason } = at;
  if (ON_PAPER.includes(kind)) return null;
  if (state === 'scrapped') return finding('wheel-scrapped');
  if (state === 'set aside' && IN_USE.includes(kind))
    return finding('wheel-set-aside', { names: { reason: setAsideReason ?? '' } });
  if (onSpindle === null && ON_A_SPINDLE.includes(kind)) return refuse('not-mounted');
  if (kind === 'set aside' && state === 'set aside') return refuse('already-set-aside');
  if (kind === 'returned' && state !== 'set aside') return refuse('not-set-aside');
  if (onSpindle !== null && OFF_A_SPINDLE.includes(kind)) return refuse('still-mounted');
  return kind === 'mounted' && onSpindle !== null ? refuse('already-mounted') : null;
}

/**
 * Whether the later entries could still have followed one another without this one.
 *
 * @param wheel - what is written down of it.
 * @param entries - all entries of the wheel.
 * @param entryId - the entry to be taken back.
 * @returns the first later entry that could not; null where all could.
 * @source none: the order of things
 * @example leftHanging(rackWheel, [received, mounted, takenOff], mounted.id).id // 'taken-off'
 */
export function leftHanging(
  wheel: WheelRecord,
  entries: readonly WheelEntry[],
  entryId: string,
): WheelEntry | null {
  const taken = entries.find(({ id }) => id === entryId);
  if (taken === undefined) return null;
  const rest = entries.filter(({ id }) => id !== entryId);
  const torn = placesBefore(wheel, rest).find(
    ({ entry, before }) =>
      entry.number > taken.number && orderRefusal(before, entry.step.kind) !== null,
  );
  return torn?.entry ?? null;
}
