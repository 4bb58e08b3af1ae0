import { spawn } from 'node:child_process';
import { once } from 'node:events';
import net from 'node:net';

/** What a launcher says before it gives up, and with which code. */
async function refusal(words: string[], env: Record<string, string> = {}) {
  const child = spawn(process.execPath, words, {
    env: { ...process.env, DATABASE_URL: 'postgres://nobody@127.0.0.1/none', ...env },
    stdio: ['ignore', 'ignore', 'pipe'],
  });
  let said = '';
  child.stderr.on('data', (text: Buffer) => {
    said += text.toString();
  });
  const [code] = (await once(child, 'close')) as [number];
  return { code, said: said.trim() };
}

test('a taken port is told in words, with a way out', async () => {
  const other = net.createServer().listen(0, '127.0.0.1');
  await once(other, 'listening');
  const { port } = other.address() as net.AddressInfo;
  const { code, said } = await refusal(['api/start.mjs'], { PORT: String(port) });
  other.close();
  expect(code).toBe(1);
  expect(said).toBe(
    `Port ${port} is taken by another program. Choose another one: PORT=${port + 100} npm start`,
  );
});

test.each(['http', '0', '70000', '3000.5'])('PORT=%s is refused in words', async (PORT) => {
  const { code, said } = await refusal(['api/start.mjs'], { PORT });
  expect(code).toBe(1);
  expect(said).toBe(`PORT must be a number from 1 to 65535, not "${PORT}".`);
});

test('an unknown part of the tests is answered with the known ones', async () => {
  const { code, said } = await refusal(['__tests__/run.mjs', '--only', 'rules,paint']);
  expect(code).toBe(1);
  expect(said).toContain('There is no part "paint". The parts are: types, lint, ');
});
