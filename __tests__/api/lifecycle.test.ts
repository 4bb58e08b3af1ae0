import { once } from 'node:events';
import type { AddressInfo } from 'node:net';

import express from 'express';

import { listen, stopServing } from '@/api/lifecycle';

const HERE = { host: '127.0.0.1', port: 0 };
const portOf = (server: { address(): AddressInfo | string | null }) =>
  (server.address() as AddressInfo).port;

describe('the server process', () => {
  it('says in words that its port is in use', async () => {
    const first = await listen(express(), HERE);
    const port = portOf(first);
    await expect(listen(express(), { ...HERE, port })).rejects.toThrow(
      `Port ${port} is in use. Stop what uses it, or choose another with PORT.`,
    );
    await stopServing(first);
  });

  it('finishes the requests it has, and takes no more, when it stops', async () => {
    const app = express();
    const arrived = new Promise<() => void>((resolve) => {
      app.get('/slow', (_req, res) => resolve(() => res.send('done')));
    });
    const server = await listen(app, HERE);
    const url = `http://127.0.0.1:${portOf(server)}`;
    const slow = fetch(`${url}/slow`);
    const answer = await arrived;
    const stopped = stopServing(server);
    await expect(fetch(`${url}/slow`)).rejects.toThrow();
    answer();
    expect(await (await slow).text()).toBe('done');
    await stopped;
    expect(server.listening).toBe(false);
  });

  it('does not wait for connections that are idle', async () => {
    const server = await listen(express(), HERE);
    const idle = await fetch(`http://127.0.0.1:${portOf(server)}/`, { keepalive: true });
    await idle.text();
    const stopped = once(server, 'close');
    await stopServing(server);
    await stopped;
  });
});
