import { Router, type Request, type RequestHandler } from 'express';
import type * as z from 'zod';

import type { ProblemCode } from '@/shared/contracts/problem';

import { notFound, Refusal } from '../refusals';

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** One operation of the API: where it is, and what answers it. */
export interface Route {
  method: Method;
  path: string;
  handle: RequestHandler;
}

interface Place<P, Q, B> {
  method: Method;
  path: string;
  params?: z.ZodType<P>;
  query?: z.ZodType<Q>;
  body?: z.ZodType<B>;
}

interface Input<P, Q, B> {
  params: P;
  query: Q;
  body: B;
}

interface Answer {
  status: number;
  body?: unknown;
}

export const ok = (body: unknown): Answer => ({ status: 200, body });
const created = (body: unknown): Answer => ({ status: 201, body });
export const nothing: Answer = { status: 204 };

/** 201 for the request that made it, 200 when the same request comes again. */
export const stored = (result: { isNew: boolean; item: unknown }): Answer =>
  result.isNew ? created(result.item) : ok(result.item);

type Acting<I> = (input: I, req: Request) => Promise<Answer> | Answer;

/** A route for anybody: reads the input by its contracts, acts, and sends the answer. */
export function openRoute<P = undefined, Q = undefined, B = undefined>(
  place: Place<P, Q, B> & { act: Acting<Input<P, Q, B>> },
): Route {
  const { method, path, act } = place;
  return { method, path, handle: answering((req) => act(inputOf(place, req), req)) };
}

/** A route for somebody signed in; who that is comes before what they send. */
export function signedInRoute<P = undefined, Q = undefined, B = undefined>(
  place: Place<P, Q, B> & { act: Acting<Input<P, Q, B> & { personId: string }> },
): Route {
  const { method, path, act } = place;
  const input = (req: Request) => ({ personId: signedIn(req), ...inputOf(place, req) });
  return { method, path, handle: answering((req) => act(input(req), req)) };
}

const answering =
  (act: (req: Request) => Promise<Answer> | Answer): RequestHandler =>
  async (req, res) => {
    const { status, body } = await act(req);
    if (body === undefined) res.status(status).end();
    else res.status(status).json(body);
  };

function signedIn(req: Request): string {
  if (!req.user) throw new Refusal('unauthenticated');
  return req.user.id;
}

function inputOf<P, Q, B>(place: Place<P, Q, B>, req: Request): Input<P, Q, B> {
  return {
    params: parse(place.params, req.params, 'not-found'),
    query: parse(place.query, req.query, 'invalid-query'),
    body: parse(place.body, req.body, 'invalid-body'),
  };
}

function parse<T>(contract: z.ZodType<T> | undefined, value: unknown, code: ProblemCode): T {
  // Without a contract T is undefined: what nobody described is not handed on.
  if (!contract) return undefined as T;
  const result = contract.safeParse(value);
  if (result.success) return result.data;
  if (code === 'not-found') throw notFound();
  throw new Refusal(code, { errors: result.error.issues.flatMap(fieldErrors) });
}

function fieldErrors(issue: z.core.$ZodIssue) {
  const at = (path: readonly PropertyKey[]) => path.map(String).join('.');
  return issue.code === 'unrecognized_keys'
    ? issue.keys.map((key) => ({ path: at([...issue.path, key]), message: 'Unknown field.' }))
    : [{ path: at(issue.path), message: issue.message }];
}

/** Mounts the routes; any other method on one of their paths is answered with 405. */
export function routerOf(routes: readonly Route[]): Router {
  const router = Router({ caseSensitive: true });
  for (const path of new Set(routes.map((route) => route.path))) {
    const here = routes.filter((route) => route.path === path);
    const place = router.route(path);
    for (const { method, handle } of here) place[method](handle);
    const allowed = here.map(({ method }) => method.toUpperCase());
    if (allowed.includes('GET')) allowed.push('HEAD');
    place.all((_req, res) => {
      res.set('Allow', allowed.join(', '));
      throw new Refusal('method-not-allowed');
    });
  }
  return router;
}
