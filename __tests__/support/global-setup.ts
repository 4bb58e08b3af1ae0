import { openCluster } from '../../db/local-server.mjs';

import { createTemplate } from './template';

declare global {
  var closeTestCluster: (() => Promise<void>) | undefined;
}

/** Starts a PostgreSQL cluster for this run, unless one is given; workers read its address from here. */
export default async function globalSetup() {
  if (!process.env.TEST_DATABASE_ADMIN_URL) {
    const { adminUrl, close } = await openCluster('test');
    process.env.TEST_DATABASE_ADMIN_URL = adminUrl;
    globalThis.closeTestCluster = close;
  }
  await createTemplate(process.env.TEST_DATABASE_ADMIN_URL);
}
