import { spawnSync } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';

import { Trouble } from './trouble.mjs';

export const isRoot = process.getuid?.() === 0;

/**
 * Installs a Debian package on the machine.
 *
 * @param {string} name
 * @param {string} purpose - the words for what it is needed for
 */
export function installPackage(name, purpose, say) {
  if (!isRoot || !programOnPath('apt-get')) throw new Trouble(missing(name, purpose));
  say(`Installing ${name} from Debian’s packages`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  try {
    run('apt-get', ['update', '-qq'], { env });
    run('apt-get', ['install', '-y', '-qq', '--no-install-recommends', name], { env });
  } catch (error) {
    throw new Trouble(missing(name, purpose), { cause: error });
  }
}

/** What is missing, and how to get it by hand. */
export function missing(name, purpose) {
  return (
    `${purpose} needs ${name}, which is not installed. ` +
    `As root: apt-get update && apt-get install --no-install-recommends ${name}`
  );
}

/** Runs a program to its end and throws when it fails; what it complains of is shown. */
export function run(program, args, options = {}) {
  const { status, error } = spawnSync(program, args, {
    ...options,
    stdio: ['ignore', 'ignore', 'inherit'],
  });
  if (error) throw error;
  if (status !== 0) throw new Error(`${program} ended with ${status}`);
}

/** A program of the PATH, followed through links to where its siblings are; null when there is none. */
export function programOnPath(name) {
  for (const folder of (process.env.PATH ?? '').split(path.delimiter)) {
    const file = path.join(folder, name);
    if (folder && fs.existsSync(file)) return fs.realpathSync(file);
  }
  return null;
}
