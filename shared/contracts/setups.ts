import * as z from 'zod';

import { ROTATIONS } from '../domain/machines';
import { LIMITS, TEXT_LIMITS } from '../domain/limits';
import { MATERIALS } from '../domain/materials';
import {
  HOLDINGS,
  OPERATIONS,
  PASS_STROKES,
  PRELOADS,
  SETUP_STATES,
  SHOULDERS,
  SIDES,
  TAPER_GIVEN,
  TAPER_METHODS,
  VERDICTS,
  type SetupInputs,
} from '../domain/setups';
import { LOOK_RESULTS, RING_RESULTS } from '../domain/wheels';
import { expectedVersion, id, name, page, pageQuery, stored, within } from './common';
import { typedTexts } from './machines';
import { wheelRecord } from './wheels';

const maybe = (range: { min: number; max: number }) => within(range).nullable();
const whole = (range: { min: number; max: number }) =>
  z.int().min(range.min).max(range.max).nullable();

const setupInputs = z.strictObject({
  operation: z.enum(OPERATIONS),
  work: z.strictObject({
    material: z.enum(MATERIALS).nullable(),
    diameterMm: maybe(LIMITS.diameterMm),
    lengthMm: maybe(LIMITS.lengthMm),
    stockOnDiameterMm: maybe(LIMITS.stockOnDiameterMm),
    toleranceMm: maybe(LIMITS.toleranceMm),
    runOutMm: maybe(LIMITS.runOutMm),
    taperSide: z.enum(SIDES),
    taperMethod: z.enum(TAPER_METHODS),
    taperGiven: z.enum(TAPER_GIVEN),
    includedAngleDeg: maybe(LIMITS.includedAngleDeg),
    smallDiameterMm: maybe(LIMITS.smallDiameterMm),
    taperPerLength: maybe(LIMITS.taperPerLength),
    shoulders: z.enum(SHOULDERS),
    warmerK: maybe(LIMITS.warmerK),
    headEndMm: maybe(LIMITS.diameterMm),
    tailEndMm: maybe(LIMITS.diameterMm),
    endsApartMm: maybe(LIMITS.lengthMm),
    interrupted: z.boolean(),
    holding: z.enum(HOLDINGS).nullable(),
    unsupportedLengthMm: maybe(LIMITS.unsupportedLengthMm),
    shaftDiameterMm: maybe(LIMITS.diameterMm),
    throughBore: z.boolean().nullable(),
    clearDepthMm: maybe(LIMITS.clearDepthMm),
    jawCount: whole(LIMITS.jawCount),
    jawBoreMm: maybe(LIMITS.diameterMm),
    padWidthMm: maybe(LIMITS.padWidthMm),
    lastGroundDiameterMm: maybe(LIMITS.diameterMm),
    preload: z.enum(PRELOADS).nullable(),
    nearDistanceMm: maybe(LIMITS.distanceMm),
    nearRunOutMm: maybe(LIMITS.runOutMm),
    nearHighSpotDeg: maybe(LIMITS.highSpotDeg),
    farDistanceMm: maybe(LIMITS.distanceMm),
    farRunOutMm: maybe(LIMITS.runOutMm),
    farHighSpotDeg: maybe(LIMITS.highSpotDeg),
    bellMouthMm: maybe(LIMITS.bellMouthMm),
  }),
  machine: z.strictObject({
    latheId: id.nullable(),
    grinderId: id.nullable(),
    quillId: id.nullable(),
    beltStepId: id.nullable(),
    shieldFitted: z.boolean(),
    belowCentreMm: maybe(LIMITS.belowCentreMm),
    workRotation: z.enum(ROTATIONS).nullable(),
  }),
  wheel: z.strictObject({
    wheelId: id.nullable(),
    typed: z
      .strictObject({
        marking: wheelRecord.shape.marking,
        diameterNewMm: maybe(LIMITS.wheelDiameterMm),
        diameterNowMm: maybe(LIMITS.wheelDiameterMm),
        widthMm: maybe(LIMITS.wheelWidthMm),
        holeMm: maybe(LIMITS.wheelHoleMm),
        markedRpm: wheelRecord.shape.markedRpm,
        markedSpeedMPerS: wheelRecord.shape.markedSpeedMPerS,
        markingReadOn: wheelRecord.shape.markingReadOn,
        looked: z.enum(LOOK_RESULTS).nullable(),
        rung: z.enum(RING_RESULTS).nullable(),
      })
      .nullable(),
  }),
  cut: z.strictObject({
    latheRpm: maybe(LIMITS.spindleSpeedRpm),
    roughInfeedMm: maybe(LIMITS.infeedMm),
    finishInfeedMm: maybe(LIMITS.infeedMm),
    roughTraverseMmPerRev: maybe(LIMITS.traverseMmPerRev),
    finishTraverseMmPerRev: maybe(LIMITS.traverseMmPerRev),
    finishStockMm: maybe(LIMITS.finishStockMm),
    sparkOutPasses: whole(LIMITS.sparkOutPasses),
    overrunMm: maybe(LIMITS.overrunMm),
    softnessPerMm: maybe(LIMITS.softnessPerMm),
    strokes: z.enum(PASS_STROKES).nullable(),
  }),
  dress: z.strictObject({
    tipRadiusMm: maybe(LIMITS.tipRadiusMm),
    diamondCarats: maybe(LIMITS.diamondCarats),
    roughDepthMm: maybe(LIMITS.dressDepthMm),
    roughPasses: whole(LIMITS.dressPasses),
    roughOverlap: maybe(LIMITS.dressOverlap),
    finishDepthMm: maybe(LIMITS.dressDepthMm),
    finishPasses: whole(LIMITS.dressPasses),
    finishOverlap: maybe(LIMITS.dressOverlap),
  }),
}) satisfies z.ZodType<SetupInputs>;

