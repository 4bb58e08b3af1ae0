import { Client } from 'pg';

import { runMigrations } from '../../db/migrate';
import { provision, type DatabaseUrls } from '../../db/provision';

const TEMPLATE = 'ringtrue_template';

/** The cluster of a test run is thrown away, and holds nothing but what tests put there. */
const PASSWORDS = { owner: 'owner', app: 'app', backup: 'backup' };

/** A migrated, empty database that each test file's own is copied from. */
export async function createTemplate(adminUrl: string) {
  await run(adminUrl, `drop database if exists ${TEMPLATE} with (force)`);
  const urls = await provision(adminUrl, TEMPLATE, PASSWORDS);
  await runMigrations(urls.owner);
  process.env.TEST_TEMPLATE_URLS = JSON.stringify(urls);
}

/** Copies the template; answers with the copy's address for each role, and how to drop it. */
export async function copyTemplate(name: string) {
  const adminUrl = process.env.TEST_DATABASE_ADMIN_URL;
  const templateUrls = process.env.TEST_TEMPLATE_URLS;
  if (!adminUrl || !templateUrls)
    throw new Error('The test cluster is started by Jest’s global setup.');
  await run(adminUrl, `create database ${name} owner ringtrue_owner template ${TEMPLATE}`);
  const urls: DatabaseUrls = JSON.parse(templateUrls.replaceAll(`/${TEMPLATE}"`, `/${name}"`));
  return { urls, drop: () => run(adminUrl, `drop database ${name} with (force)`) };
}

async function run(adminUrl: string, statement: string) {
  const client = new Client({ connectionString: adminUrl });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}
