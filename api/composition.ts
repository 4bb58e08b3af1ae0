import connectPgSimple from 'connect-pg-simple';
import expressSession from 'express-session';
import type { Logger } from 'pino';

import type { Database, Transaction } from '@/db/client';

import { createApp } from './app';
import { appointmentsRepository } from './appointments/appointments-repository';
import { appointmentsRoutes } from './appointments/appointments-routes';
import { appointmentsService } from './appointments/appointments-service';
import { auditRepository } from './audit/audit-repository';
import { auditTrail } from './audit/audit-trail';
import { accounts } from './auth/accounts';
import { PASSWORD_COST, passwords, type PasswordCost } from './auth/passwords';
import { personsRepository } from './auth/persons-repository';
import { SESSION_TIMES, sessions } from './auth/session';
import { sessionRoutes } from './auth/session-routes';
import { healthRoutes } from './http/health';
import { loggableError } from './http/loggable-error';
import { LIMIT_POINTS, rateLimits, type LimitPoints } from './http/rate-limits';
import { grindersRepository } from './machines/grinders-repository';
import { lathesRepository } from './machines/lathes-repository';
import { machinesRoutes } from './machines/machines-routes';
import { grindersService, lathesService } from './machines/machines-service';
import { notFound } from './refusals';
import { recomputeDrafts, refreshOutdated } from './setups/recompute';
import { setupsRepository } from './setups/setups-repository';
import { setupsRoutes } from './setups/setups-routes';
import { setupsService } from './setups/setups-service';
import type { InShop } from './shop-scope';
import { membersRepository } from './shops/members-repository';
import { shopsRepository } from './shops/shops-repository';
import { shopsRoutes } from './shops/shops-routes';
import { shopsService } from './shops/shops-service';
import { wheelEntriesRepository } from './wheels/wheel-entries-repository';
import { wheelLifeService } from './wheels/wheel-life-service';
import { wheelsRepository } from './wheels/wheels-repository';
import { wheelsRoutes } from './wheels/wheels-routes';
import { wheelsService } from './wheels/wheels-service';

export interface ServerOptions {
  database: Database;
  publicUrl: URL;
  trustProxy: boolean | number | string[];
  webRoot: string | null;
  sessionSecrets: string[];
  logger: Logger;
  now?: () => Date;
  sessionTimes?: typeof SESSION_TIMES;
  limitPoints?: LimitPoints;
  passwordCost?: PasswordCost;
}

const shopRepositories = (tx: Transaction, shopId: string) => ({
  shop: shopsRepository(tx, shopId),
  members: membersRepository(tx, shopId),
  lathes: lathesRepository(tx, shopId),
  grinders: grindersRepository(tx, shopId),
  wheels: wheelsRepository(tx, shopId),
  wheelEntries: wheelEntriesRepository(tx, shopId),
  appointments: appointmentsRepository(tx, shopId),
  setups: setupsRepository(tx, shopId),
});

const inShopOf =
  (database: Database): InShop =>
  ({ personId, shopId }, work) =>
    database.withShop(shopId, personId, async (tx) => {
      const repositories = shopRepositories(tx, shopId);
      const member = await repositories.members.find(personId);
      if (!member) throw notFound();
      const audit = auditTrail(auditRepository(tx, shopId), personId);
      return work({ ...repositories, personId, role: member.role, audit });
    });

const accountsOf = (database: Database, cost: PasswordCost) =>
  accounts({
    passwords: passwords(cost),
    credentialsOf: (email) =>
      database.withNobody((tx) => personsRepository(tx).credentialsOf(email)),
    sessionOf: (personId) =>
      database.withPerson(personId, (tx) => personsRepository(tx).sessionOf(personId)),
    withPersonInShop: ({ shopId, personId }, work) =>
      database.withShop(shopId, personId, (tx) =>
        work({
          persons: personsRepository(tx),
          shop: shopsRepository(tx, shopId),
          members: membersRepository(tx, shopId),
          audit: auditTrail(auditRepository(tx, shopId), personId),
        }),
      ),
  });

/** Puts the server together from its parts; the only place that knows them all. */
export function composeServer(options: ServerOptions) {
  const { database, publicUrl, sessionSecrets, logger } = options;
  const now = options.now ?? (() => new Date());
  let stopping = false;

  const inShop = inShopOf(database);
  const recompute = recomputeDrafts(now);
  const services = {
    accounts: accountsOf(database, options.passwordCost ?? PASSWORD_COST),
    shops: shopsService(inShop, recompute),
    lathes: lathesService({ inShop, recompute }),
    grinders: grindersService({ inShop, recompute }),
    wheels: wheelsService({ inShop, recompute, now }),
    wheelLives: wheelLifeService({ inShop, recompute, now }),
    appointments: appointmentsService({ inShop, now }),
    setups: setupsService({ inShop, refreshOutdated: refreshOutdated(now), now }),
  };

  const SessionStore = connectPgSimple(expressSession);
  const store = new SessionStore({
    pool: database.pool,
    tableName: 'sessions',
    errorLog: (...details: unknown[]) =>
      logger.error({ details: details.map(loggableError) }, 'session store'),
  });
  const signedIn = sessions({
    store,
    secrets: sessionSecrets,
    isSecure: publicUrl.protocol === 'https:',
    times: options.sessionTimes ?? SESSION_TIMES,
    now,
    recognise: services.accounts.recognise,
  });
  const limits = rateLimits(database.pool, options.limitPoints ?? LIMIT_POINTS);
  const routes = [
    ...healthRoutes({ checkDatabase: database.check, isStopping: () => stopping }),
    ...sessionRoutes({ accounts: services.accounts, sessions: signedIn, limits }),
    ...shopsRoutes(services.shops),
    ...machinesRoutes(services),
    ...wheelsRoutes(services),
    ...appointmentsRoutes(services.appointments),
    ...setupsRoutes(services.setups),
  ];

  return {
    app: createApp({ ...options, routes, sessions: signedIn, limits }),
    routes,
    services,
    /** From now on /api/ready says no, so that no further requests are sent here. */
    announceStop: () => {
      stopping = true;
    },
    close: () => store.close(),
  };
}

export type Server = ReturnType<typeof composeServer>;
