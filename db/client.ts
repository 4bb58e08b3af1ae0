import { sql } from 'drizzle-orm';
import { drizzle, type NodePgQueryResultHKT } from 'drizzle-orm/node-postgres';
import type { PgDatabase } from 'drizzle-orm/pg-core';
import { Pool } from 'pg';

import * as schema from './schema';

/** Longer than any statement of ours; a stuck one must not hold a connection for ever. */
const STATEMENT_TIMEOUT_MS = 15_000;

export interface DatabaseOptions {
  poolSize?: number;
  /** Told of connections lost while idle; the pool replaces them. */
  onConnectionError?: (error: Error) => void;
}

/**
 * The application's pool, and the only two ways to a transaction: one opened for a shop and the person at
 * work in it, or one for a person alone. Settings hold for the transaction, so a connection given back
 * to the pool carries nothing over.
 */
export function createDatabase(url: string, options: DatabaseOptions = {}) {
  const pool = new Pool({
    connectionString: url,
    max: options.poolSize ?? 10,
    connectionTimeoutMillis: 5_000,
    idleTimeoutMillis: 30_000,
    statement_timeout: STATEMENT_TIMEOUT_MS,
    idle_in_transaction_session_timeout: STATEMENT_TIMEOUT_MS,
    application_name: 'ringtrue',
  });
  pool.on('error', (error) => options.onConnectionError?.(error));
  const db = drizzle({ client: pool, schema });

  const withSettings = <T>(
    settings: { shopId: string; personId: string },
    work: (tx: Transaction) => Promise<T>,
  ): Promise<T> =>
    db.transaction(async (tx) => {
      await tx.execute(
        sql`select set_config('app.shop_id', ${settings.shopId}, true), set_config('app.person_id', ${settings.personId}, true)`,
      );
      return work(tx);
    });

  return {
    pool,
    withShop: <T>(shopId: string, personId: string, work: (tx: Transaction) => Promise<T>) =>
      withSettings({ shopId, personId }, work),
    withPerson: <T>(personId: string, work: (tx: Transaction) => Promise<T>) =>
      withSettings({ shopId: '', personId }, work),
    /** For what stands outside every shop, before anybody is known. */
    withNobody: <T>(work: (tx: Transaction) => Promise<T>) =>
      withSettings({ shopId: '', personId: '' }, work),
    /** Fails when the database does not answer, or answers to a role that policies do not bind. */
    async check(): Promise<void> {
      const { rows } = await pool.query<{ unbound: boolean }>(
        `select r.rolsuper or r.rolbypassrls or pg_has_role(c.relowner, 'usage') as unbound
         from pg_roles r, pg_class c
         where r.rolname = current_user and c.oid = 'public.shops'::regclass`,
      );
      if (rows[0]?.unbound !== false)
        throw new Error(
          'The database role can see every shop: use the application role, ringtrue_app.',
        );
    },
    close: () => pool.end(),
  };
}

export type Database = ReturnType<typeof createDatabase>;
export type Transaction = PgDatabase<NodePgQueryResultHKT, typeof schema>;
