import fs from 'node:fs';
import path from 'node:path';

import { ROOT, say } from './launcher.mjs';

/** Installs the npm packages where they are missing or not those of the lock file. */
export async function installPackages(launcher) {
  if (packagesAreCurrent()) return;
  say('Installing the npm packages: two minutes or so');
  await launcher.run(['npm', 'ci', '--include=dev'], {
    name: 'npm-ci',
    trouble: 'npm could not install the packages. Look at the network, then try again.',
    env: { NODE_ENV: '' },
  });
}

/** npm leaves a list of what it installed, as its last step. */
function packagesAreCurrent() {
  const installed = packagesOf('node_modules/.package-lock.json');
  if (!installed) return false;
  return Object.entries(packagesOf('package-lock.json'))
    .filter(([where]) => where !== '')
    .every(([where, { version, optional, devOptional, peer }]) =>
      where in installed
        ? installed[where].version === version && fs.existsSync(path.join(ROOT, where))
        : Boolean(optional ?? devOptional ?? peer),
    );
}

function packagesOf(lock) {
  const file = path.join(ROOT, lock);
  return fs.existsSync(file) ? JSON.parse(fs.readFileSync(file, 'utf8')).packages : null;
}
