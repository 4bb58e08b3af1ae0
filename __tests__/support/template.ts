import { cloneDatabase, dropDatabase, provision, urlsFor } from '../../db/provision';
import { runMigrations } from '../../db/migrate';

const TEMPLATE = 'ringtrue_template';

/** The cluster of a test run is thrown away, and holds nothing but what tests put there. */
const PASSWORDS = { owner: 'owner', app: 'app', backup: 'backup' };

/** A migrated, empty database that each test file's own is copied from. */
export async function createTemplate(adminUrl: string) {
  await dropDatabase(adminUrl, TEMPLATE);
  const { owner } = await provision(adminUrl, TEMPLATE, PASSWORDS);
  await runMigrations(owner);
}

/** Copies the template; answers with the copy's address for each role, and how to drop it. */
export async function copyTemplate(name: string) {
  const adminUrl = process.env.TEST_DATABASE_ADMIN_URL;
  if (!adminUrl) throw new Error('The test cluster is started by Jest’s global setup.');
  await cloneDatabase(adminUrl, TEMPLATE, name);
  return {
    urls: urlsFor(adminUrl, name, PASSWORDS),
    drop: () => dropDatabase(adminUrl, name),
  };
}
