import * as z from 'zod';

import { LIMITS, TEXT_LIMITS } from '../domain/limits';
import { ENTRY_KINDS, SIGNERS, type WheelStanding, type WheelStep } from '../domain/wheel-life';
import { LOOK_RESULTS, RING_RESULTS } from '../domain/wheels';
import { expectedVersion, id, isoDate, page, pageQuery, within } from './common';
import { setupSummary } from './setups';
import { wheel } from './wheels';

const words = z.string().trim().min(1).max(TEXT_LIMITS.note);
const diameterMm = within(LIMITS.wheelDiameterMm);

const received = z.strictObject({ kind: z.literal('received'), diameterMm });
const migratedMounting = z.strictObject({
  kind: z.literal('mounted'),
  grinderId: id.nullable(),
  quillId: id.nullable(),
});
const mounting = z.strictObject({ ...migratedMounting.shape, grinderId: id, quillId: id });

const recordable = [
  z.strictObject({
    kind: z.literal('inspected'),
    look: z.enum(LOOK_RESULTS),
    diameterMm: diameterMm.nullable(),
  }),
  z.strictObject({ kind: z.literal('ring test'), ring: z.enum(RING_RESULTS) }),
  z.strictObject({
    kind: z.literal('trial run'),
    minutes: within(LIMITS.trialRunMinutes),
    spindleRpm: within(LIMITS.spindleRpm),
  }),
  z.strictObject({
    kind: z.literal('dressed'),
    depthMm: within(LIMITS.dressDepthMm),
    passes: z.int().min(LIMITS.dressPasses.min).max(LIMITS.dressPasses.max),
  }),
  z.strictObject({
    kind: z.literal('used'),
    minutes: within(LIMITS.usedMinutes).nullable(),
    diameterMm: diameterMm.nullable(),
  }),
  z.strictObject({ kind: z.literal('taken off') }),
  z.strictObject({ kind: z.literal('set aside'), reason: words }),
  z.strictObject({ kind: z.literal('returned') }),
  z.strictObject({ kind: z.literal('scrapped'), reason: words }),
  z.strictObject({ kind: z.literal('countersigned'), entryId: id }),
  z.strictObject({ kind: z.literal('correction'), entryId: id, reason: words }),
] as const;

const wheelStep = z.discriminatedUnion('kind', [
  received,
  migratedMounting,
  ...recordable,
]) satisfies z.ZodType<WheelStep>;

/** A step as people record it; a wheel is received by adding it to the Rack. */
export const recordEntryRequest = z
  .strictObject({
    id,
    /** Of the wheel. Null, for setting aside alone: that waits for nobody. */
    version: expectedVersion.nullable(),
    happenedOn: isoDate,
    note: words.nullable(),
    step: z.discriminatedUnion('kind', [mounting, ...recordable]),
  })
  .superRefine(({ version, step }, context) => {
    if (version === null && step.kind !== 'set aside')
      context.addIssue({
        code: 'custom',
        path: ['version'],
        message: 'The version of the wheel that was looked at.',
      });
  });

const person = z.strictObject({ personId: id, name: z.string() });

export const wheelEntry = z.strictObject({
  id,
  number: z.int().min(1),
  /** The server's time. */
  at: z.string(),
  happenedOn: isoDate,
  person,
  needs: z.enum(SIGNERS).nullable(),
  note: z.string().nullable(),
  step: wheelStep,
  /** The correction after which it no longer counts. */
  correctedBy: id.nullable(),
  signedBy: person.nullable(),
});

/** Newest first. */
export const wheelEntryPage = page(wheelEntry);
export const wheelEntryQuery = z.strictObject(pageQuery);

const refusal = z.strictObject({
  /** Stable; the same as `rule` in the problem that recording it would be answered with. */
  code: z.string(),
  words: z.string(),
});

const stepChoice = z.strictObject({
  kind: z.enum(ENTRY_KINDS),
  /** Null where this person may record it now, as far as the wheel alone can tell. */
  refusal: refusal.nullable(),
  /** Whose signature it would wait for. */
  needs: z.enum(SIGNERS).nullable(),
});

const spindle = z.strictObject({
  grinderId: id,
  grinderName: z.string(),
  quillId: id,
  quillName: z.string(),
  /** Why the wheel does not go on it, or must not run on it at any step; null where it may. */
  refusal: refusal.nullable(),
  /** The lowest limit in force on this spindle, whole rpm, and what sets it. */
  limitRpm: z.number(),
  limitOf: z.string(),
  steps: z.array(
    z.strictObject({
      id,
      name: z.string(),
      /** The most this step can give. */
      rpm: z.number(),
      wheelSpeedMPerS: z.number(),
      allowed: z.boolean(),
    }),
  ),
  /** The fastest belt step that breaks no limit. */
  suggestedStepId: id.nullable(),
});

const entryRef = { entryId: id };

const wheelStanding = z.strictObject({
  onSpindle: z
    .strictObject({ ...entryRef, grinderId: id.nullable(), quillId: id.nullable() })
    .nullable(),
  lastTrialRun: z
    .strictObject({
      ...entryRef,
      happenedOn: isoDate,
      minutes: z.number(),
      spindleRpm: z.number(),
      wheelSpeedMPerS: z.number(),
    })
    .nullable(),
  longestTrialRunMinutes: z.number(),
  waiting: z.array(
    z.strictObject({
      ...entryRef,
      kind: z.enum(ENTRY_KINDS),
      personId: id,
      needs: z.enum(SIGNERS),
      /** Null where the person who asks may sign for it. */
      refusal: refusal.nullable(),
    }),
  ),
  latestOn: isoDate,
  dressings: z.int(),
  mountings: z.int(),
}) satisfies z.ZodType<Partial<WheelStanding>>;

/** All that a wheel's page shows, as the person who asks may act on it. */
export const wheelLife = z.strictObject({
  wheel,
  standing: wheelStanding,
  steps: z.array(stepChoice),
  spindles: z.array(spindle),
  setups: z.array(setupSummary),
  entries: wheelEntryPage,
});

/** The wheel after the entry, and the entry. */
export const recordedEntry = z.strictObject({ wheel, entry: wheelEntry });

export type RecordEntryRequest = z.infer<typeof recordEntryRequest>;
export type WheelEntryView = z.infer<typeof wheelEntry>;
export type WheelEntryPage = z.infer<typeof wheelEntryPage>;
export type WheelLife = z.infer<typeof wheelLife>;
export type RecordedEntry = z.infer<typeof recordedEntry>;