const body = {
  name,
  inputs: setupInputs,
  /** Texts as typed, by the path of their field; also those that could not be read. */
  typed: typedTexts,
};

export const createSetupRequest = z.strictObject({ id, ...body });
export const updateSetupRequest = z.strictObject({ version: expectedVersion, ...body });

/** The computed plan; its shape is Plan of shared/rules, stored whole with the rules' version. */
const planRecord = z.looseObject({ rulesVersion: z.string(), verdict: z.enum(VERDICTS) });

export const setup = z.strictObject({
  ...stored,
  name: z.string(),
  state: z.enum(SETUP_STATES),
  inputs: setupInputs,
  typed: typedTexts,
  plan: planRecord,
  updatedBy: z.strictObject({ personId: id, name: z.string() }),
});

export const setupSummary = z.strictObject({
  id,
  name: z.string(),
  operation: z.enum(OPERATIONS),
  state: z.enum(SETUP_STATES),
  verdict: z.enum(VERDICTS),
  /** How many needs (incomplete), or findings of the verdict's level. */
  count: z.int(),
  version: z.int(),
  updatedAt: z.string(),
  updatedByName: z.string(),
});

export const setupPage = page(setupSummary);
export const setupQuery = z.strictObject({
  ...pageQuery,
  search: z.string().trim().max(TEXT_LIMITS.name).optional(),
  operation: z.enum(OPERATIONS).optional(),
  state: z.enum(SETUP_STATES).optional(),
  wheelId: id.optional(),
});

/** A copy under a new id and name, with the inputs as they stand. */
export const duplicateSetupRequest = z.strictObject({ id, name });

export const retireSetupRequest = z.strictObject({ version: expectedVersion });

export type Setup = z.infer<typeof setup>;
export type SetupSummary = z.infer<typeof setupSummary>;
export type SetupPage = z.infer<typeof setupPage>;
export type SetupQuery = z.input<typeof setupQuery>;
export type CreateSetupRequest = z.infer<typeof createSetupRequest>;
export type UpdateSetupRequest = z.infer<typeof updateSetupRequest>;
export type DuplicateSetupRequest = z.infer<typeof duplicateSetupRequest>;
