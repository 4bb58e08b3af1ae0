import { clusterHolder, openCluster } from '../../db/local-server.mjs';
import { Trouble } from '../../db/local/trouble.mjs';
import { say } from './launcher.mjs';
import { typescript } from './server.mjs';

/**
 * Opens a private cluster and brings its database to the newest schema, with the demo shop in it.
 *
 * @param {'main' | 'test'} kind - see openCluster
 * @returns what the server's environment needs, and who can sign in
 */
export async function openDatabase(launcher, kind) {
  say('Starting PostgreSQL');
  const { adminUrl, close } = await openCluster(kind);
  launcher.defer(close);
  launcher.goOn();
  say('Preparing the database');
  const answer = await launcher.run(typescript('db/prepare.ts'), {
    name: 'database',
    trouble: 'The database could not be prepared.',
    env: { DATABASE_ADMIN_URL: adminUrl },
  });
  const { databaseUrl, signIns } = JSON.parse(answer);
  return { env: { DATABASE_URL: databaseUrl, SEED_DEMO: 'true' }, signIns };
}

/** Fails in words when another command runs on this folder's own cluster. */
export function requireIdleCluster() {
  const holder = process.env.DATABASE_URL ? null : clusterHolder();
  if (!holder) return;
  throw new Trouble(
    `Ringtrue runs from this folder already (process ${holder}). Stop it with Ctrl-C first.`,
  );
}

/** The database of DATABASE_URL where it is set, and the private cluster's otherwise. */
export function everydayDatabase(launcher) {
  return process.env.DATABASE_URL ? givenDatabase(launcher) : openDatabase(launcher, 'main');
}

/** The schema of a given database is brought up to date where its owner's address is given too. */
async function givenDatabase(launcher) {
  if (process.env.DATABASE_OWNER_URL) {
    say('Bringing the database’s schema up to date');
    await launcher.run(typescript('db/prepare.ts'), {
      name: 'database',
      trouble: 'The database could not be brought up to date.',
    });
  }
  return { env: {}, signIns: [] };
}
