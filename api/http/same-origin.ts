import type { RequestHandler } from 'express';

import { Refusal } from '../refusals';

const READING = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses writes that another site made a browser send. Browsers name the site in Sec-Fetch-Site, older ones
 * in Origin; a caller that names neither is no browser, and holds no cookie that it was not given.
 */
export const sameOriginOnly =
  (ownOrigin: string): RequestHandler =>
  (req, _res, next) => {
    const site = req.get('sec-fetch-site');
    const origin = req.get('origin');
    const isOwn = site
      ? site === 'same-origin' || site === 'none'
      : origin === undefined || origin === ownOrigin || hostOf(origin) === req.get('host');
    if (READING.has(req.method) || isOwn) next();
    else throw new Refusal('cross-site');
  };

const hostOf = (origin: string): string | null =>
  URL.canParse(origin) ? new URL(origin).host : null;
