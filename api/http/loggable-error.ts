import { pino } from 'pino';

/** What the database says of an error beside its message; `detail` and `params` quote what was sent. */
const TELLING = ['code', 'severity', 'table', 'column', 'constraint', 'routine'] as const;

/**
 * An error as the log may hold it: a failed query names the values that were sent with it, and those are
 * people's.
 */
export function loggableError(error: unknown): unknown {
  if (!(error instanceof Error)) return error;
  if ('query' in error && 'params' in error)
    return { ...databaseError(error.cause), query: error.query, stack: frames(error) };
  if ('severity' in error) return databaseError(error);
  return pino.stdSerializers.err(error);
}

function databaseError(cause: unknown): Record<string, unknown> {
  if (!(cause instanceof Error)) return {};
  const facts = Object.entries(cause).filter(([key]) => TELLING.some((name) => name === key));
  return { message: cause.message, ...Object.fromEntries(facts) };
}

/** The stack without the message above it. */
const frames = ({ stack = '' }: Error) =>
  stack
    .split('\n')
    .filter((line) => /^\s+at /.test(line))
    .join('\n');
