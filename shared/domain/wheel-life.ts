import type { LookResult, RingResult, WheelCondition } from './wheels';

/** The steps of a wheel's life. Entries are never changed: a correction is an entry of its own. */
export const ENTRY_KINDS = [
  'received',
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
  'countersigned',
  'correction',
] as const;
export type EntryKind = (typeof ENTRY_KINDS)[number];

/** What happened in one step. */
export type WheelStep =
  | { kind: 'received'; diameterMm: number }
  /** A close look; the diameter where it was measured. */
  | { kind: 'inspected'; look: LookResult; diameterMm: number | null }
  | { kind: 'ring test'; ring: RingResult }
  /** Null where an older record does not say on which spindle. */
  | { kind: 'mounted'; grinderId: string | null; quillId: string | null }
  | { kind: 'trial run'; minutes: number; spindleRpm: number }
  /** Depth on radius of each pass. */
  | { kind: 'dressed'; depthMm: number; passes: number }
  | { kind: 'used'; minutes: number | null; diameterMm: number | null }
  | { kind: 'taken off' }
  | { kind: 'set aside'; reason: string }
  | { kind: 'returned' }
  | { kind: 'scrapped'; reason: string }
  | { kind: 'countersigned'; entryId: string }
  /** The entry it points at no longer counts. */
  | { kind: 'correction'; entryId: string; reason: string };

/** Whose signature an entry waits for: a lead's or machinist's, or an appointed person's. */
export const SIGNERS = ['skilled', 'appointed'] as const;
export type Signer = (typeof SIGNERS)[number];

export interface WheelEntry {
  id: string;
  /** 1 is the first of the wheel; the order in which the server took them. */
  number: number;
  personId: string;
  /** ISO date. */
  happenedOn: string;
  /** Set when it was written, from what the person was then. */
  needs: Signer | null;
  step: WheelStep;
}

/** The spindle that a wheel sits on. */
export interface OnSpindle {
  entryId: string;
  grinderId: string | null;
  quillId: string | null;
}

export interface TrialRun {
  entryId: string;
  happenedOn: string;
  minutes: number;
  spindleRpm: number;
  wheelSpeedMPerS: number;
}

export interface WaitingEntry {
  entryId: string;
  kind: EntryKind;
  personId: string;
  needs: Signer;
}

export const DUE_REASONS = ['close look', 'ring test', 'expiry'] as const;
export type DueReason = (typeof DUE_REASONS)[number];

export interface Due {
  /** ISO date; one in the past is overdue. */
  on: string;
  why: DueReason;
}

/** What the entries come to. */
export interface WheelStanding extends WheelCondition {
  onSpindle: OnSpindle | null;
  /** The last one that counts since the wheel was mounted, and the longest. */
  lastTrialRun: TrialRun | null;
  longestTrialRunMinutes: number;
  waiting: WaitingEntry[];
  due: Due | null;
  /** ISO date of the latest entry that counts. */
  latestOn: string;
  receivedOn: string;
  /** Since it was received. */
  dressings: number;
  mountings: number;
}
