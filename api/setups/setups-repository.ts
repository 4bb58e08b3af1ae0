import { and, asc, desc, eq, gt, ilike, lt, or, sql, type SQL } from 'drizzle-orm';

import { validate as isUuid } from 'uuid';

import type { Transaction } from '@/db/client';
import { persons, setups } from '@/db/schema';
import type { Setup, SetupPage } from '@/shared/contracts/setups';
import type { Operation, SetupInputs, SetupState, Verdict } from '@/shared/domain/setups';

import { containing, isTime, keyOf, pageOf } from '../paging';
import { storedFields, type Lock } from '../stored-items';

/** A plan as it is stored beside the inputs it was made from. */
export interface StoredPlan {
  plan: Setup['plan'];
  /** Needs of an incomplete plan, otherwise findings of the verdict's level. */
  verdictCount: number;
  /** The last of the shop's days on which it holds; null when no day ends it. */
  goodUntil: string | null;
}

interface SetupContent {
  name: string;
  inputs: SetupInputs;
  typed: Record<string, string>;
  stored: StoredPlan;
  updatedBy: string;
}

export interface SetupSearch {
  search?: string | undefined;
  operation?: Operation | undefined;
  state?: SetupState | undefined;
  wheelId?: string | undefined;
  after?: string | undefined;
  limit: number;
}

export interface DraftFilter {
  latheId?: string;
  grinderId?: string;
  wheelId?: string;
}

export interface Draft {
  id: string;
  inputs: SetupInputs;
  verdict: Verdict;
}

export const setupsRepository = (tx: Transaction, shopId: string) => {
  const one = (id: string) => and(eq(setups.shopId, shopId), eq(setups.id, id));

  /** Locks them in one order, whoever asks, so that two who ask never wait for each other. */
  const lockDrafts = (filter: SQL | undefined): Promise<Draft[]> =>
    tx
      .select({ id: setups.id, inputs: setups.inputs, verdict: setups.verdict })
      .from(setups)
      .where(and(eq(setups.shopId, shopId), eq(setups.state, 'draft'), filter))
      .orderBy(asc(setups.id))
      .for('no key update');

  const find = async (id: string, lock?: Lock): Promise<Setup | null> => {
    // Alone, before the join: a row that waited for its lock is not joined anew to what it now names.
    if (lock) await tx.select({ id: setups.id }).from(setups).where(one(id)).for(lock);
    const [found] = await tx
      .select({ row: setups, updatedByName: persons.name })
      .from(setups)
      .innerJoin(persons, eq(persons.id, setups.updatedBy))
      .where(one(id));
    return found ? toSetup(found) : null;
  };

  const stored = async (id: string): Promise<Setup> => {
    const setup = await find(id);
    if (!setup) throw new Error(`setup ${id} is not there after it was stored`);
    return setup;
  };

  return {
    find,

    async list({
      search,
      operation,
      state,
      wheelId,
      after,
      limit,
    }: SetupSearch): Promise<SetupPage> {
      const [time, id] = after === undefined ? [] : keyOf(after, isTime, isUuid);
      const rows = await tx
        .select({ ...summary, updatedByName: persons.name })
        .from(setups)
        .innerJoin(persons, eq(persons.id, setups.updatedBy))
        .where(
          and(
            eq(setups.shopId, shopId),
            operation && eq(setups.operation, operation),
            state && eq(setups.state, state),
            wheelId === undefined ? undefined : eq(setups.wheelId, wheelId),
            search ? ilike(setups.name, containing(search)) : undefined,
            time && id
              ? sql`(${setups.updatedAt}, ${setups.id}) < (${time}::timestamptz, ${id}::uuid)`
              : undefined,
          ),
        )
        .orderBy(desc(setups.updatedAt), desc(setups.id))
        .limit(limit + 1);
      return pageOf(rows, limit, {
        item: (row) => ({ ...row, updatedAt: row.updatedAt.toISOString() }),
        key: (row) => [row.updatedAt.toISOString(), row.id],
      });
    },

    async creationDigest(id: string): Promise<string | null> {
      const [row] = await tx.select({ digest: setups.creationDigest }).from(setups).where(one(id));
      return row?.digest ?? null;
    },

    /** Null when the id is in use. */
    async insert(
      setup: SetupContent & { id: string },
      creationDigest: string,
    ): Promise<Setup | null> {
      const rows = await tx
        .insert(setups)
        .values({ shopId, id: setup.id, ...columnsOf(setup), creationDigest })
        .onConflictDoNothing({ target: [setups.shopId, setups.id] })
        .returning({ id: setups.id });
      return rows.length > 0 ? stored(setup.id) : null;
    },

    async update(id: string, content: SetupContent): Promise<Setup> {
      await tx
        .update(setups)
        .set({ ...columnsOf(content), ...edited })
        .where(one(id));
      return stored(id);
    },

    async setState(id: string, state: SetupState, updatedBy: string): Promise<Setup> {
      await tx
        .update(setups)
        .set({ state, updatedBy, ...edited })
        .where(one(id));
      return stored(id);
    },

    lockDrafts: ({ latheId, grinderId, wheelId }: DraftFilter): Promise<Draft[]> =>
      lockDrafts(
        and(
          latheId ? eq(setups.latheId, latheId) : undefined,
          grinderId ? eq(setups.grinderId, grinderId) : undefined,
          wheelId ? eq(setups.wheelId, wheelId) : undefined,
        ),
      ),

    /** Drafts planned by other rules, or not for a day as late as this one. */
    lockOutdatedDrafts: (current: { rulesVersion: string; today: string }): Promise<Draft[]> =>
      lockDrafts(
        or(
          // Not `ne`: no index serves it.
          lt(setups.rulesVersion, current.rulesVersion),
          gt(setups.rulesVersion, current.rulesVersion),
          lt(setups.goodUntil, current.today),
        ),
      ),

    /** Not an edit: neither the version nor the time of the last edit moves. */
    async storePlan(id: string, plan: StoredPlan): Promise<void> {
      await tx.update(setups).set(planColumnsOf(plan)).where(one(id));
    },
  };
};

export type SetupsRepository = ReturnType<typeof setupsRepository>;

const summary = {
  id: setups.id,
  name: setups.name,
  operation: setups.operation,
  state: setups.state,
  verdict: setups.verdict,
  count: setups.verdictCount,
  version: setups.version,
  updatedAt: setups.updatedAt,
};

const edited = { version: sql`${setups.version} + 1`, updatedAt: sql`now()` };

const columnsOf = ({ name, inputs, typed, stored, updatedBy }: SetupContent) => ({
  name,
  operation: inputs.operation,
  inputs,
  typed,
  latheId: inputs.machine.latheId,
  grinderId: inputs.machine.grinderId,
  quillId: inputs.machine.quillId,
  wheelId: inputs.wheel.wheelId,
  ...planColumnsOf(stored),
  updatedBy,
});

const planColumnsOf = ({ plan, verdictCount, goodUntil }: StoredPlan) => ({
  plan,
  verdict: plan.verdict,
  verdictCount,
  rulesVersion: plan.rulesVersion,
  goodUntil,
});

function toSetup({
  row,
  updatedByName,
}: {
  row: typeof setups.$inferSelect;
  updatedByName: string;
}): Setup {
  return {
    ...storedFields(row),
    name: row.name,
    state: row.state,
    inputs: row.inputs,
    typed: row.typed,
    plan: row.plan,
    updatedBy: { personId: row.updatedBy, name: updatedByName },
  };
}
