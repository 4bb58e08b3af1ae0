import * as z from 'zod';

import { LIMITS, TEXT_LIMITS } from '../domain/limits';
import { DUE_REASONS } from '../domain/wheel-life';
import {
  ABRASIVES,
  LOOK_RESULTS,
  MARKING_PLACES,
  MOUNTED_SHAPE,
  RING_RESULTS,
  WHEEL_SHAPES,
  WHEEL_STATES,
  type RackWheel,
  type WheelCondition,
  type WheelRecord,
} from '../domain/wheels';
import { expectedVersion, id, isoDate, page, pageQuery, stored, within } from './common';
import { typedTexts } from './machines';

const words = (longest: number) => z.string().trim().min(1).max(longest);

export const wheelRecord = z.strictObject({
  marking: words(TEXT_LIMITS.marking).nullable(),
  shape: z.enum(WHEEL_SHAPES).nullable(),
  diameterNewMm: within(LIMITS.wheelDiameterMm),
  widthMm: within(LIMITS.wheelWidthMm),
  holeMm: within(LIMITS.wheelHoleMm),
  markedRpm: within(LIMITS.wheelRpm).nullable(),
  markedSpeedMPerS: within(LIMITS.wheelSpeedMPerS).nullable(),
  markingReadOn: z.enum(MARKING_PLACES).nullable(),
  mounted: z
    .strictObject({
      mandrelDiameterMm: within(LIMITS.quillDiameterMm),
      overhangMm: within(LIMITS.quillLengthMm),
      threaded: z.boolean(),
      makerMaximumRpm: within(LIMITS.wheelRpm).nullable(),
    })
    .nullable(),
  smallestUsableMm: within(LIMITS.wheelDiameterMm).nullable(),
  madeOn: isoDate.nullable(),
  expiresOn: isoDate.nullable(),
  place: words(TEXT_LIMITS.place).nullable(),
  notes: words(TEXT_LIMITS.note).nullable(),
}) satisfies z.ZodType<WheelRecord>;

const wheelCondition = {
  state: z.enum(WHEEL_STATES),
  diameterNowMm: within(LIMITS.wheelDiameterMm),
  looked: z.enum(LOOK_RESULTS).nullable(),
  rung: z.enum(RING_RESULTS).nullable(),
  setAsideReason: words(TEXT_LIMITS.note).nullable(),
  unsigned: z.boolean(),
} satisfies Record<keyof WheelCondition, z.ZodType>;

const rackWheel = z.strictObject({
  ...wheelRecord.shape,
  ...wheelCondition,
}) satisfies z.ZodType<RackWheel>;

const faultOf = (path: string[], message: string) => ({ code: 'custom' as const, path, message });

const coherent = (wheel: WheelRecord, context: z.RefinementCtx) => {
  const { diameterNewMm, holeMm, smallestUsableMm, madeOn, expiresOn, shape, mounted } = wheel;
  if (holeMm >= diameterNewMm)
    context.addIssue(faultOf(['holeMm'], 'The hole is smaller than the wheel.'));
  if (smallestUsableMm !== null && (smallestUsableMm > diameterNewMm || smallestUsableMm <= holeMm))
    context.addIssue(
      faultOf(['smallestUsableMm'], 'Between the hole and the diameter when the wheel was new.'),
    );
  if (madeOn !== null && expiresOn !== null && madeOn > expiresOn)
    context.addIssue(faultOf(['expiresOn'], 'A wheel expires after it was made.'));
  if (shape !== null && (shape === MOUNTED_SHAPE) !== (mounted !== null))
    context.addIssue(
      faultOf(['shape'], 'A mounted wheel, and no other, has a mandrel of its own.'),
    );
};

/** How the wheel came: what of it is known then becomes the first entries of its life. */
const receipt = z.strictObject({
  /** Null is today. */
  on: isoDate.nullable(),
  /** Null is the diameter when new. */
  diameterMm: within(LIMITS.wheelDiameterMm).nullable(),
  looked: z.enum(LOOK_RESULTS).nullable(),
  rung: z.enum(RING_RESULTS).nullable(),
});

const tag = words(TEXT_LIMITS.tag);
const body = { tag, data: wheelRecord.superRefine(coherent), typed: typedTexts };

export const createWheelRequest = z
  .strictObject({ id, ...body, received: receipt })
  .superRefine(({ data, received: { diameterMm } }, context) => {
    if (diameterMm === null) return;
    const path = ['received', 'diameterMm'];
    if (diameterMm > data.diameterNewMm)
      context.addIssue(faultOf(path, 'A wheel is never larger than when it was new.'));
    if (diameterMm <= data.holeMm)
      context.addIssue(faultOf(path, 'The wheel is larger than its hole.'));
  });
export const updateWheelRequest = z.strictObject({ version: expectedVersion, ...body });

export const wheel = z.strictObject({
  ...stored,
  tag,
  data: rackWheel,
  typed: typedTexts,
  life: z.strictObject({
    receivedOn: isoDate,
    /** Null for both where an older record does not say on which spindle. */
    onSpindle: z.strictObject({ grinderId: id.nullable(), quillId: id.nullable() }).nullable(),
    due: z.strictObject({ on: isoDate, why: z.enum(DUE_REASONS) }).nullable(),
    /** The lowest limit that the wheel itself sets, whole rpm; 0 where nothing is marked. */
    limitRpm: z.number().min(0),
    /** Whether it may be mounted or run as it is, up to the date of its expiry. */
    usable: z.boolean(),
  }),
});
export const wheelPage = page(wheel);

const WHEEL_SORTS = ['tag', 'diameter', 'due', 'latest'] as const;

const number = (range: { min: number; max: number }) =>
  z.coerce.number().min(range.min).max(range.max).optional();

export const wheelQuery = z.strictObject({
  ...pageQuery,
  /** Part of a tag or of a marking. */
  search: z.string().trim().max(TEXT_LIMITS.marking).optional(),
  /** Those that may be mounted or run today. */
  usable: z.literal('yes').optional(),
  state: z.enum(WHEEL_STATES).optional(),
  abrasive: z.enum(ABRASIVES).optional(),
  grain: z.coerce.number().int().min(1).max(9999).optional(),
  diameterFromMm: number(LIMITS.wheelDiameterMm),
  diameterToMm: number(LIMITS.wheelDiameterMm),
  limitFromRpm: number(LIMITS.wheelRpm),
  /** Due on this day or earlier. */
  dueBy: isoDate.optional(),
  /** Where it hangs, in whatever case. */
  place: words(TEXT_LIMITS.place).optional(),
  sort: z.enum(WHEEL_SORTS).default('tag'),
  /** `latest` starts with the newest, all others with the least; 'down' turns that round. */
  order: z.enum(['up', 'down']).default('up'),
});

/** Where the shop's wheels hang: what the filter by place offers. */
export const wheelPlaces = z.strictObject({ items: z.array(z.string()) });

export type Wheel = z.infer<typeof wheel>;
export type WheelQuery = z.infer<typeof wheelQuery>;
export type CreateWheelRequest = z.infer<typeof createWheelRequest>;
export type UpdateWheelRequest = z.infer<typeof updateWheelRequest>;
