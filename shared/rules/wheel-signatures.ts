import type { Actor, AppointedTask, Appointment } from '../domain/appointments';
import type { EntryKind, Signer, WaitingEntry, WheelEntry, WheelStep } from '../domain/wheel-life';
import type { WheelRecord } from '../domain/wheels';
import { can } from '../roles/roles';
import { leftHanging } from './wheel-step-order';
import { countingEntries } from './wheel-life';
import { refuse, type StepRefusal } from './wheel-step-words';

/**
 * The task that only an appointed person does alone, where a step is one.
 *
 * @param kind - the step.
 * @returns the task; null for steps that anybody may take.
 * @source hk-59l-7
 * @example appointedTaskOf('mounted') // 'mount'
 */
export function appointedTaskOf(kind: EntryKind): AppointedTask | null {
  if (kind === 'mounted') return 'mount';
  if (kind === 'dressed') return 'dress';
  return kind === 'trial run' ? 'trial run' : null;
}

/**
 * Whose signature a step waits for when this person takes it. An apprentice is never appointed; what one
 * looked at or rang counts once a lead or a machinist has signed.
 *
 * @param kind - the step.
 * @param actor - who takes it, and what they are appointed for.
 * @returns null where it waits for nobody.
 * @source hk-59l-7
 * @example signerFor('dressed', { personId: 'p', role: 'machinist', tasks: ['dress'] }) // null
 */
export function signerFor(kind: EntryKind, actor: Actor): Signer | null {
  const task = appointedTaskOf(kind);
  if (task !== null) return isAppointed(actor, task) ? null : 'appointed';
  const isTest = kind === 'inspected' || kind === 'ring test';
  return isTest && actor.role === 'apprentice' ? 'skilled' : null;
}

function isAppointed({ role, tasks }: Actor, task: AppointedTask): boolean {
  return role !== 'apprentice' && tasks.includes(task);
}

/**
 * What a person is appointed for on a day.
 *
 * @param appointments - of the shop.
 * @param personId - the person.
 * @param today - ISO date of the shop.
 * @returns the tasks, each once.
 * @source hk-59l-7
 * @example appointedTasks([], 'p', '2026-03-02') // []
 */
export function appointedTasks(
  appointments: readonly Appointment[],
  personId: string,
  today: string,
): AppointedTask[] {
  const held = appointments.filter(
    (appointment) => appointment.personId === personId && appointmentHolds(appointment, today),
  );
  return [...new Set(held.flatMap(({ tasks }) => tasks))];
}

/**
 * Whether an appointment holds on a day: both of its dates included, and not ended before its time.
 *
 * @param appointment - from, until and whether it was ended.
 * @param today - ISO date of the shop.
 * @returns true when it does.
 * @source hk-59l-7
 * @example appointmentHolds({ from: '2026-03-02', until: '2026-03-02', revoked: false }, '2026-03-02') // true
 */
export function appointmentHolds(
  { from, until, revoked }: Pick<Appointment, 'from' | 'until' | 'revoked'>,
  today: string,
): boolean {
  return !revoked && from <= today && (until === null || until >= today);
}

/**
 * Whether a person may sign for an entry that waits.
 *
 * @param waiting - the entry.
 * @param actor - who would sign.
 * @returns why not; null where they may.
 * @source hk-59l-7
 * @example signatureRefusal({ entryId: 'e', kind: 'ring test', personId: 'p', needs: 'skilled' }, { personId: 'q', role: 'apprentice', tasks: [] }).code // 'not-skilled'
 */
export function signatureRefusal(waiting: WaitingEntry, actor: Actor): StepRefusal | null {
  if (waiting.personId === actor.personId) return refuse('own-entry');
  if (waiting.needs === 'skilled')
    return can(actor.role, 'wheel:sign') ? null : refuse('not-skilled');
  const task = appointedTaskOf(waiting.kind);
  return task !== null && isAppointed(actor, task) ? null : refuse('not-appointed');
}

interface Correction {
  wheel: WheelRecord;
  entries: readonly WheelEntry[];
  entryId: string;
}

/**
 * Whether a person may take an entry back. A correction never lifts what speaks against a wheel, and never
 * leaves later entries hanging in the air.
 *
 * @param correction - the wheel with all of its entries, and the one to take back.
 * @param actor - who corrects.
 * @returns why not; null where they may.
 * @source none: what keeps a record honest
 * @example correctionRefusal({ wheel: rackWheel, entries: [received], entryId: received.id }, { personId: 'p', role: 'lead', tasks: [] }).code // 'received-stays'
 */
export function correctionRefusal(
  { wheel, entries, entryId }: Correction,
  actor: Actor,
): StepRefusal | null {
  const entry = entries.find(({ id }) => id === entryId);
  if (entry === undefined) return refuse('no-such-entry');
  const lasting = lastingRefusal(entry.step, actor);
  if (lasting !== null) return lasting;
  if (!countingEntries(entries).counting.includes(entry)) return refuse('corrected-already');
  if (entry.personId !== actor.personId && !can(actor.role, 'wheel:edit'))
    return refuse('others-entry');
  const later = leftHanging(wheel, entries, entryId);
  return later === null
    ? null
    : refuse('later-entries', { names: { kind: later.step.kind, date: later.happenedOn } });
}

function lastingRefusal(step: WheelStep, { role }: Actor): StepRefusal | null {
  switch (step.kind) {
    case 'received':
      return refuse('received-stays');
    case 'correction':
      return refuse('correction-stays');
    case 'set aside':
      return refuse('return-instead');
    case 'inspected':
      return step.look === 'damaged' ? refuse('test-again') : null;
    case 'ring test':
      return step.ring === 'dull' ? refuse('test-again') : null;
    case 'scrapped':
      return can(role, 'wheel:return') ? null : refuse('lead-unscraps');
    default:
      return null;
  }
}
