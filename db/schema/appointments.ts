import { sql } from 'drizzle-orm';
import {
  check,
  date,
  foreignKey,
  index,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uuid,
} from 'drizzle-orm/pg-core';

import { APPOINTED_TASKS } from '@/shared/domain/appointments';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import { edits, shopId, shopPolicy, textUpTo } from './columns';
import { memberships } from './people';

const TASKS = sql.raw(`array[${APPOINTED_TASKS.map((task) => `'${task}'`).join(', ')}]`);

/** Who is appointed in writing to mount, dress and trial-run; an appointment is ended, never removed. */
export const appointments = pgTable(
  'appointments',
  {
    shopId: shopId(),
    id: uuid('id').notNull(),
    ...edits(),
    personId: uuid('person_id').notNull(),
    tasks: text('tasks', { enum: APPOINTED_TASKS }).array().notNull(),
    wheelClass: text('wheel_class').notNull(),
    appointedBy: uuid('appointed_by').notNull(),
    fromOn: date('from_on', { mode: 'string' }).notNull(),
    untilOn: date('until_on', { mode: 'string' }),
    endedAt: timestamp('ended_at', { withTimezone: true, precision: 3 }),
    creationDigest: text('creation_digest').notNull(),
  },
  (t) => [
    primaryKey({ name: 'appointments_pkey', columns: [t.shopId, t.id] }),
    index('appointments_person').on(t.shopId, t.personId),
    foreignKey({
      name: 'appointments_person',
      columns: [t.shopId, t.personId],
      foreignColumns: [memberships.shopId, memberships.personId],
    }),
    foreignKey({
      name: 'appointments_appointed_by',
      columns: [t.shopId, t.appointedBy],
      foreignColumns: [memberships.shopId, memberships.personId],
    }),
    check(
      'appointments_tasks',
      sql`${t.tasks} <@ ${TASKS} and cardinality(${t.tasks}) between 1 and 3`,
    ),
    check('appointments_wheel_class_length', textUpTo(t.wheelClass, TEXT_LIMITS.wheelClass)),
    check('appointments_until', sql`${t.untilOn} >= ${t.fromOn}`),
    shopPolicy('appointments'),
  ],
);
