import { execFileSync, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';

import { installPackage, isRoot, missing, programOnPath, run } from './debian.mjs';
import { Trouble } from './trouble.mjs';

const DEBIAN = '/usr/lib/postgresql';
const PURPOSE = 'The database';

/**
 * Where PostgreSQL's server programs are, or null.
 *
 * @param {string} local - the project's folder for what it unpacked itself
 * @param {string | null} major - the version a cluster was made with; null takes the newest
 */
export function findPrograms(local, major = null) {
  const unpacked = path.join(local, 'postgresql');
  const places = [DEBIAN, path.join(unpacked, DEBIAN)].flatMap((base) =>
    subfolders(base).map((version) => ({
      version,
      bin: path.join(base, version, 'bin'),
      env: base === DEBIAN ? {} : { LD_LIBRARY_PATH: libraries(unpacked).join(':') },
    })),
  );
  const onPath = programOnPath('initdb');
  if (onPath) places.push({ version: versionOf(onPath), bin: path.dirname(onPath), env: {} });
  return (
    places
      .filter(({ bin }) => fs.existsSync(path.join(bin, 'initdb')))
      .filter(({ version }) => major === null || version === major)
      .sort((a, b) => Number(b.version) - Number(a.version))[0] ?? null
  );
}

/** Installs PostgreSQL from Debian's packages: on the machine as root, beside the project otherwise. */
export function installPrograms(local, say) {
  if (isRoot) {
    refuseMainCluster();
    installPackage('postgresql', PURPOSE, say);
  } else {
    try {
      unpackBeside(path.join(local, 'postgresql'), path.join(local, 'apt'), say);
    } catch (error) {
      process.stderr.write(`${error.message}\n`);
    }
  }
  if (!findPrograms(local)) throw new Trouble(missing('postgresql', PURPOSE));
}

/** Debian's package would otherwise start a cluster of its own that nobody asked for. */
function refuseMainCluster() {
  const folder = '/etc/postgresql-common/createcluster.d';
  fs.mkdirSync(folder, { recursive: true });
  fs.writeFileSync(path.join(folder, 'ringtrue.conf'), 'create_main_cluster = false\n');
}

/** Without root: what `apt-get install` would install is downloaded and unpacked into `target`. */
function unpackBeside(target, apt, say) {
  if (!programOnPath('apt-get')) throw new Trouble('This is not a Debian machine.');
  say('Unpacking PostgreSQL from Debian’s packages into .local');
  fs.rmSync(apt, { recursive: true, force: true });
  const folders = ['lists/partial', 'archives/partial', 'debs'].map((name) => path.join(apt, name));
  for (const folder of folders) fs.mkdirSync(folder, { recursive: true });
  const options = [
    ['Dir::State::lists', path.join(apt, 'lists')],
    ['Dir::Cache', apt],
    ['Dir::Cache::archives', path.join(apt, 'archives')],
  ].flatMap(([name, value]) => ['-o', `${name}=${value}`]);
  run('apt-get', [...options, 'update', '-qq']);
  const plan = execFileSync(
    'apt-get',
    [...options, '--simulate', '--no-install-recommends', 'install', 'postgresql'],
    { encoding: 'utf8' },
  );
  const names = [...plan.matchAll(/^Inst (\S+)/gm)].map((match) => match[1]);
  const debs = path.join(apt, 'debs');
  run('apt-get', [...options, 'download', '-qq', ...names], { cwd: debs });
  const half = `${target}.half`;
  fs.rmSync(half, { recursive: true, force: true });
  for (const deb of fs.readdirSync(debs)) run('dpkg', ['-x', path.join(debs, deb), half]);
  fs.rmSync(apt, { recursive: true });
  fs.rmSync(target, { recursive: true, force: true });
  fs.renameSync(half, target);
}

function versionOf(initdb) {
  const said = spawnSync(initdb, ['--version'], { encoding: 'utf8' }).stdout ?? '';
  return /(\d+)/.exec(said)?.[1] ?? '0';
}

function libraries(unpacked) {
  const lib = path.join(unpacked, 'usr/lib');
  const multiarch = subfolders(lib).filter((name) => name.includes('-linux-'));
  return multiarch.flatMap((name) => [path.join(lib, name), path.join(unpacked, 'lib', name)]);
}

function subfolders(folder) {
  return fs.existsSync(folder) ? fs.readdirSync(folder) : [];
}
