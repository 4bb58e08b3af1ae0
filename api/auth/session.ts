import type { Request, RequestHandler } from 'express';
import session, { type Store } from 'express-session';
import { Passport } from 'passport';
import { Strategy } from 'passport-local';

import type { SignInRequest } from '@/shared/contracts/session';

declare global {
  namespace Express {
    interface User {
      id: string;
    }
  }
}

declare module 'express-session' {
  interface SessionData {
    signedInAt: number;
  }
}

const HOUR = 3_600_000;

/** A shift without a touch, and a week in all: a phone at the lathe must not sign out mid-pass. */
export const SESSION_TIMES = { idleMs: 12 * HOUR, absoluteMs: 7 * 24 * HOUR };

export interface SessionOptions {
  store: Store;
  /** The first signs, all are accepted: so a secret can be changed without signing anyone out. */
  secrets: string[];
  isSecure: boolean;
  times: typeof SESSION_TIMES;
  now: () => Date;
  recognise(request: SignInRequest): Promise<string | null>;
}

export interface Sessions {
  middleware: RequestHandler[];
  /** Checks the credentials in the request's body and starts a session; false when they are wrong. */
  signIn(req: Request): Promise<boolean>;
  start(req: Request, personId: string): Promise<void>;
  end(req: Request): Promise<void>;
}

export function sessions(options: SessionOptions): Sessions {
  const { store, secrets, isSecure, times, now, recognise } = options;
  const name = isSecure ? '__Host-ringtrue' : 'ringtrue';
  const passport = new Passport();
  passport.serializeUser((user, done) => done(null, user.id));
  passport.deserializeUser((id: string, done) => done(null, { id }));
  passport.use(
    new Strategy({ usernameField: 'email' }, (email, password, done) => {
      recognise({ email, password }).then((id) => done(null, id ? { id } : false), done);
    }),
  );

  const endOldSessions: RequestHandler = (req, _res, next) => {
    const { signedInAt } = req.session;
    const isOld = signedInAt !== undefined && now().getTime() - signedInAt > times.absoluteMs;
    if (isOld) req.session.regenerate(next);
    else next();
  };

  const start = async (req: Request, personId: string): Promise<void> => {
    await settled((done) => req.login({ id: personId }, done));
    req.session.signedInAt = now().getTime();
  };

  const cookie = { httpOnly: true, sameSite: 'lax', secure: isSecure, path: '/' } as const;

  return {
    middleware: [
      session({
        name,
        store,
        secret: secrets,
        resave: false,
        saveUninitialized: false,
        rolling: true,
        cookie: { ...cookie, maxAge: times.idleMs },
      }),
      endOldSessions,
      passport.session(),
    ],

    async signIn(req) {
      const user = await new Promise<Express.User | false>((resolve, reject) => {
        const done = (error: unknown, found: Express.User | false) =>
          error ? reject(error) : resolve(found);
        passport.authenticate('local', done)(req, req.res, reject);
      });
      if (user) await start(req, user.id);
      return user !== false;
    },

    start,

    async end(req) {
      await settled((done) => req.logout(done));
      await settled((done) => req.session.destroy(done));
      req.res?.clearCookie(name, cookie);
    },
  };
}

/** A callback that tells of an error at most, as a promise. */
const settled = (run: (done: (error?: unknown) => void) => void) =>
  new Promise<void>((resolve, reject) => run((error) => (error ? reject(error) : resolve())));
