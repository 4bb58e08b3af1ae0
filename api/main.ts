import path from 'node:path';

import { pino } from 'pino';

import { createDatabase } from '@/db/client';
import { demoShop } from '@/db/seed';

import { composeServer } from './composition';
import { readEnv } from './env';
import { listen, stopServing } from './lifecycle';
import { seedDemo } from './seed-demo';

async function main(): Promise<void> {
  const env = readEnv(process.env);
  const logger = pino({ level: env.LOG_LEVEL });
  const database = createDatabase(env.DATABASE_URL, {
    onConnectionError: (error) => logger.warn({ err: error }, 'database connection lost'),
  });
  await database.check();
  const publicUrl = new URL(env.PUBLIC_URL ?? `http://localhost:${env.PORT}`);
  const server = composeServer({
    database,
    publicUrl,
    trustProxy: env.TRUST_PROXY === 0 ? false : env.TRUST_PROXY,
    webRoot: env.WEB_ROOT === '' ? null : path.resolve(env.WEB_ROOT),
    sessionSecrets: env.SESSION_SECRET,
    logger,
  });
  if (env.SEED_DEMO) await seedDemo(server.services, demoShop);
  const http = await listen(server.app, { host: env.HOST, port: env.PORT });
  logger.info({ address: http.address(), publicUrl: publicUrl.origin }, 'listening');

  const stop = async (signal: NodeJS.Signals) => {
    logger.info({ signal }, 'stopping');
    server.announceStop();
    await stopServing(http);
    await server.close();
    await database.close();
  };
  for (const signal of ['SIGINT', 'SIGTERM'] as const)
    process.once(signal, () => void stop(signal).catch(fail));
}

function fail(error: unknown): void {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
}

main().catch(fail);
