import { openCluster } from '../../db/local-server.mjs';
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
  say('Preparing the database');
  const answer = await launcher.run(typescript('db/prepare.ts'), {
    name: 'database',
    trouble: 'The database could not be prepared.',
    env: { DATABASE_ADMIN_URL: adminUrl },
  });
  const { databaseUrl, signIns } = JSON.parse(answer);
  return { env: { DATABASE_URL: databaseUrl, SEED_DEMO: 'true' }, signIns };
}

/** The database of DATABASE_URL; its schema is brought up to date where the owner's address is given too. */
export async function useGivenDatabase(launcher) {
  if (process.env.DATABASE_OWNER_URL) {
    say('Bringing the database’s schema up to date');
    await launcher.run(typescript('db/prepare.ts'), {
      name: 'database',
      trouble: 'The database could not be brought up to date.',
    });
  }
  return { env: {}, signIns: [] };
}
