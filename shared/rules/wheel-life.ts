import type {
  Due,
  EntryKind,
  OnSpindle,
  TrialRun,
  WaitingEntry,
  WheelEntry,
  WheelStanding,
} from '../domain/wheel-life';
import type { LookResult, RingResult, WheelRecord } from '../domain/wheels';
import { wheelSpeed } from './speed';

/** What the fold keeps while it walks through the entries. */
interface Life {
  receivedOn: string;
  latestOn: string;
  /** Since when look and ring have been wanted anew. */
  openSince: string;
  diameterMm: number;
  look: LookResult | null;
  ring: RingResult | null;
  outOfUse: 'set aside' | 'scrapped' | null;
  reason: string | null;
  onSpindle: OnSpindle | null;
  lastTrialRun: TrialRun | null;
  longestTrialRunMinutes: number;
  waiting: WaitingEntry[];
  dressings: number;
  mountings: number;
}

const newborn = (wheel: WheelRecord): Life => ({
  receivedOn: '',
  latestOn: '',
  openSince: '',
  diameterMm: wheel.diameterNewMm,
  look: null,
  ring: null,
  outOfUse: null,
  reason: null,
  onSpindle: null,
  lastTrialRun: null,
  longestTrialRunMinutes: 0,
  waiting: [],
  dressings: 0,
  mountings: 0,
});

/**
 * What a wheel's entries come to: state, diameter, what look and ring say, what it sits on, what is due and
 * whose signature is missing.
 *
 * What speaks for a wheel counts for one mounting: it lapses when the wheel is taken off or set aside. What
 * speaks against it counts at once, whoever wrote it, and stays until the wheel is looked at or rung anew.
 * An entry that waits for a signature is held against the wheel, never for it: a look or a ring test does not
 * count yet; work done on it counts as done (it is mounted, it is smaller) and keeps it from running until an
 * appointed person has signed. A corrected entry never counts, and a scrapped wheel whose scrapping is
 * corrected is set aside, for somebody to look at.
 *
 * @param wheel - what is written down of it, mm.
 * @param entries - all of its entries, in any order; they are taken by their numbers.
 * @returns the standing; mm, minutes, rpm and m/s, unrounded.
 * @source osha-1910-215-d1
 * @example foldWheelLife(rackWheel, [received]).state // 'on the rack'
 * @example foldWheelLife(rackWheel, [received]).due // { on: '2026-01-05', why: 'close look' }
 */
export function foldWheelLife(wheel: WheelRecord, entries: readonly WheelEntry[]): WheelStanding {
  const { counting, signed, all } = countingEntries(entries);
  const life = counting.reduce(
    (before, entry) => after(before, entry, { signed, all }),
    newborn(wheel),
  );
  return {
    ...placeOf(life),
    diameterNowMm: life.diameterMm,
    looked: life.look,
    rung: life.ring,
    unsigned: life.waiting.some(({ needs }) => needs === 'appointed'),
    lastTrialRun: life.lastTrialRun,
    longestTrialRunMinutes: life.longestTrialRunMinutes,
    waiting: life.waiting,
    due: dueOf(wheel, life),
    latestOn: life.latestOn,
    receivedOn: life.receivedOn,
    dressings: life.dressings,
    mountings: life.mountings,
  };
}

/** Where a wheel is, which decides what can happen to it next. */
export type WheelPlace = Pick<WheelStanding, 'state' | 'onSpindle' | 'setAsideReason'>;

function placeOf({ outOfUse, onSpindle, reason }: Life): WheelPlace {
  return {
    state: outOfUse ?? (onSpindle === null ? 'on the rack' : 'mounted'),
    onSpindle,
    setAsideReason: outOfUse === 'set aside' ? reason : null,
  };
}

/**
 * Where the wheel was before each of its entries that count.
 *
 * @param wheel - what is written down of it.
 * @param entries - all of its entries, in any order.
 * @returns the entries by their numbers, each with the place before it.
 * @source none: the order of things
 * @example placesBefore(rackWheel, [received, mounted])[1].before.state // 'on the rack'
 */
export function placesBefore(
  wheel: WheelRecord,
  entries: readonly WheelEntry[],
): { entry: WheelEntry; before: WheelPlace }[] {
  const { counting, signed, all } = countingEntries(entries);
  let life = newborn(wheel);
  return counting.map((entry) => {
    const before = placeOf(life);
    life = after(life, entry, { signed, all });
    return { entry, before };
  });
}

/**
 * The entries that no correction has taken back, by their numbers, and which of them are signed for.
 *
 * @param entries - all entries of one wheel.
 * @returns those that count, the ids of those signed, and all by id.
 */
export function countingEntries(entries: readonly WheelEntry[]) {
  const corrected = new Set(
    entries.flatMap(({ step }) => (step.kind === 'correction' ? [step.entryId] : [])),
  );
  const counting = entries
    .filter(({ id }) => !corrected.has(id))
    .sort((a, b) => a.number - b.number);
  const signed = new Set(
    counting.flatMap(({ step }) => (step.kind === 'countersigned' ? [step.entryId] : [])),
  );
  return { counting, signed, all: new Map(entries.map((entry) => [entry.id, entry])) };
}

interface Around {
  signed: ReadonlySet<string>;
  all: ReadonlyMap<string, WheelEntry>;
}

