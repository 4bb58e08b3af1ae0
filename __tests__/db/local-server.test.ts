import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import path from 'node:path';
import readline from 'node:readline';

import { Client } from 'pg';

const SERVER = path.resolve('db/local-server.mjs');

async function opened(child: ChildProcess): Promise<string> {
  if (!child.stdout) throw new Error('no stdout');
  const [url] = (await once(readline.createInterface(child.stdout), 'line')) as [string];
  return url;
}

async function ask(url: string, question: string): Promise<unknown> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    const { rows } = await client.query<Record<string, unknown>>(question);
    return Object.values(rows[0] ?? {})[0];
  } finally {
    await client.end();
  }
}

async function gone(url: string): Promise<boolean> {
  for (let tries = 0; tries < 100; tries += 1) {
    const code = await ask(url, 'select 1').then(
      () => null,
      (error: NodeJS.ErrnoException) => error.code,
    );
    if (code === 'ECONNREFUSED') return true;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  return false;
}

describe('a private cluster', () => {
  let guard: ChildProcess;
  let url: string;

  beforeAll(async () => {
    guard = spawn(process.execPath, [SERVER, 'guard', 'test'], {
      stdio: ['pipe', 'pipe', 'inherit'],
    });
    url = await opened(guard);
  });

  afterAll(() => {
    guard.stdin?.end();
  });

  test.each([
    ['listens on loopback alone', 'show listen_addresses', '127.0.0.1'],
    ['has no sockets', 'show unix_socket_directories', ''],
    ['keeps passwords as scram hashes', 'show password_encryption', 'scram-sha-256'],
  ])('%s', async (_, question, answer) => {
    expect(await ask(url, question)).toBe(answer);
  });

  test('refuses a wrong password', async () => {
    const wrong = new URL(url);
    wrong.password = 'guess';
    await expect(ask(wrong.toString(), 'select 1')).rejects.toMatchObject({ code: '28P01' });
  });

  test('stops when its opener lets go', async () => {
    guard.stdin?.end();
    const [code] = (await once(guard, 'exit')) as [number];
    expect(code).toBe(0);
    expect(await gone(url)).toBe(true);
  });
});

test('a cluster does not outlive an opener that is killed', async () => {
  const opener = spawn(
    process.execPath,
    [
      '--input-type=module',
      '--eval',
      `import { openCluster } from ${JSON.stringify(SERVER)};
       console.log((await openCluster('test')).adminUrl);
       setInterval(() => undefined, 1000);`,
    ],
    { stdio: ['ignore', 'pipe', 'inherit'] },
  );
  const url = await opened(opener);
  expect(await ask(url, 'select 1')).toBe(1);
  opener.kill('SIGKILL');
  expect(await gone(url)).toBe(true);
});
