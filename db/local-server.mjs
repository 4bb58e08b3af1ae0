import { spawn } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';
import readline from 'node:readline';
import { fileURLToPath } from 'node:url';

import { Cluster, clusterHome, commandLine } from './local/cluster.mjs';
import { findPrograms, installPrograms } from './local/programs.mjs';
import { Trouble } from './local/trouble.mjs';

const SELF = fileURLToPath(import.meta.url);
const LOCAL = path.resolve(path.dirname(SELF), '../.local');
const TESTS = 'test-pg';

/**
 * Starts a private PostgreSQL cluster that lives no longer than this process: a guard holds the other end
 * of a pipe and stops the server when the pipe closes, however this process ends.
 *
 * @param {'main' | 'test'} kind - the one of `npm start` and `npm run dev`, or one made for a test run and
 * removed after it
 */
export async function openCluster(kind) {
  const guard = spawn(process.execPath, [SELF, 'guard', kind], {
    stdio: ['pipe', 'pipe', 'inherit'],
    // Out of reach of the terminal's Ctrl-C: the server must outlive those who still write to it.
    detached: true,
  });
  const ended = new Promise((resolve) => guard.once('close', resolve));
  const close = async () => {
    guard.stdin.end();
    await ended;
  };
  for await (const line of readline.createInterface(guard.stdout)) {
    if (line.startsWith('postgres://')) return { adminUrl: line, close };
    process.stdout.write(`${line}\n`);
  }
  await close();
  throw new Trouble('The database did not start; the reason stands above.');
}

/** The process that holds the main cluster, or null. */
export function clusterHolder() {
  const lock = lockFile();
  if (!fs.existsSync(lock)) return null;
  const pid = fs.readFileSync(lock, 'utf8');
  return isGuard(pid) ? pid : null;
}

async function guard(kind) {
  const asked = new Promise((resolve) => {
    process.stdin.once('end', resolve).once('error', resolve).resume();
    process.once('SIGTERM', resolve);
  });
  // With its reader gone there is nobody left to tell.
  process.stdout.on('error', () => undefined);
  const cluster = kind === 'test' ? testCluster() : mainCluster();
  try {
    process.stdout.write(`${await cluster.start()}\n`);
    await asked;
    cluster.stop();
  } finally {
    if (kind === 'test') cluster.remove();
    else fs.rmSync(lockFile());
    process.stdin.destroy();
  }
}

function mainCluster() {
  const holder = clusterHolder();
  if (holder) throw new Trouble(`The database is in use already, by process ${holder}.`);
  fs.writeFileSync(lockFile(), String(process.pid));
  return new Cluster({ local: LOCAL, name: 'pg', durable: true });
}

function testCluster() {
  const folder = path.join(clusterHome(LOCAL), TESTS);
  const left = fs.existsSync(folder) ? fs.readdirSync(folder).filter((pid) => !isGuard(pid)) : [];
  const open = (pid) =>
    new Cluster({ local: LOCAL, name: path.join(TESTS, String(pid)), durable: false });
  for (const abandoned of left.map(open)) {
    abandoned.stop();
    abandoned.remove();
  }
  return open(process.pid);
}

function lockFile() {
  return path.join(clusterHome(LOCAL), 'pg.guard');
}

/** A process number left behind by a crash may be anybody's by now. */
function isGuard(pid) {
  const words = commandLine(pid);
  return words.includes(SELF) && words.includes('guard');
}

async function main([command, kind]) {
  if (command === 'guard') {
    if (!findPrograms(LOCAL)) installPrograms(LOCAL, (words) => process.stdout.write(`${words}\n`));
    await guard(kind);
  } else if (command === 'start') {
    const { adminUrl, close } = await openCluster('main');
    process.stdout.write(`${adminUrl}\nCtrl-C stops it.\n`);
    for (const signal of ['SIGINT', 'SIGTERM']) process.once(signal, () => void close());
  } else if (command === 'stop') {
    const holder = clusterHolder();
    if (holder) process.kill(Number(holder), 'SIGTERM');
    else new Cluster({ local: LOCAL, name: 'pg', durable: true }).stop();
  } else if (command === 'status') {
    const cluster = new Cluster({ local: LOCAL, name: 'pg', durable: true });
    const port = cluster.runningPort();
    process.stdout.write(port === null ? 'stopped\n' : `${cluster.url(port)}\n`);
    process.exitCode = port === null ? 3 : 0;
  } else {
    process.stderr.write('usage: node db/local-server.mjs start|stop|status\n');
    process.exitCode = 2;
  }
}

if (process.argv[1] === SELF) {
  main(process.argv.slice(2)).catch((error) => {
    process.stderr.write(`${error instanceof Trouble ? error.message : error.stack}\n`);
    process.exit(1);
  });
}
