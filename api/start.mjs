import { everydayDatabase, requireIdleCluster } from './launch/database.mjs';
import { launch, say } from './launch/launcher.mjs';
import { installPackages } from './launch/packages.mjs';
import { portFromEnvironment, requireFreePort, startServer, welcome } from './launch/server.mjs';
import { buildWeb } from './launch/web.mjs';

const WEB_ROOT = 'dist';

launch(async (launcher) => {
  const port = portFromEnvironment(3000);
  requireIdleCluster();
  await requireFreePort(port, 'npm start');
  await installPackages(launcher);
  const { env, signIns } = await everydayDatabase(launcher);
  await buildWeb(launcher, WEB_ROOT);
  say('Starting the server');
  const server = await startServer(launcher, { port, env: { ...env, WEB_ROOT } });
  welcome(process.env.PUBLIC_URL ?? server.address, signIns);
  return server.ended;
});
