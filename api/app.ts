import compression from 'compression';
import express, { type Express, type RequestHandler } from 'express';
import type { Logger } from 'pino';

import type { Sessions } from './auth/session';
import { errorHandler, unknownPath } from './http/error-handler';
import { jsonBody } from './http/json-body';
import type { RateLimits } from './http/rate-limits';
import { requestLog } from './http/request-log';
import { routerOf, type Route } from './http/route';
import { sameOriginOnly } from './http/same-origin';
import { securityHeaders } from './http/security-headers';
import { inlineScriptSources, webPages } from './http/web';

export interface AppOptions {
  /** The address people see, of which the origin counts. */
  publicUrl: URL;
  /** Which proxies may say where a request came from; express's setting of the same name. */
  trustProxy: boolean | number | string[];
  /** Folder of the exported web app; null serves the API alone. */
  webRoot: string | null;
  logger: Logger;
  routes: readonly Route[];
  sessions: Sessions;
  limits: RateLimits;
}

/** The whole server, without listening. */
export function createApp(options: AppOptions): Express {
  const { publicUrl, trustProxy, webRoot, logger, routes, sessions, limits } = options;
  const app = express();
  app.set('trust proxy', trustProxy);
  app.set('query parser', 'simple');
  app.disable('x-powered-by');
  app.use(requestLog(logger));
  app.use(
    securityHeaders({
      inlineScripts: webRoot === null ? [] : inlineScriptSources(webRoot),
      isSecure: publicUrl.protocol === 'https:',
    }),
  );
  app.use(compression());
  app.use(
    '/api',
    notStored,
    sameOriginOnly(publicUrl.origin),
    sessions.middleware,
    limitPerPerson(limits),
    jsonBody,
    routerOf(routes),
    unknownPath,
  );
  if (webRoot !== null) app.use(webPages(webRoot));
  app.use(unknownPath);
  app.use(errorHandler);
  return app;
}

const notStored: RequestHandler = (_req, res, next) => {
  res.set('Cache-Control', 'no-store');
  next();
};

const limitPerPerson =
  (limits: RateLimits): RequestHandler =>
  async (req, _res, next) => {
    if (req.user) await limits.request(req.user.id);
    next();
  };
