import { sql } from 'drizzle-orm';
import {
  check,
  date,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  uuid,
} from 'drizzle-orm/pg-core';

import { TEXT_LIMITS } from '@/shared/domain/limits';
import {
  OPERATIONS,
  SETUP_STATES,
  VERDICTS,
  type SetupInputs,
  type Verdict,
} from '@/shared/domain/setups';

import { itemOfShop, oneOf, shopPolicy, textUpTo } from './columns';
import { grinders, lathes, quills } from './machines';
import { memberships, shops } from './people';
import { wheels } from './wheels';

/** The plan whole, as the rules made it. */
interface PlanRecord {
  rulesVersion: string;
  verdict: Verdict;
  [part: string]: unknown;
}

export const setups = pgTable(
  'setups',
  {
    ...itemOfShop(),
    name: text('name').notNull(),
    operation: text('operation', { enum: OPERATIONS }).notNull(),
    state: text('state', { enum: SETUP_STATES }).notNull().default('draft'),
    inputs: jsonb('inputs').$type<SetupInputs>().notNull(),
    latheId: uuid('lathe_id'),
    grinderId: uuid('grinder_id'),
    quillId: uuid('quill_id'),
    wheelId: uuid('wheel_id'),
    plan: jsonb('plan').$type<PlanRecord>().notNull(),
    verdict: text('verdict', { enum: VERDICTS }).notNull(),
    verdictCount: integer('verdict_count').notNull(),
    rulesVersion: text('rules_version').notNull(),
    /** The last of the shop's days on which the plan holds: then its wheel expires. Null: no day ends it. */
    goodUntil: date('good_until', { mode: 'string' }),
    updatedBy: uuid('updated_by').notNull(),
  },
  (t) => [
    primaryKey({ name: 'setups_pkey', columns: [t.shopId, t.id] }),
    index('setups_latest').on(t.shopId, t.updatedAt, t.id),
    index('setups_good_until').on(t.shopId, t.goodUntil),
    index('setups_rules_version').on(t.shopId, t.rulesVersion),
    index('setups_lathe').on(t.shopId, t.latheId),
    index('setups_grinder').on(t.shopId, t.grinderId),
    index('setups_wheel').on(t.shopId, t.wheelId),
    foreignKey({ name: 'setups_shop', columns: [t.shopId], foreignColumns: [shops.id] }),
    foreignKey({
      name: 'setups_lathe',
      columns: [t.shopId, t.latheId],
      foreignColumns: [lathes.shopId, lathes.id],
    }),
    foreignKey({
      name: 'setups_grinder',
      columns: [t.shopId, t.grinderId],
      foreignColumns: [grinders.shopId, grinders.id],
    }),
    foreignKey({
      name: 'setups_quill',
      columns: [t.shopId, t.grinderId, t.quillId],
      foreignColumns: [quills.shopId, quills.grinderId, quills.id],
    }),
    foreignKey({
      name: 'setups_wheel',
      columns: [t.shopId, t.wheelId],
      foreignColumns: [wheels.shopId, wheels.id],
    }),
    foreignKey({
      name: 'setups_updated_by',
      columns: [t.shopId, t.updatedBy],
      foreignColumns: [memberships.shopId, memberships.personId],
    }),
    check('setups_name_length', textUpTo(t.name, TEXT_LIMITS.name)),
    check('setups_operation', oneOf(t.operation, OPERATIONS)),
    check('setups_state', oneOf(t.state, SETUP_STATES)),
    check('setups_verdict', oneOf(t.verdict, VERDICTS)),
    check('setups_verdict_count', sql`${t.verdictCount} >= 0`),
    check('setups_quill_of_grinder', sql`${t.quillId} is null or ${t.grinderId} is not null`),
    check('setups_inputs_operation', sql`${t.inputs} ->> 'operation' = ${t.operation}`),
    shopPolicy('setups'),
  ],
);
