import type { ErrorRequestHandler, RequestHandler } from 'express';

import type { ProblemCode } from '@/shared/contracts/problem';

import { Refusal } from '../refusals';
import { loggableError } from './loggable-error';
import { sendProblem } from './problem';

/** What the body parser's errors are called, and what they are here. */
const BODY_PROBLEMS: Record<string, ProblemCode> = {
  'entity.parse.failed': 'invalid-json',
  'entity.verify.failed': 'invalid-json',
  'request.size.invalid': 'invalid-json',
  'request.aborted': 'invalid-json',
  'entity.too.large': 'too-large',
  'encoding.unsupported': 'unsupported-media-type',
  'charset.unsupported': 'unsupported-media-type',
};

/** SQLSTATE classes and system errors by which the database says: not now. */
const NOT_NOW = /^(08|53|57P|57014|40001|40P01|55P03|25P03)|^E(CONN|HOST|PIPE|TIMEDOUT|NOTFOUND)/;

export const unknownPath: RequestHandler = (_req, res) => sendProblem(res, 'not-found');

// eslint-disable-next-line max-params -- Express knows an error handler by its four parameters.
export const errorHandler: ErrorRequestHandler = (error: unknown, req, res, next) => {
  if (res.headersSent) {
    next(error);
    return;
  }
  if (error instanceof Refusal) {
    const { retryAfterSeconds, ...details } = error.details;
    if (retryAfterSeconds !== undefined) res.set('Retry-After', String(retryAfterSeconds));
    sendProblem(res, error.code, details);
    return;
  }
  const code = bodyProblem(error);
  if (code) {
    sendProblem(res, code);
    return;
  }
  req.log.error({ err: loggableError(error) }, 'request failed');
  if (isPassing(error)) {
    res.set('Retry-After', '2');
    sendProblem(res, 'unavailable', { detail: 'The database does not answer. Try again.' });
    return;
  }
  sendProblem(res, 'internal', { detail: 'The request id helps to find out why.' });
};

function bodyProblem(error: unknown): ProblemCode | undefined {
  const type = property(error, 'type');
  if (typeof type === 'string' && type in BODY_PROBLEMS) return BODY_PROBLEMS[type];
  // Express refuses a path with a broken escape this way.
  return error instanceof URIError ? 'not-found' : undefined;
}

/** Whether the cause is a database that is away, overloaded or asks to try again. */
function isPassing(error: unknown): boolean {
  const code = property(error, 'code') ?? property(property(error, 'cause'), 'code');
  if (typeof code === 'string') return NOT_NOW.test(code);
  const message = [error, property(error, 'cause')].map((e) =>
    e instanceof Error ? e.message : '',
  );
  return message.some((text) => /connection (terminated|timeout)|timeout exceeded/i.test(text));
}

function property(value: unknown, name: string): unknown {
  return typeof value === 'object' && value !== null
    ? (value as Record<string, unknown>)[name]
    : undefined;
}
