import { spawn } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

import { Trouble } from '../../db/local/trouble.mjs';

export const ROOT = fileURLToPath(new URL('../../', import.meta.url));
export const LOCAL = path.join(ROOT, '.local');

const SIGNALS = { SIGINT: 130, SIGTERM: 143, SIGHUP: 129 };
const NOTHING_TO_LOSE_MS = 2_000;
const TAIL_LINES = 30;

export function say(words) {
  process.stdout.write(`${words}\n`);
}

/** One run of a command: what it starts it also ends, last first, whether it succeeds, fails or is stopped. */
class Launcher {
  #closers = [];
  #ending = null;

  /** Registers what must be closed at the end; answers with a function that takes it off again. */
  defer(close) {
    this.#closers.push(close);
    return () => {
      this.#closers = this.#closers.filter((one) => one !== close);
    };
  }

  /** Closes everything and ends the process. */
  end(code) {
    this.#ending ??= this.#closeAll().then(() => process.exit(code));
    return this.#ending;
  }

  get ending() {
    return this.#ending !== null;
  }

  /** Leaves off here once the end has begun: what follows would be started in vain. */
  goOn() {
    if (this.ending) throw new Trouble('Stopped.');
  }

  async #closeAll() {
    for (let close = this.#closers.pop(); close; close = this.#closers.pop()) {
      await close().catch((error) => process.stderr.write(`${error.message}\n`));
    }
  }

  /**
   * Starts a program in a process group of its own, so that what it starts in turn ends with it.
   *
   * @param {string[]} command
   * @param {import('node:child_process').SpawnOptions} [options]
   */
  start(
    [program, ...args],
    { env, stdio = ['ignore', 'inherit', 'inherit'], graceMs = 15_000 } = {},
  ) {
    this.goOn();
    const child = spawn(program, args, {
      cwd: ROOT,
      env: { ...process.env, ...env },
      stdio,
      detached: true,
    });
    const ended = new Promise((resolve) => {
      child.once('error', () => resolve(127));
      child.once('close', (code, signal) => resolve(code ?? SIGNALS[signal] ?? 1));
    });
    const stop = async () => {
      signalGroup(child, 'SIGTERM');
      const hard = setTimeout(() => signalGroup(child, 'SIGKILL'), graceMs);
      await ended;
      clearTimeout(hard);
      signalGroup(child, 'SIGKILL');
    };
    const forget = this.defer(stop);
    void ended.then(forget);
    return { child, ended, stop };
  }

  /**
   * Runs a program to its end and answers with what it wrote. Complaints are kept in .local/logs, and
   * shown only when it fails.
   */
  async run(command, { name, trouble, env }) {
    const log = path.join(LOCAL, 'logs', `${name}.log`);
    fs.mkdirSync(path.dirname(log), { recursive: true });
    const file = fs.openSync(log, 'w', 0o600);
    const { child, ended } = this.start(command, {
      env,
      stdio: ['ignore', 'pipe', file],
      graceMs: NOTHING_TO_LOSE_MS,
    });
    let answer = '';
    child.stdout.setEncoding('utf8').on('data', (text) => {
      answer += text;
    });
    const code = await ended;
    fs.writeSync(file, answer);
    fs.closeSync(file);
    this.goOn();
    if (code === 0) return answer;
    const tail = fs.readFileSync(log, 'utf8').trimEnd().split('\n').slice(-TAIL_LINES).join('\n');
    throw new Trouble(`${tail}\n\n${trouble} (all of it: ${path.relative(ROOT, log)})`);
  }
}

function signalGroup(child, signal) {
  try {
    process.kill(-child.pid, signal);
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}

/**
 * Runs a command of the project and ends the process with what it answers.
 *
 * @param {(launcher: Launcher) => Promise<number>} main
 */
export function launch(main) {
  const launcher = new Launcher();
  for (const [signal, code] of Object.entries(SIGNALS)) {
    process.on(signal, () => {
      if (!launcher.ending) say(`\nStopping (${signal})`);
      void launcher.end(code);
    });
  }
  requireNode();
  main(launcher).then(
    (code) => launcher.end(code),
    (error) => {
      if (launcher.ending) return;
      process.stderr.write(`\n${error instanceof Trouble ? error.message : error.stack}\n`);
      void launcher.end(1);
    },
  );
}

function requireNode() {
  const { engines } = JSON.parse(fs.readFileSync(path.join(ROOT, 'package.json'), 'utf8'));
  const [least, below] = engines.node.match(/\d+(\.\d+)*/g);
  const number = (version) =>
    version.split('.').reduce((sum, part, index) => sum + Number(part) / 1000 ** index, 0);
  const here = number(process.versions.node);
  if (here >= number(least) && here < number(below)) return;
  process.stderr.write(
    `Ringtrue needs Node.js ${least} or newer, below ${below}; this is ${process.versions.node}.\n`,
  );
  process.exit(1);
}
