/**
 * Sessions and who is behind them. A session ends after eight hours without a request (a shift) and in any case 24 hours
 * after sign-in. It is renewed at most every quarter of an hour, so that reading does not write.
 */
import type { RequestHandler } from 'express';
import expressSession from 'express-session';
import passport from 'passport';
import type { Person } from '../../shared/contracts/session';
import type { Database } from '../models/database';
import { personById } from '../services/people';
import type { SessionStore } from './session-store';

export const SESSION_COOKIE = 'leafwright.session';
export const IDLE_LIMIT = 8 * 60 * 60 * 1000;
export const SESSION_LIMIT = 24 * 60 * 60 * 1000;
export const RENEW_AFTER = 15 * 60 * 1000;

declare module 'express-session' {
  interface SessionData {
    /** Milliseconds since 1970. */
    signedInAt: number;
    renewedAt: number;
  }
}

declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace -- the only way to type `request.user`
  namespace Express {
    // eslint-disable-next-line @typescript-eslint/no-empty-object-type -- merged into the framework's own type
    interface User extends Person {}
  }
}

export const hasEnded = (session: { signedInAt: number; renewedAt: number }, now: number): boolean =>
  now - session.renewedAt >= IDLE_LIMIT || now - session.signedInAt >= SESSION_LIMIT;

/** The store sweeps up ended sessions only now and then: one that is over is refused here, and renewed where it is not. */
const limits =
  (now: () => Date): RequestHandler =>
  (request, _response, next) => {
    const { signedInAt, renewedAt } = request.session;
    if (signedInAt === undefined || renewedAt === undefined) {
      next();
      return;
    }
    const time = now().getTime();
    if (hasEnded({ signedInAt, renewedAt }, time)) {
      request.session.regenerate(next);
      return;
    }
    if (time - renewedAt >= RENEW_AFTER) request.session.renewedAt = time;
    next();
  };

export function sessions(options: { secret: string; store: SessionStore; database: Database; now: () => Date }): {
  handlers: RequestHandler[];
  passport: passport.Authenticator;
} {
  const authenticator = new passport.Passport();
  authenticator.serializeUser<string>((person, done) => done(null, person.id));
  authenticator.deserializeUser<string>((id, done) => {
    personById(options.database, id).then((person) => done(null, person ?? false), done);
  });
  const handlers: RequestHandler[] = [
    expressSession({
      name: SESSION_COOKIE,
      secret: options.secret,
      store: options.store,
      resave: false,
      saveUninitialized: false,
      // 'auto': a shop network may be plain HTTP; behind HTTPS the cookie stays on HTTPS.
      cookie: { httpOnly: true, sameSite: 'lax', secure: 'auto', maxAge: IDLE_LIMIT, path: '/' },
    }),
    limits(options.now),
    authenticator.session() as RequestHandler,
  ];
  return { handlers, passport: authenticator };
}
