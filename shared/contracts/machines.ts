import * as z from 'zod';

import { LIMITS, TEXT_LIMITS } from '../domain/limits';
import {
  COMPOUND_ZEROS,
  DIAL_READINGS,
  GUARDS,
  QUILL_MATERIALS,
  ROTATIONS,
  SPINDLE_NOSES,
  THREAD_HANDS,
  type GrinderData,
  type LatheData,
  type QuillData,
} from '../domain/machines';
import { expectedVersion, id, isoDate, name, stored, within } from './common';

/** Distinct values, smallest first. */
const ladder = (item: z.ZodNumber) =>
  z
    .array(item)
    .min(1)
    .max(60)
    .transform((values) => [...new Set(values)].sort((a, b) => a - b));

const latheFields = {
  spindleSpeedsRpm: ladder(within(LIMITS.spindleSpeedRpm)),
  feedsMmPerRev: ladder(within(LIMITS.feedMmPerRev)),
  crossSlideDivisionMm: within(LIMITS.dialDivisionMm),
  crossSlideReads: z.enum(DIAL_READINGS),
  crossSlideDivisionsPerTurn: z
    .int()
    .min(LIMITS.dialDivisions.min)
    .max(LIMITS.dialDivisions.max)
    .nullable(),
  compoundZero: z.enum(COMPOUND_ZEROS).nullable(),
  compoundDivisionMm: within(LIMITS.dialDivisionMm).nullable(),
  compoundTravelMm: within(LIMITS.compoundTravelMm).nullable(),
  compoundMmPerTurn: within(LIMITS.slideMmPerTurn).nullable(),
  spindleNose: z.enum(SPINDLE_NOSES).nullable(),
};

const latheData = z.strictObject(latheFields) satisfies z.ZodType<LatheData>;

/** No two with the same id, or the same name in whatever case. */
const distinct = (items: readonly { id: string; name: string }[], context: z.RefinementCtx) => {
  for (const key of ['id', 'name'] as const) {
    const seen = new Set<string>();
    items.forEach((item, index) => {
      const value = item[key].toLowerCase();
      if (seen.has(value))
        context.addIssue({
          code: 'custom',
          path: [index, key],
          message: `This ${key} is used twice.`,
        });
      seen.add(value);
    });
  }
};

const measuredSpeed = z.strictObject({
  rpm: within(LIMITS.spindleRpm),
  measuredOn: isoDate,
  instrument: name,
});

const beltStep = z.strictObject({
  id,
  name: z.string().trim().min(1).max(10),
  drivingPulleyMm: within(LIMITS.pulleyMm),
  drivenPulleyMm: within(LIMITS.pulleyMm),
  beltThicknessMm: within(LIMITS.beltThicknessMm),
  measured: measuredSpeed.nullable(),
});

const grinderFields = {
  motorNoLoadRpm: within(LIMITS.motorRpm),
  motorPowerW: within(LIMITS.motorPowerW),
  spindleMaximumRpm: within(LIMITS.spindleRpm).nullable(),
  beltSteps: z.array(beltStep).min(1).max(20).superRefine(distinct),
  guard: z.enum(GUARDS),
  postStiffnessNPerMm: within(LIMITS.stiffnessNPerMm).nullable(),
  wheelRotation: z.enum(ROTATIONS).nullable(),
  /** Every piece, smallest first. */
  shimsMm: z
    .array(within(LIMITS.shimMm))
    .max(60)
    .transform((pieces) => [...pieces].sort((a, b) => a - b)),
};

const grinderData = z.strictObject(grinderFields) satisfies z.ZodType<GrinderData>;

const quillFields = {
  segments: z
    .array(
      z.strictObject({
        lengthMm: within(LIMITS.quillLengthMm),
        diameterMm: within(LIMITS.quillDiameterMm),
      }),
    )
    .min(1)
    .max(8),
  material: z.enum(QUILL_MATERIALS),
  markedMaximumRpm: within(LIMITS.spindleRpm).nullable(),
  seatDiameterMm: within(LIMITS.quillDiameterMm),
  threadHand: z.enum(THREAD_HANDS).nullable(),
  measuredStiffnessNPerMm: within(LIMITS.stiffnessNPerMm).nullable(),
  measuredFrequencyHz: within(LIMITS.frequencyHz).nullable(),
};

const quillData = z.strictObject(quillFields) satisfies z.ZodType<QuillData>;

/** What was typed for a field, by its path, so that reopening shows it as it was. */
export const typedTexts = z.record(z.string().max(80), z.string().max(TEXT_LIMITS.typed));

const latheBody = { name, data: latheData, typed: typedTexts };
const grinderBody = {
  name,
  data: grinderData,
  typed: typedTexts,
  /** All quills and arbors of the grinder; one left out is retired. */
  quills: z
    .array(z.strictObject({ id, name, data: quillData }))
    .max(30)
    .superRefine(distinct),
};

export const createLatheRequest = z.strictObject({ id, ...latheBody });
export const updateLatheRequest = z.strictObject({ version: expectedVersion, ...latheBody });
export const lathe = z.strictObject({ ...stored, ...latheBody });
export const latheList = z.strictObject({ items: z.array(lathe) });

export const createGrinderRequest = z.strictObject({ id, ...grinderBody });
export const updateGrinderRequest = z.strictObject({ version: expectedVersion, ...grinderBody });
export const grinder = z.strictObject({ ...stored, ...grinderBody });
export const grinderList = z.strictObject({ items: z.array(grinder) });

export type Lathe = z.infer<typeof lathe>;
export type CreateLatheRequest = z.infer<typeof createLatheRequest>;
export type UpdateLatheRequest = z.infer<typeof updateLatheRequest>;
export type Grinder = z.infer<typeof grinder>;
export type CreateGrinderRequest = z.infer<typeof createGrinderRequest>;
export type UpdateGrinderRequest = z.infer<typeof updateGrinderRequest>;
