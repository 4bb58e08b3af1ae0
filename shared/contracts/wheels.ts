import * as z from 'zod';

import { LIMITS, TEXT_LIMITS } from '../domain/limits';
import {
  LOOK_RESULTS,
  MARKING_PLACES,
  RING_RESULTS,
  WHEEL_STATES,
  type WheelData,
} from '../domain/wheels';
import { expectedVersion, id, isoDate, page, pageQuery, stored, within } from './common';
import { typedTexts } from './machines';

export const wheelData = z.strictObject({
  marking: z.string().trim().min(1).max(TEXT_LIMITS.marking).nullable(),
  diameterNewMm: within(LIMITS.wheelDiameterMm),
  diameterNowMm: within(LIMITS.wheelDiameterMm),
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
  looked: z.enum(LOOK_RESULTS).nullable(),
  rung: z.enum(RING_RESULTS).nullable(),
  expiresOn: isoDate.nullable(),
  state: z.enum(WHEEL_STATES),
  setAsideReason: z.string().trim().min(1).max(TEXT_LIMITS.note).nullable(),
}) satisfies z.ZodType<WheelData>;

const coherent = (wheel: WheelData, context: z.RefinementCtx) => {
  if (wheel.diameterNowMm > wheel.diameterNewMm)
    context.addIssue({
      code: 'custom',
      path: ['diameterNowMm'],
      message: 'A wheel is never larger than when it was new.',
    });
  if (wheel.holeMm >= wheel.diameterNowMm)
    context.addIssue({
      code: 'custom',
      path: ['holeMm'],
      message: 'The hole is smaller than the wheel.',
    });
  if ((wheel.state === 'set aside') !== (wheel.setAsideReason !== null))
    context.addIssue({
      code: 'custom',
      path: ['setAsideReason'],
      message: 'A wheel is set aside for a reason, and only then.',
    });
};

const coherentWheelData = wheelData.superRefine(coherent);

const tag = z.string().trim().min(1).max(TEXT_LIMITS.tag);
const body = { tag, data: coherentWheelData, typed: typedTexts };

export const createWheelRequest = z.strictObject({ id, ...body });
export const updateWheelRequest = z.strictObject({ version: expectedVersion, ...body });
export const wheel = z.strictObject({ ...stored, tag, data: wheelData, typed: typedTexts });
export const wheelPage = page(wheel);
export const wheelQuery = z.strictObject({
  ...pageQuery,
  /** Part of a tag or of a marking. */
  search: z.string().trim().max(TEXT_LIMITS.marking).optional(),
});

export type Wheel = z.infer<typeof wheel>;
export type CreateWheelRequest = z.infer<typeof createWheelRequest>;
export type UpdateWheelRequest = z.infer<typeof updateWheelRequest>;
