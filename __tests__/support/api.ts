import { randomUUID } from 'node:crypto';

import { pino } from 'pino';
import { Client } from 'pg';
import request from 'supertest';
import { v7 as uuidv7 } from 'uuid';

import { composeServer, type ServerOptions } from '@/api/composition';
import { createDatabase } from '@/db/client';
import type { Role } from '@/shared/domain/people';

import { copyTemplate } from './template';

/** No test means to run into a limit but those that are about limits. */
const FREE = 1_000_000;
const NO_LIMITS = {
  signInBurstPerMinute: FREE,
  signInPerAddressPerHour: FREE,
  signUpPerAddressPerHour: FREE,
  requestsPerPersonPerMinute: FREE,
};

/** Most tests are not about passwords, and sign in often. */
const CHEAP = { memoryCost: 1024, timeCost: 1 };

export const PASSWORD = 'four quiet herons wait';
export const ORIGIN = 'http://ringtrue.test';

/** The whole server on a database of its own, which it reaches as the application role. */
export async function startApi(options: Partial<ServerOptions> = {}) {
  const copy = await copyTemplate(`test_${randomUUID().replaceAll('-', '')}`);
  const database = options.database ?? createDatabase(copy.urls.app, { poolSize: 4 });
  const server = composeServer({
    publicUrl: new URL(ORIGIN),
    trustProxy: false,
    webRoot: null,
    sessionSecrets: ['a secret of the tests and of nobody else'],
    logger: pino({ level: process.env.LOG_LEVEL ?? 'silent' }),
    limitPoints: NO_LIMITS,
    passwordCost: CHEAP,
    ...options,
    database,
  });
  const owner = new Client({ connectionString: copy.urls.owner });
  await owner.connect();
  return {
    ...server,
    urls: copy.urls,
    database,
    /** Sees every shop: to look at what the server wrote. */
    owner,
    async stop() {
      await server.close();
      await database.close();
      await owner.end();
      await copy.drop();
    },
  };
}

export type Api = Awaited<ReturnType<typeof startApi>>;

/** Keeps its cookies, as a browser would. */
export type Visitor = ReturnType<typeof request.agent>;

export const visitorOf = (api: Pick<Api, 'app'>): Visitor => request.agent(api.app);

export async function signIn(api: Api, email: string, password = PASSWORD): Promise<Visitor> {
  const visitor = visitorOf(api);
  await visitor.post('/api/session').send({ email, password }).expect(200);
  return visitor;
}

export interface TestShop {
  shopId: string;
  /** Where everything of the shop is found. */
  path: string;
  ids: Record<Role, string>;
  as: Record<Role, Visitor>;
}

/** A shop of its own with one person of each role, all signed in. */
export async function makeShop(api: Api, name = 'Hollin Bank Tools'): Promise<TestShop> {
  const shopId = uuidv7();
  const ids = { lead: uuidv7(), machinist: uuidv7(), apprentice: uuidv7() };
  const emailOf = (role: Role) => `${role}-${ids[role]}@example.test`;
  const lead = visitorOf(api);
  await lead
    .post('/api/sign-up')
    .send({
      personId: ids.lead,
      shopId,
      name: 'Lead Person',
      email: emailOf('lead'),
      password: PASSWORD,
      shopName: name,
      units: 'mm',
      timeZone: 'Europe/Lisbon',
    })
    .expect(201);
  const join = async (role: Role) => {
    await api.services.accounts.join({
      id: ids[role],
      name: `${role} person`,
      email: emailOf(role),
      password: PASSWORD,
      shopId,
      role,
    });
    return signIn(api, emailOf(role));
  };
  return {
    shopId,
    path: `/api/shops/${shopId}`,
    ids,
    as: { lead, machinist: await join('machinist'), apprentice: await join('apprentice') },
  };
}

export interface AuditRow {
  person_id: string;
  action: string;
  subject: string;
  before: Record<string, unknown> | null;
  after: Record<string, unknown> | null;
}

/** What is written down about one thing, oldest first. */
export async function auditOf(api: Api, subjectId: string): Promise<AuditRow[]> {
  const { rows } = await api.owner.query<AuditRow>(
    `select person_id, action, subject, before, after from audit_entries
     where subject_id = $1 order by at, id`,
    [subjectId],
  );
  return rows;
}
