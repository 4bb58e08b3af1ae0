import path from 'node:path';

import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import { Pool } from 'pg';

const FOLDER = path.join('db', 'migrations');

/**
 * Brings a database to the newest schema.
 *
 * @param ownerUrl - the owner's address of the database, as provision() gives it
 * @param folder - where the migrations lie, by default below the project
 */
export async function runMigrations(ownerUrl: string, folder = path.resolve(FOLDER)) {
  const pool = new Pool({ connectionString: ownerUrl, max: 1, connectionTimeoutMillis: 10_000 });
  try {
    await migrate(drizzle({ client: pool }), { migrationsFolder: folder });
  } finally {
    await pool.end();
  }
}
