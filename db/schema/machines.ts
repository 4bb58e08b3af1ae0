import { sql } from 'drizzle-orm';
import {
  check,
  date,
  doublePrecision,
  foreignKey,
  integer,
  pgTable,
  primaryKey,
  smallint,
  text,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';

import { LIMITS, TEXT_LIMITS } from '@/shared/domain/limits';
import {
  COMPOUND_ZEROS,
  DIAL_READINGS,
  GUARDS,
  QUILL_MATERIALS,
  ROTATIONS,
  SPINDLE_NOSES,
  THREAD_HANDS,
} from '@/shared/domain/machines';

import {
  eachInRange,
  inRange,
  itemOfShop,
  measure,
  oneOf,
  retiredAt,
  shopId,
  shopPolicy,
  textUpTo,
} from './columns';
import { shops } from './people';

export const lathes = pgTable(
  'lathes',
  {
    ...itemOfShop(),
    name: text('name').notNull(),
    spindleSpeedsRpm: doublePrecision('spindle_speeds_rpm').array().notNull(),
    feedsMmPerRev: doublePrecision('feeds_mm_per_rev').array().notNull(),
    crossSlideDivisionMm: measure('cross_slide_division_mm').notNull(),
    crossSlideReads: text('cross_slide_reads', { enum: DIAL_READINGS }).notNull(),
    crossSlideDivisionsPerTurn: integer('cross_slide_divisions_per_turn'),
    compoundZero: text('compound_zero', { enum: COMPOUND_ZEROS }),
    compoundDivisionMm: measure('compound_division_mm'),
    compoundTravelMm: measure('compound_travel_mm'),
    compoundMmPerTurn: measure('compound_mm_per_turn'),
    spindleNose: text('spindle_nose', { enum: SPINDLE_NOSES }),
  },
  (t) => [
    primaryKey({ name: 'lathes_pkey', columns: [t.shopId, t.id] }),
    uniqueIndex('lathes_name').on(t.shopId, sql`lower(${t.name})`),
    foreignKey({ name: 'lathes_shop', columns: [t.shopId], foreignColumns: [shops.id] }),
    check('lathes_name_length', textUpTo(t.name, TEXT_LIMITS.name)),
    check('lathes_spindle_speeds_count', sql`cardinality(${t.spindleSpeedsRpm}) between 1 and 60`),
    check('lathes_spindle_speeds_rpm', eachInRange(t.spindleSpeedsRpm, LIMITS.spindleSpeedRpm)),
    check('lathes_feeds_count', sql`cardinality(${t.feedsMmPerRev}) between 1 and 60`),
    check('lathes_feeds_mm_per_rev', eachInRange(t.feedsMmPerRev, LIMITS.feedMmPerRev)),
    check('lathes_cross_slide_division_mm', inRange(t.crossSlideDivisionMm, LIMITS.dialDivisionMm)),
    check('lathes_cross_slide_reads', oneOf(t.crossSlideReads, DIAL_READINGS)),
    check(
      'lathes_cross_slide_divisions_per_turn',
      inRange(t.crossSlideDivisionsPerTurn, LIMITS.dialDivisions),
    ),
    check('lathes_compound_zero', oneOf(t.compoundZero, COMPOUND_ZEROS)),
    check('lathes_compound_division_mm', inRange(t.compoundDivisionMm, LIMITS.dialDivisionMm)),
    check('lathes_compound_travel_mm', inRange(t.compoundTravelMm, LIMITS.compoundTravelMm)),
    check('lathes_compound_mm_per_turn', inRange(t.compoundMmPerTurn, LIMITS.slideMmPerTurn)),
    check('lathes_spindle_nose', oneOf(t.spindleNose, SPINDLE_NOSES)),
    shopPolicy('lathes'),
  ],
);

export const grinders = pgTable(
  'grinders',
  {
    ...itemOfShop(),
    name: text('name').notNull(),
    motorNoLoadRpm: measure('motor_no_load_rpm').notNull(),
    motorPowerW: measure('motor_power_w').notNull(),
    spindleMaximumRpm: measure('spindle_maximum_rpm'),
    guard: text('guard', { enum: GUARDS }).notNull(),
    postStiffnessNPerMm: measure('post_stiffness_n_per_mm'),
    wheelRotation: text('wheel_rotation', { enum: ROTATIONS }),
    shimsMm: doublePrecision('shims_mm').array().notNull().default([]),
  },
  (t) => [
    primaryKey({ name: 'grinders_pkey', columns: [t.shopId, t.id] }),
    uniqueIndex('grinders_name').on(t.shopId, sql`lower(${t.name})`),
    foreignKey({ name: 'grinders_shop', columns: [t.shopId], foreignColumns: [shops.id] }),
    check('grinders_name_length', textUpTo(t.name, TEXT_LIMITS.name)),
    check('grinders_motor_no_load_rpm', inRange(t.motorNoLoadRpm, LIMITS.motorRpm)),
    check('grinders_motor_power_w', inRange(t.motorPowerW, LIMITS.motorPowerW)),
    check('grinders_spindle_maximum_rpm', inRange(t.spindleMaximumRpm, LIMITS.spindleRpm)),
    check('grinders_guard', oneOf(t.guard, GUARDS)),
    check('grinders_post_stiffness', inRange(t.postStiffnessNPerMm, LIMITS.stiffnessNPerMm)),
    check('grinders_wheel_rotation', oneOf(t.wheelRotation, ROTATIONS)),
    check('grinders_shims_count', sql`cardinality(${t.shimsMm}) <= 60`),
    check('grinders_shims_mm', eachInRange(t.shimsMm, LIMITS.shimMm)),
    shopPolicy('grinders'),
  ],
);

export const beltSteps = pgTable(
  'belt_steps',
  {
    shopId: shopId(),
    grinderId: uuid('grinder_id').notNull(),
    id: uuid('id').notNull(),
    position: smallint('position').notNull(),
    name: text('name').notNull(),
    drivingPulleyMm: measure('driving_pulley_mm').notNull(),
    drivenPulleyMm: measure('driven_pulley_mm').notNull(),
    beltThicknessMm: measure('belt_thickness_mm').notNull(),
    measuredRpm: measure('measured_rpm'),
    measuredOn: date('measured_on', { mode: 'string' }),
    measuredInstrument: text('measured_instrument'),
  },
  (t) => [
    primaryKey({ name: 'belt_steps_pkey', columns: [t.shopId, t.grinderId, t.id] }),
    uniqueIndex('belt_steps_name').on(t.shopId, t.grinderId, sql`lower(${t.name})`),
    foreignKey({
      name: 'belt_steps_grinder',
      columns: [t.shopId, t.grinderId],
      foreignColumns: [grinders.shopId, grinders.id],
    }),
    check('belt_steps_name_length', textUpTo(t.name, 10)),
    check('belt_steps_driving_pulley_mm', inRange(t.drivingPulleyMm, LIMITS.pulleyMm)),
    check('belt_steps_driven_pulley_mm', inRange(t.drivenPulleyMm, LIMITS.pulleyMm)),
    check('belt_steps_belt_thickness_mm', inRange(t.beltThicknessMm, LIMITS.beltThicknessMm)),
    check('belt_steps_measured_rpm', inRange(t.measuredRpm, LIMITS.spindleRpm)),
    check(
      'belt_steps_measured_whole',
      sql`num_nulls(${t.measuredRpm}, ${t.measuredOn}, ${t.measuredInstrument}) in (0, 3)`,
    ),
    shopPolicy('belt_steps'),
  ],
);

/** Quills stay when they are retired: setups name them. */
export const quills = pgTable(
  'quills',
  {
    shopId: shopId(),
    grinderId: uuid('grinder_id').notNull(),
    id: uuid('id').notNull(),
    position: smallint('position').notNull(),
    name: text('name').notNull(),
    segmentLengthsMm: doublePrecision('segment_lengths_mm').array().notNull(),
    segmentDiametersMm: doublePrecision('segment_diameters_mm').array().notNull(),
    material: text('material', { enum: QUILL_MATERIALS }).notNull(),
    markedMaximumRpm: measure('marked_maximum_rpm'),
    seatDiameterMm: measure('seat_diameter_mm').notNull(),
    threadHand: text('thread_hand', { enum: THREAD_HANDS }),
    measuredStiffnessNPerMm: measure('measured_stiffness_n_per_mm'),
    measuredFrequencyHz: measure('measured_frequency_hz'),
    retiredAt: retiredAt(),
  },
  (t) => [
    primaryKey({ name: 'quills_pkey', columns: [t.shopId, t.grinderId, t.id] }),
    uniqueIndex('quills_name')
      .on(t.shopId, t.grinderId, sql`lower(${t.name})`)
      .where(sql`${t.retiredAt} is null`),
    foreignKey({
      name: 'quills_grinder',
      columns: [t.shopId, t.grinderId],
      foreignColumns: [grinders.shopId, grinders.id],
    }),
    check('quills_name_length', textUpTo(t.name, TEXT_LIMITS.name)),
    check(
      'quills_segments_count',
      sql`cardinality(${t.segmentLengthsMm}) between 1 and 8 and cardinality(${t.segmentLengthsMm}) = cardinality(${t.segmentDiametersMm})`,
    ),
    check('quills_segment_lengths_mm', eachInRange(t.segmentLengthsMm, LIMITS.quillLengthMm)),
    check('quills_segment_diameters_mm', eachInRange(t.segmentDiametersMm, LIMITS.quillDiameterMm)),
    check('quills_material', oneOf(t.material, QUILL_MATERIALS)),
    check('quills_marked_maximum_rpm', inRange(t.markedMaximumRpm, LIMITS.spindleRpm)),
    check('quills_seat_diameter_mm', inRange(t.seatDiameterMm, LIMITS.quillDiameterMm)),
    check('quills_thread_hand', oneOf(t.threadHand, THREAD_HANDS)),
    check('quills_measured_stiffness', inRange(t.measuredStiffnessNPerMm, LIMITS.stiffnessNPerMm)),
    check('quills_measured_frequency_hz', inRange(t.measuredFrequencyHz, LIMITS.frequencyHz)),
    shopPolicy('quills'),
  ],
);
