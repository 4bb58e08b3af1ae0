import path from 'node:path';

import { freePort } from '../db/local/cluster.mjs';
import { everydayDatabase, requireIdleCluster } from './launch/database.mjs';
import { launch, ROOT } from './launch/launcher.mjs';
import { installPackages } from './launch/packages.mjs';
import {
  portFromEnvironment,
  requireFreePort,
  serverEnvironment,
  welcome,
} from './launch/server.mjs';

/** Screens from Metro and the API behind it on one origin, both taking up each change as it is saved. */
launch(async (launcher) => {
  const port = portFromEnvironment(3000);
  requireIdleCluster();
  await requireFreePort(port, 'npm run dev');
  await installPackages(launcher);
  const { env, signIns } = await everydayDatabase(launcher);
  const apiPort = await freePort();
  const api = launcher.start(
    [process.execPath, '--watch', '--watch-preserve-output', '--import', 'tsx', 'api/main.ts'],
    { env: { ...serverEnvironment(apiPort), ...env, WEB_ROOT: '' } },
  );
  const expo = path.join(ROOT, 'node_modules/.bin/expo');
  const metro = launcher.start([expo, 'start', '--localhost', '--port', String(port)], {
    // Expo draws menus and codes for native apps on a terminal; through a pipe it does not.
    stdio: ['ignore', 'pipe', 'inherit'],
    env: {
      API_URL: `http://127.0.0.1:${apiPort}`,
      BROWSER: 'none',
      EXPO_NO_TELEMETRY: '1',
      EXPO_OFFLINE: '1',
      // With CI set, Metro would not watch.
      CI: 'false',
    },
  });
  metro.child.stdout.pipe(process.stdout);
  welcome(`http://localhost:${port}`, signIns);
  return Promise.race([api.ended, metro.ended]);
});
