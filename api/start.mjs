import { clusterHolder } from '../db/local-server.mjs';
import { Trouble } from '../db/local/trouble.mjs';
import { openDatabase, useGivenDatabase } from './launch/database.mjs';
import { launch, say } from './launch/launcher.mjs';
import { installPackages } from './launch/packages.mjs';
import { portFromEnvironment, requireFreePort, startServer } from './launch/server.mjs';
import { buildWeb } from './launch/web.mjs';

const WEB_ROOT = 'dist';

launch(async (launcher) => {
  const port = portFromEnvironment(3000);
  const given = Boolean(process.env.DATABASE_URL);
  const holder = given ? null : clusterHolder();
  if (holder) {
    throw new Trouble(
      `Ringtrue runs from this folder already (process ${holder}). Stop it with Ctrl-C first.`,
    );
  }
  await requireFreePort(port, 'npm start');
  await installPackages(launcher);
  const { env, signIns } = await (given
    ? useGivenDatabase(launcher)
    : openDatabase(launcher, 'main'));
  await buildWeb(launcher, WEB_ROOT);
  say('Starting the server');
  const server = await startServer(launcher, {
    port,
    env: { ...env, WEB_ROOT },
  });
  say(`\nRingtrue is at ${server.address}`);
  for (const { role, email, password } of signIns) say(`  ${role.padEnd(12)}${email}  ${password}`);
  say('Ctrl-C stops it.');
  return server.ended;
});
