/** The web server's middleware, in order. Takes what it works with, so that tests drive the very same app. */
import compression from 'compression';
import express, { type Express } from 'express';
import type { Logger } from 'pino';
import { csrf } from './middleware/csrf';
import { errorHandler, notFound } from './middleware/error-handler';
import { readableUrl } from './middleware/readable-url';
import { requestLog } from './middleware/request-log';
import { securityHeaders } from './middleware/security-headers';
import { sessions } from './middleware/session';
import { SessionStore } from './middleware/session-store';
import { SIGN_IN_LIMITS, signInGuard, type SignInLimits } from './middleware/sign-in-limits';
import type { Database } from './models/database';
import { appFiles } from './routes/app-files';
import { healthRoutes } from './routes/health';
import { mount } from './routes/mount';
import { openapiRoutes } from './routes/openapi';
import { partRoutes } from './routes/parts';
import { revisionRoutes } from './routes/revisions';
import { sessionRoutes } from './routes/session';
import { solveRoutes } from './routes/solve';

export interface AppDeps {
  readonly database: Database;
  readonly secret: string;
  readonly log: Logger;
  readonly version: string;
  /** Folder of the built app; the API works without it. */
  readonly appFolder: string;
  readonly trustedProxies: number;
  readonly now: () => Date;
  readonly signInLimits?: SignInLimits;
}

export interface App {
  readonly express: Express;
  /** Ends the clocks by which sessions and failed sign-ins are swept up. */
  readonly stop: () => void;
}

export function createApp(deps: AppDeps): App {
  const { database, secret, version, now } = deps;
  const app = express();
  app.disable('x-powered-by');
  // Answers of the API are never kept, so there is nothing to compare.
  app.disable('etag');
  app.set('trust proxy', deps.trustedProxies);
  app.set('case sensitive routing', true);

  app.use(requestLog(deps.log));
  app.use(...securityHeaders);
  app.use(compression());
  app.use(readableUrl);

  const store = new SessionStore(database);
  const { handlers, passport } = sessions({ secret, store, database, now });
  const tokens = csrf(secret);
  app.use('/api', (_request, response, next) => {
    response.setHeader('Cache-Control', 'no-store');
    next();
  });
  app.use('/api', ...handlers);

  const guard = signInGuard(deps.signInLimits ?? SIGN_IN_LIMITS);
  const operations = [
    ...healthRoutes(database),
    ...sessionRoutes({ database, passport, csrf: tokens, guard, version, now }),
    ...partRoutes(database, now),
    ...revisionRoutes(database, now),
    ...solveRoutes(),
  ];
  app.use(mount([...operations, ...openapiRoutes(operations, version)], tokens.check));
  app.use('/api', notFound);

  for (const handler of appFiles(deps.appFolder)) app.use(handler);
  app.use(notFound);
  app.use(errorHandler);
  const stop = (): void => {
    store.stopExpiringSessions();
    guard.stop();
  };
  return { express: app, stop };
}
