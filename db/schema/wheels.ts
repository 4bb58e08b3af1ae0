import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  date,
  foreignKey,
  index,
  integer,
  pgTable,
  primaryKey,
  smallint,
  text,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';

import { LIMITS, TEXT_LIMITS } from '@/shared/domain/limits';
import { DUE_REASONS } from '@/shared/domain/wheel-life';
import {
  ABRASIVES,
  LOOK_RESULTS,
  MARKING_PLACES,
  RING_RESULTS,
  WHEEL_SHAPES,
  WHEEL_STATES,
} from '@/shared/domain/wheels';

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
    /** What a search looks through: tag and marking, each on a line of its own. */
    searchText: text('search_text')
      .notNull()
      .generatedAlwaysAs(sql`lower(tag) || E'\\n' || lower(coalesce(marking, ''))`),
    shape: text('shape', { enum: WHEEL_SHAPES }),
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
    smallestUsableMm: measure('smallest_usable_mm'),
    madeOn: date('made_on', { mode: 'string' }),
    expiresOn: date('expires_on', { mode: 'string' }),
    place: text('place'),
    placeKey: text('place_key').generatedAlwaysAs(sql`lower(place)`),
    notes: text('notes'),
    // From here on what the wheel's entries come to, kept here to be listed by.
    state: text('state', { enum: WHEEL_STATES }).notNull(),
    setAsideReason: text('set_aside_reason'),
    unsigned: boolean('unsigned').notNull().default(false),
    receivedOn: date('received_on', { mode: 'string' }).notNull().defaultNow(),
    isOnSpindle: boolean('is_on_spindle').notNull().default(false),
    onGrinderId: uuid('on_grinder_id'),
    onQuillId: uuid('on_quill_id'),
    dueOn: date('due_on', { mode: 'string' }),
    dueWhy: text('due_why', { enum: DUE_REASONS }),
    /** To sort by: what is due on no day comes last. */
    dueKey: date('due_key', { mode: 'string' })
      .notNull()
      .generatedAlwaysAs(sql`coalesce(due_on, 'infinity'::date)`),
    // Worked out from the above by the rules of that version.
    factsVersion: integer('facts_version').notNull().default(0),
    abrasive: text('abrasive', { enum: ABRASIVES }),
    grain: smallint('grain'),
    grade: text('grade'),
    bond: text('bond'),
    limitRpm: measure('limit_rpm').notNull().default(0),
    usable: boolean('usable').notNull().default(false),
    /** The last day on which it is usable; before all days where it is not. */
    usableUntil: date('usable_until', { mode: 'string' })
      .notNull()
      .generatedAlwaysAs(
        sql`case when usable then coalesce(expires_on, 'infinity'::date) else '-infinity'::date end`,
      ),
  },
  (t) => [
    primaryKey({ name: 'wheels_pkey', columns: [t.shopId, t.id] }),
    uniqueIndex('wheels_tag').on(t.shopId, t.tagKey),
    // Each order of the list, and each filter by which few may be left.
    index('wheels_diameter').on(t.shopId, t.diameterNowMm, t.id),
    index('wheels_due').on(t.shopId, t.dueKey, t.id),
    index('wheels_latest').on(t.shopId, t.updatedAt, t.id),
    index('wheels_state').on(t.shopId, t.state, t.tagKey),
    index('wheels_abrasive').on(t.shopId, t.abrasive, t.grain),
    index('wheels_grain').on(t.shopId, t.grain),
    index('wheels_limit').on(t.shopId, t.limitRpm),
    index('wheels_usable').on(t.shopId, t.usableUntil),
    index('wheels_place').on(t.shopId, t.placeKey),
    index('wheels_facts_version').on(t.shopId, t.factsVersion),
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
    check('wheels_shape', oneOf(t.shape, WHEEL_SHAPES)),
    check(
      'wheels_smallest_usable_mm',
      sql`${t.smallestUsableMm} > ${t.holeMm} and ${t.smallestUsableMm} <= ${t.diameterNewMm}`,
    ),
    check('wheels_place_length', textUpTo(t.place, TEXT_LIMITS.place)),
    check('wheels_notes_length', textUpTo(t.notes, TEXT_LIMITS.note)),
    check('wheels_due', sql`(${t.dueOn} is null) = (${t.dueWhy} is null)`),
    check('wheels_due_why', oneOf(t.dueWhy, DUE_REASONS)),
    check('wheels_on_spindle', sql`${t.isOnSpindle} or ${t.onGrinderId} is null`),
    check('wheels_on_quill_of_grinder', sql`(${t.onGrinderId} is null) = (${t.onQuillId} is null)`),
    check('wheels_abrasive', oneOf(t.abrasive, ABRASIVES)),
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
