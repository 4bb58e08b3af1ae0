import { randomUUID } from 'node:crypto';

import type { Request, RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

const QUIET = new Set(['/api/health', '/api/ready']);

/** One line a request: neither bodies nor headers, and no query, for those may name people. */
export const requestLog = (logger: Logger): RequestHandler =>
  pinoHttp<Request>({
    logger,
    genReqId: (_req, res) => {
      const id = randomUUID();
      res.setHeader('X-Request-Id', id);
      return id;
    },
    autoLogging: { ignore: (req) => QUIET.has(req.url ?? '') },
    customProps: (req) => ({ personId: req.user?.id }),
    customLogLevel: (_req, res, error) => (error || res.statusCode >= 500 ? 'error' : 'info'),
    serializers: {
      req: (req: { id: string; method: string; url: string; remoteAddress: string }) => ({
        id: req.id,
        method: req.method,
        path: req.url.split('?')[0],
        remoteAddress: req.remoteAddress,
      }),
      res: (res: { statusCode: number }) => ({ statusCode: res.statusCode }),
    },
  });
