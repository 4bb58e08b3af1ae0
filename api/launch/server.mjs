import fs from 'node:fs';
import net from 'node:net';
import path from 'node:path';
import { randomBytes } from 'node:crypto';

import { Trouble } from '../../db/local/trouble.mjs';
import { LOCAL, say } from './launcher.mjs';

const READY_WITHIN_MS = 60_000;
const ASK_EVERY_MS = 150;

/** TypeScript is run as it stands; nothing is compiled ahead. */
export const typescript = (file) => [process.execPath, '--import', 'tsx', file];

/**
 * Starts the API, which also serves the screens, and waits until it is ready.
 *
 * @param {{ port: number, env: Record<string, string>, stdio?: import('node:child_process').StdioOptions }} options
 */
export async function startServer(launcher, { port, env, stdio }) {
  const server = launcher.start(typescript('api/main.ts'), {
    stdio,
    env: { NODE_ENV: 'production', ...serverEnvironment(port), ...env },
  });
  const address = `http://localhost:${port}`;
  const ended = server.ended.then(() => true);
  const deadline = Date.now() + READY_WITHIN_MS;
  while (!(await isReady(address))) {
    const over = await Promise.race([ended, pause()]);
    if (over || Date.now() > deadline) throw new Trouble('The server did not start.');
  }
  return { address, ended: server.ended, stop: server.stop };
}

/** What the server needs to be told, beside its database. */
export function serverEnvironment(port) {
  return {
    LOG_LEVEL: process.env.LOG_LEVEL ?? 'warn',
    SESSION_SECRET: sessionSecret(),
    PORT: String(port),
  };
}

/** Says where to look, and who can sign in. */
export function welcome(address, signIns) {
  say(`\nRingtrue is at ${address}`);
  for (const { role, email, password } of signIns) say(`  ${role.padEnd(12)}${email}  ${password}`);
  say('Ctrl-C stops it.');
}

async function isReady(address) {
  try {
    return (await fetch(`${address}/api/ready`)).ok;
  } catch {
    return false;
  }
}

const pause = () => new Promise((resolve) => setTimeout(resolve, ASK_EVERY_MS));

/** Fails in words when somebody listens on the port already. */
export async function requireFreePort(port, command) {
  const free = await new Promise((resolve) => {
    const probe = net.createServer();
    probe.once('error', () => resolve(false));
    probe.listen(port, '127.0.0.1', () => probe.close(() => resolve(true)));
  });
  if (free) return;
  throw new Trouble(
    `Port ${port} is taken by another program. Choose another one: PORT=${port < 65_000 ? port + 100 : port - 100} ${command}`,
  );
}

/** The port that was asked for. */
export function portFromEnvironment(fallback) {
  const text = process.env.PORT ?? String(fallback);
  const port = Number(text);
  if (Number.isInteger(port) && port > 0 && port < 65_536) return port;
  throw new Trouble(`PORT must be a number from 1 to 65535, not "${text}".`);
}

/** Sessions outlive a restart because their key does. */
function sessionSecret() {
  if (process.env.SESSION_SECRET) return process.env.SESSION_SECRET;
  const file = path.join(LOCAL, 'session-secret');
  if (!fs.existsSync(file)) {
    fs.mkdirSync(LOCAL, { recursive: true });
    fs.writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600 });
  }
  return fs.readFileSync(file, 'utf8');
}
