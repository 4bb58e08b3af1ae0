import { randomBytes } from 'node:crypto';

import { runMigrations } from './migrate';
import { provision } from './provision';
import { signIns } from './seed';

const DATABASE = 'ringtrue';

const password = () => randomBytes(24).toString('base64url');

/**
 * Makes the private cluster's database ready for the server, whose roles get new passwords each time, or
 * brings a given one to the newest schema. Answers on stdout, in JSON.
 */
async function prepare(adminUrl: string | undefined, ownerUrl: string | undefined) {
  if (!adminUrl) {
    if (!ownerUrl) throw new Error('Neither DATABASE_ADMIN_URL nor DATABASE_OWNER_URL is set.');
    await runMigrations(ownerUrl);
    return {};
  }
  const passwords = { owner: password(), app: password(), backup: password() };
  const urls = await provision(adminUrl, DATABASE, passwords);
  await runMigrations(urls.owner);
  return { databaseUrl: urls.app, signIns };
}

prepare(process.env.DATABASE_ADMIN_URL, process.env.DATABASE_OWNER_URL).then(
  (answer) => process.stdout.write(JSON.stringify(answer)),
  (error: unknown) => {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
    process.exitCode = 1;
  },
);
