import type * as z from 'zod';

import { ProblemError, refusalOf } from './problem';

interface RequestOptions {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  body?: unknown;
  signal?: AbortSignal;
}

const PATIENCE_MS = 15_000;

async function send(path: string, options: RequestOptions): Promise<Response> {
  const patience = AbortSignal.timeout(PATIENCE_MS);
  const signal = options.signal ? AbortSignal.any([options.signal, patience]) : patience;
  let response: Response;
  try {
    response = await fetch(path, {
      method: options.method ?? 'GET',
      signal,
      headers: options.body === undefined ? {} : { 'content-type': 'application/json' },
      ...(options.body === undefined ? {} : { body: JSON.stringify(options.body) }),
    });
  } catch (error) {
    if (options.signal?.aborted) throw error;
    throw new ProblemError(patience.aborted ? { kind: 'timeout' } : { kind: 'network' });
  }
  if (!response.ok) throw new ProblemError(await refusalOf(response));
  return response;
}

/** Asks the API and parses its answer with the contract; throws a ProblemError for everything else. */
export async function request<Contract extends z.ZodType>(
  contract: Contract,
  path: string,
  options: RequestOptions = {},
): Promise<z.infer<Contract>> {
  const response = await send(path, options);
  const parsed = contract.safeParse(await response.json().catch(() => undefined));
  if (!parsed.success)
    throw new ProblemError({ kind: 'bad-data', detail: `${path}: ${parsed.error.message}` });
  return parsed.data;
}

/** Asks the API where the answer has no body. */
export async function requestNothing(path: string, options: RequestOptions = {}): Promise<void> {
  await send(path, options);
}
