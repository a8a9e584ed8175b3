/** Session: who is signed in, signing in and out. */
import type { Request, Response } from 'express';
import type passportModule from 'passport';
import { Strategy } from 'passport-local';
import { type Person, type Session, sessionSchema, signInSchema } from '../../shared/contracts/session';
import type { Csrf } from '../middleware/csrf';
import { ProblemError } from '../middleware/problem';
import { SESSION_COOKIE } from '../middleware/session';
import type { SignInGuard } from '../middleware/sign-in-limits';
import type { Database } from '../models/database';
import { personByPassword } from '../services/people';
import { describeShop } from '../services/shop';
import { type Operation, operation } from '../operation';

interface SessionDeps {
  readonly database: Database;
  readonly passport: InstanceType<typeof passportModule.Passport>;
  readonly csrf: Csrf;
  readonly guard: SignInGuard;
  readonly version: string;
  readonly now: () => Date;
}

export function sessionRoutes({ database, passport, csrf, guard, version, now }: SessionDeps): Operation[] {
  passport.use(
    new Strategy({ usernameField: 'email', session: true }, (email, password, done) => {
      personByPassword(database, email, password).then((person) => done(null, person ?? false), done);
    }),
  );

  const authenticate = (request: Request, response: Response): Promise<Person | null> =>
    new Promise((resolve, reject) => {
      const decided = (error: unknown, person: Person | false | null): void => {
        if (error) reject(error as Error);
        else resolve(person || null);
      };
      (passport.authenticate('local', decided) as (...call: unknown[]) => void)(request, response, reject);
    });

  const describe = async (request: Request, response: Response): Promise<Session> => ({
    person: request.user ?? null,
    shop: await describeShop(database),
    csrfToken: csrf.issue(request, response),
    version,
  });

  return [
    operation({
      method: 'get',
      path: '/api/session',
      access: 'anybody',
      summary: 'Who is signed in, to which shop, and the token for changing requests.',
      answer: { status: 200, says: 'The session; `person` is null for a visitor.', schema: sessionSchema },
      async handle({ request, response }) {
        response.json(await describe(request, response));
      },
    }),
    operation({
      method: 'post',
      path: '/api/session',
      access: 'anybody',
      summary: 'Sign in.',
      body: signInSchema,
      bodyLimit: 16 * 1024,
      answer: { status: 200, says: 'Signed in, with a new token.', schema: sessionSchema },
      refuses: ['wrongCredentials', 'tooManyAttempts', 'unavailable'],
      async handle({ body: { email }, request, response }) {
        const who = { email, address: request.ip ?? 'unknown' };
        const person = await guard.attempt(who, () => authenticate(request, response));
        if (!person) throw new ProblemError('wrongCredentials');
        // A new session id at every sign-in: one that somebody planted before is worth nothing after it.
        await new Promise<void>((resolve, reject) => {
          request.logIn(person, (error: unknown) => (error ? reject(error as Error) : resolve()));
        });
        request.session.signedInAt = request.session.renewedAt = now().getTime();
        response.json(await describe(request, response));
      },
    }),
    operation({
      method: 'delete',
      path: '/api/session',
      access: 'anybody',
      summary: 'Sign out.',
      answer: { status: 200, says: 'Signed out, with a visitor’s token.', schema: sessionSchema },
      async handle({ request, response }) {
        await new Promise<void>((resolve, reject) => {
          request.session.destroy((error: unknown) => (error ? reject(error as Error) : resolve()));
        });
        request.user = undefined;
        response.clearCookie(SESSION_COOKIE, { path: '/' });
        response.json(await describe(request, response));
      },
    }),
  ];
}