function after(before: Life, entry: WheelEntry, { signed, all }: Around): Life {
  const { id, step, happenedOn, needs } = entry;
  const lacks = needs !== null && !signed.has(id) ? needs : null;
  const life = {
    ...before,
    latestOn: happenedOn > before.latestOn ? happenedOn : before.latestOn,
  };
  switch (step.kind) {
    case 'received':
      return {
        ...life,
        receivedOn: happenedOn,
        openSince: happenedOn,
        diameterMm: step.diameterMm,
      };
    case 'inspected': {
      const diameterMm = step.diameterMm ?? life.diameterMm;
      if (lacks !== null && step.look === 'sound')
        return { ...replaceWaiting(life, entry, lacks), diameterMm };
      return { ...settle(life, 'inspected'), look: step.look, diameterMm };
    }
    case 'ring test':
      if (lacks !== null && step.ring !== 'dull') return replaceWaiting(life, entry, lacks);
      return { ...settle(life, 'ring test'), ring: step.ring };
    case 'mounted':
      return {
        ...wait({ ...life, waiting: [] }, entry, lacks),
        onSpindle: { entryId: id, grinderId: step.grinderId, quillId: step.quillId },
        lastTrialRun: null,
        longestTrialRunMinutes: 0,
        mountings: life.mountings + 1,
      };
    case 'trial run':
      if (lacks !== null) return replaceWaiting(life, entry, lacks);
      return {
        ...settle(life, 'trial run'),
        lastTrialRun: {
          entryId: id,
          happenedOn,
          minutes: step.minutes,
          spindleRpm: step.spindleRpm,
          wheelSpeedMPerS: wheelSpeed(life.diameterMm, step.spindleRpm).value ?? 0,
        },
        longestTrialRunMinutes: Math.max(life.longestTrialRunMinutes, step.minutes),
      };
    case 'dressed':
      return {
        ...wait(life, entry, lacks),
        diameterMm: diameterAfterDressing(life.diameterMm, step),
        dressings: life.dressings + 1,
      };
    case 'used':
      return { ...life, diameterMm: step.diameterMm ?? life.diameterMm };
    case 'taken off':
      return {
        ...lapsed(life, happenedOn),
        onSpindle: null,
        lastTrialRun: null,
        longestTrialRunMinutes: 0,
        waiting: [],
      };
    case 'set aside':
      return setAside(life, happenedOn, step.reason);
    case 'returned':
      return { ...life, outOfUse: null, reason: null };
    case 'scrapped':
      return { ...life, outOfUse: 'scrapped', reason: step.reason, waiting: [] };
    case 'countersigned':
      return life;
    case 'correction':
      return all.get(step.entryId)?.step.kind === 'scrapped'
        ? setAside(life, happenedOn, step.reason)
        : life;
  }
}

/**
 * The diameter that dressing leaves: each pass takes its depth off on both sides.
 *
 * @param diameterMm - before, mm.
 * @param dressing - depth of a pass on radius, mm, and how many.
 * @param dressing.depthMm - on radius, mm, over 0.
 * @param dressing.passes - 1 or more.
 * @returns mm, unrounded.
 * @source derived-geometry
 * @example diameterAfterDressing(25, { depthMm: 0.02, passes: 5 }) // 24.8
 */
export function diameterAfterDressing(
  diameterMm: number,
  { depthMm, passes }: { depthMm: number; passes: number },
): number {
  return diameterMm - 2 * depthMm * passes;
}

function wait(life: Life, entry: WheelEntry, needs: WaitingEntry['needs'] | null): Life {
  if (needs === null) return life;
  const { id, personId, step } = entry;
  return { ...life, waiting: [...life.waiting, { entryId: id, kind: step.kind, personId, needs }] };
}

/** Of looks, ring tests and trial runs only the newest is worth a signature. */
function settle(life: Life, kind: EntryKind): Life {
  return { ...life, waiting: life.waiting.filter((waiting) => waiting.kind !== kind) };
}

function replaceWaiting(life: Life, entry: WheelEntry, needs: WaitingEntry['needs']): Life {
  return wait(settle(life, entry.step.kind), entry, needs);
}

function lapsed(life: Life, on: string): Life {
  return {
    ...life,
    openSince: on,
    look: life.look === 'damaged' ? 'damaged' : null,
    ring: life.ring === 'dull' ? 'dull' : null,
    waiting: life.waiting.filter(({ needs }) => needs !== 'skilled'),
  };
}

function setAside(life: Life, on: string, reason: string): Life {
  if (life.outOfUse !== null) return life;
  return { ...lapsed(life, on), outOfUse: 'set aside', reason };
}

/** The earliest of what is wanted; nothing of a wheel that is out of use. */
function dueOf({ mounted, expiresOn }: WheelRecord, life: Life): Due | null {
  if (life.outOfUse !== null) return null;
  const wanted: Due[] = [];
  if (life.look === null) wanted.push({ on: life.openSince, why: 'close look' });
  if (life.ring === null && mounted === null) wanted.push({ on: life.openSince, why: 'ring test' });
  if (expiresOn !== null) wanted.push({ on: expiresOn, why: 'expiry' });
  return wanted.reduce<Due | null>(
    (first, due) => (first === null || due.on < first.on ? due : first),
    null,
  );
}
