import { createServer, type Server } from 'node:http';

import type { Express } from 'express';

const LONGEST_GOODBYE_MS = 10_000;

interface Address {
  host: string;
  port: number;
}

/** Listens, or throws an error that says in words why it cannot. */
export function listen(app: Express, { host, port }: Address): Promise<Server> {
  const server = createServer(app);
  return new Promise((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) => reject(explained(error, port)));
    server.listen(port, host, () => resolve(server));
  });
}

function explained(error: NodeJS.ErrnoException, port: number): Error {
  if (error.code === 'EADDRINUSE')
    return new Error(`Port ${port} is in use. Stop what uses it, or choose another with PORT.`);
  if (error.code === 'EACCES')
    return new Error(`Port ${port} is not open to this user. Choose one above 1023 with PORT.`);
  return error;
}

/** Takes no new connection, lets running requests finish, and cuts off what still hangs after ten seconds. */
export function stopServing(server: Server): Promise<void> {
  return new Promise((resolve, reject) => {
    const cutOff = setTimeout(() => server.closeAllConnections(), LONGEST_GOODBYE_MS);
    server.close((error) => {
      clearTimeout(cutOff);
      if (error) reject(error);
      else resolve();
    });
    server.closeIdleConnections();
  });
}
