import { sql } from 'drizzle-orm';
import {
  check,
  date,
  foreignKey,
  index,
  integer,
  pgTable,
  primaryKey,
  smallint,
  text,
  unique,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';

import { LIMITS, TEXT_LIMITS } from '@/shared/domain/limits';
import { ENTRY_KINDS, SIGNERS, type EntryKind } from '@/shared/domain/wheel-life';
import { LOOK_RESULTS, RING_RESULTS } from '@/shared/domain/wheels';

import { happenedAt, inRange, measure, oneOf, shopId, shopPolicy, textUpTo } from './columns';
import { quills } from './machines';
import { memberships } from './people';
import { wheels } from './wheels';

const kinds = (...names: EntryKind[]) =>
  sql.raw(`kind in (${names.map((name) => `'${name}'`).join(', ')})`);

/** Only ever added to: the application has no right to change or remove an entry. */
export const wheelEntries = pgTable(
  'wheel_entries',
  {
    shopId: shopId(),
    id: uuid('id').notNull(),
    wheelId: uuid('wheel_id').notNull(),
    /** The order in which the server took the entries of this wheel. */
    number: integer('number').notNull(),
    kind: text('kind', { enum: ENTRY_KINDS }).notNull(),
    at: happenedAt(),
    happenedOn: date('happened_on', { mode: 'string' }).notNull(),
    personId: uuid('person_id').notNull(),
    needs: text('needs', { enum: SIGNERS }),
    look: text('look', { enum: LOOK_RESULTS }),
    ring: text('ring', { enum: RING_RESULTS }),
    diameterMm: measure('diameter_mm'),
    grinderId: uuid('grinder_id'),
    quillId: uuid('quill_id'),
    minutes: measure('minutes'),
    spindleRpm: measure('spindle_rpm'),
    depthMm: measure('depth_mm'),
    passes: smallint('passes'),
    reason: text('reason'),
    signsId: uuid('signs_id'),
    correctsId: uuid('corrects_id'),
    note: text('note'),
    /** Of the request that made the row. */
    creationDigest: text('creation_digest').notNull(),
  },
  (t) => [
    primaryKey({ name: 'wheel_entries_pkey', columns: [t.shopId, t.id] }),
    unique('wheel_entries_of_wheel').on(t.shopId, t.wheelId, t.id),
    uniqueIndex('wheel_entries_number').on(t.shopId, t.wheelId, t.number),
    uniqueIndex('wheel_entries_corrects')
      .on(t.shopId, t.correctsId)
      .where(sql`${t.correctsId} is not null`),
    index('wheel_entries_signs')
      .on(t.shopId, t.signsId)
      .where(sql`${t.signsId} is not null`),
    foreignKey({
      name: 'wheel_entries_wheel',
      columns: [t.shopId, t.wheelId],
      foreignColumns: [wheels.shopId, wheels.id],
    }),
    foreignKey({
      name: 'wheel_entries_person',
      columns: [t.shopId, t.personId],
      foreignColumns: [memberships.shopId, memberships.personId],
    }),
    foreignKey({
      name: 'wheel_entries_quill',
      columns: [t.shopId, t.grinderId, t.quillId],
      foreignColumns: [quills.shopId, quills.grinderId, quills.id],
    }),
    foreignKey({
      name: 'wheel_entries_signed',
      columns: [t.shopId, t.wheelId, t.signsId],
      foreignColumns: [t.shopId, t.wheelId, t.id],
    }),
    foreignKey({
      name: 'wheel_entries_corrected',
      columns: [t.shopId, t.wheelId, t.correctsId],
      foreignColumns: [t.shopId, t.wheelId, t.id],
    }),
    check('wheel_entries_kind', oneOf(t.kind, ENTRY_KINDS)),
    check('wheel_entries_counted', sql`${t.number} >= 1`),
    check('wheel_entries_first', sql`(${t.number} = 1) = (${t.kind} = 'received')`),
    check('wheel_entries_needs', oneOf(t.needs, SIGNERS)),
    check(
      'wheel_entries_needs_of_kind',
      sql`${t.needs} is null or case ${t.needs} when 'skilled' then ${kinds('inspected', 'ring test')} else ${kinds('mounted', 'trial run', 'dressed')} end`,
    ),
    check('wheel_entries_look', sql`(${t.look} is not null) = (${t.kind} = 'inspected')`),
    check('wheel_entries_look_result', oneOf(t.look, LOOK_RESULTS)),
    check('wheel_entries_ring', sql`(${t.ring} is not null) = (${t.kind} = 'ring test')`),
    check('wheel_entries_ring_result', oneOf(t.ring, RING_RESULTS)),
    check('wheel_entries_diameter_mm', inRange(t.diameterMm, LIMITS.wheelDiameterMm)),
    check(
      'wheel_entries_diameter_of_kind',
      sql`case when ${t.diameterMm} is null then kind <> 'received' else ${kinds('received', 'inspected', 'used')} end`,
    ),
    check(
      'wheel_entries_spindle',
      sql`num_nulls(${t.grinderId}, ${t.quillId}) = 2 or (num_nulls(${t.grinderId}, ${t.quillId}) = 0 and ${t.kind} = 'mounted')`,
    ),
    check('wheel_entries_minutes', inRange(t.minutes, { min: 0.5, max: LIMITS.usedMinutes.max })),
    check(
      'wheel_entries_minutes_of_kind',
      sql`case when ${t.minutes} is null then kind <> 'trial run' else ${kinds('trial run', 'used')} end`,
    ),
    check('wheel_entries_spindle_rpm', inRange(t.spindleRpm, LIMITS.spindleRpm)),
    check('wheel_entries_rpm', sql`(${t.spindleRpm} is not null) = (${t.kind} = 'trial run')`),
    check('wheel_entries_depth_mm', inRange(t.depthMm, LIMITS.dressDepthMm)),
    check('wheel_entries_passes', inRange(t.passes, LIMITS.dressPasses)),
    check(
      'wheel_entries_dressing',
      sql`num_nonnulls(${t.depthMm}, ${t.passes}) = case when ${t.kind} = 'dressed' then 2 else 0 end`,
    ),
    check('wheel_entries_reason_length', textUpTo(t.reason, TEXT_LIMITS.note)),
    check(
      'wheel_entries_reason',
      sql`(${t.reason} is not null) = (${kinds('set aside', 'scrapped', 'correction')})`,
    ),
    check(
      'wheel_entries_signs_one',
      sql`(${t.signsId} is not null) = (${t.kind} = 'countersigned')`,
    ),
    check(
      'wheel_entries_corrects_one',
      sql`(${t.correctsId} is not null) = (${t.kind} = 'correction')`,
    ),
    check('wheel_entries_note_length', textUpTo(t.note, TEXT_LIMITS.note)),
    shopPolicy('wheel_entries'),
  ],
);
