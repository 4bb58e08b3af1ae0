import { signInRequest, signUpRequest } from '@/shared/contracts/session';

import type { RateLimits } from '../http/rate-limits';
import { nothing, ok, openRoute, stored, type Route } from '../http/route';
import { Refusal } from '../refusals';
import type { Accounts } from './accounts';
import type { Sessions } from './session';

interface SessionRoutes {
  accounts: Accounts;
  sessions: Sessions;
  limits: RateLimits;
}

export const sessionRoutes = ({ accounts, sessions, limits }: SessionRoutes): Route[] => [
  openRoute({
    method: 'get',
    path: '/session',
    // Nobody signed in is an answer, not an error.
    act: async (_input, req) => ok(req.user ? await accounts.sessionOf(req.user.id) : null),
  }),
  openRoute({
    method: 'post',
    path: '/session',
    body: signInRequest,
    act: async ({ body }, req) => {
      const address = req.ip ?? '';
      await limits.beforeSignIn(body.email, address);
      req.body = body;
      if (!(await sessions.signIn(req))) {
        req.log.warn({ event: 'sign-in failed' });
        await limits.signInFailed(body.email, address);
        throw new Refusal('unauthenticated', { detail: 'Address and password do not match.' });
      }
      await limits.signInSucceeded(body.email, address);
      return ok(await accounts.sessionOf(req.user?.id ?? ''));
    },
  }),
  openRoute({
    method: 'delete',
    path: '/session',
    act: async (_input, req) => {
      await sessions.end(req);
      return nothing;
    },
  }),
  openRoute({
    method: 'post',
    path: '/sign-up',
    body: signUpRequest,
    act: async ({ body }, req) => {
      await limits.signUp(req.ip ?? '');
      const { isNew } = await accounts.signUp(body);
      await sessions.start(req, body.personId);
      return stored({ isNew, item: await accounts.sessionOf(body.personId) });
    },
  }),
];
