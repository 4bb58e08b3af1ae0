import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  date,
  foreignKey,
  pgTable,
  primaryKey,
  text,
  uniqueIndex,
} from 'drizzle-orm/pg-core';

import { LIMITS, TEXT_LIMITS } from '@/shared/domain/limits';
import { LOOK_RESULTS, MARKING_PLACES, RING_RESULTS, WHEEL_STATES } from '@/shared/domain/wheels';

import { inRange, itemOfShop, measure, oneOf, shopPolicy, textUpTo } from './columns';
import { shops } from './people';

export const wheels = pgTable(
  'wheels',
  {
    ...itemOfShop(),
    tag: text('tag').notNull(),
    /** A column, for under row security an index serves comparisons of columns alone. */
    tagKey: text('tag_key')
      .notNull()
      .generatedAlwaysAs(sql`lower(tag)`),
    marking: text('marking'),
    diameterNewMm: measure('diameter_new_mm').notNull(),
    diameterNowMm: measure('diameter_now_mm').notNull(),
    widthMm: measure('width_mm').notNull(),
    holeMm: measure('hole_mm').notNull(),
    markedRpm: measure('marked_rpm'),
    markedSpeedMPerS: measure('marked_speed_m_per_s'),
    markingReadOn: text('marking_read_on', { enum: MARKING_PLACES }),
    mandrelDiameterMm: measure('mandrel_diameter_mm'),
    mandrelOverhangMm: measure('mandrel_overhang_mm'),
    mandrelThreaded: boolean('mandrel_threaded'),
    makerMaximumRpm: measure('maker_maximum_rpm'),
    looked: text('looked', { enum: LOOK_RESULTS }),
    rung: text('rung', { enum: RING_RESULTS }),
    expiresOn: date('expires_on', { mode: 'string' }),
    state: text('state', { enum: WHEEL_STATES }).notNull(),
    setAsideReason: text('set_aside_reason'),
  },
  (t) => [
    primaryKey({ name: 'wheels_pkey', columns: [t.shopId, t.id] }),
    uniqueIndex('wheels_tag').on(t.shopId, t.tagKey),
    foreignKey({ name: 'wheels_shop', columns: [t.shopId], foreignColumns: [shops.id] }),
    check('wheels_tag_length', textUpTo(t.tag, TEXT_LIMITS.tag)),
    check('wheels_marking_length', textUpTo(t.marking, TEXT_LIMITS.marking)),
    check('wheels_diameter_new_mm', inRange(t.diameterNewMm, LIMITS.wheelDiameterMm)),
    check('wheels_diameter_now_mm', inRange(t.diameterNowMm, LIMITS.wheelDiameterMm)),
    check('wheels_only_wear', sql`${t.diameterNowMm} <= ${t.diameterNewMm}`),
    check('wheels_width_mm', inRange(t.widthMm, LIMITS.wheelWidthMm)),
    check('wheels_hole_mm', inRange(t.holeMm, LIMITS.wheelHoleMm)),
    check('wheels_hole_inside', sql`${t.holeMm} < ${t.diameterNowMm}`),
    check('wheels_marked_rpm', inRange(t.markedRpm, LIMITS.wheelRpm)),
    check('wheels_marked_speed_m_per_s', inRange(t.markedSpeedMPerS, LIMITS.wheelSpeedMPerS)),
    check('wheels_marking_read_on', oneOf(t.markingReadOn, MARKING_PLACES)),
    check('wheels_mandrel_diameter_mm', inRange(t.mandrelDiameterMm, LIMITS.quillDiameterMm)),
    check('wheels_mandrel_overhang_mm', inRange(t.mandrelOverhangMm, LIMITS.quillLengthMm)),
    check('wheels_maker_maximum_rpm', inRange(t.makerMaximumRpm, LIMITS.wheelRpm)),
    check(
      'wheels_mandrel_whole',
      sql`num_nulls(${t.mandrelDiameterMm}, ${t.mandrelOverhangMm}, ${t.mandrelThreaded}) in (0, 3) and (${t.makerMaximumRpm} is null or ${t.mandrelDiameterMm} is not null)`,
    ),
    check('wheels_looked', oneOf(t.looked, LOOK_RESULTS)),
    check('wheels_rung', oneOf(t.rung, RING_RESULTS)),
    check('wheels_state', oneOf(t.state, WHEEL_STATES)),
    check('wheels_reason_length', textUpTo(t.setAsideReason, TEXT_LIMITS.note)),
    check(
      'wheels_set_aside_reason',
      sql`(${t.state} = 'set aside') = (${t.setAsideReason} is not null)`,
    ),
    shopPolicy('wheels'),
  ],
);
