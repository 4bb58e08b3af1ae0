import express, { type RequestHandler } from 'express';

import { Refusal } from '../refusals';

const LARGEST_BODY = '256kb';

/** The database stores neither NUL nor half of a surrogate pair. */
const UNSTORABLE = /\0|\p{Surrogate}/u;

function storableOnly(key: string, value: unknown): unknown {
  if (UNSTORABLE.test(key) || (typeof value === 'string' && UNSTORABLE.test(value)))
    throw new SyntaxError('unstorable character');
  return value;
}

const jsonOnly: RequestHandler = (req, _res, next) => {
  const hasBody =
    req.headers['transfer-encoding'] !== undefined || req.get('content-length') !== '0';
  if (hasBody && req.is('application/json') === false) throw new Refusal('unsupported-media-type');
  next();
};

const storableUrl: RequestHandler = (req, _res, next) => {
  if (/%00/.test(req.url)) throw new Refusal('invalid-query');
  next();
};

/** Reads JSON bodies, and refuses any other kind. */
export const jsonBody: RequestHandler[] = [
  storableUrl,
  jsonOnly,
  express.json({ limit: LARGEST_BODY, reviver: storableOnly }),
];
