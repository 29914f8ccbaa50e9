import express, { type Express } from 'express';
import helmet from 'helmet';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';
import { answerProblem } from './http/answer-problem.ts';
import type { ContextParts } from './http/context.ts';
import { limitTries } from './http/limit-tries.ts';
import { mountRoutes } from './http/mount.ts';
import { Problem } from './http/problem.ts';
import { refuseForgedRequests, sessionLayers } from './http/session.ts';
import { contentPolicy } from './http/content-policy.ts';
import { findOpenPerson } from './features/people/service/find-settings.ts';
import { allRoutes } from './all-routes.ts';
import type { Settings } from './settings.ts';

/** Assembles the web application: sessions, routes with their rules, and the one place where failures are answered. */
export function makeApp(parts: ContextParts, settings: Settings, log: Logger) {
  const app: Express = express();
  app.disable('x-powered-by');
  app.set('trust proxy', settings.trustProxy);
  const sessions = sessionLayers(parts.database, {
    secret: settings.sessionSecret,
    secureCookies: settings.secureCookies,
    findPerson: (id) => findOpenPerson({ reader: parts.database }, id),
  });
  app.use(
    pinoHttp({
      logger: log,
      autoLogging: settings.logRequests,
      redact: ['req.headers.cookie', 'req.headers.authorization'],
    }),
  );
  app.use(helmet(contentPolicy(settings)));
  app.use(['/api/session', '/api/invitations', '/api/password-links', '/api/me/password'], limitTries());
  app.use('/api', express.json({ limit: '1mb' }), ...sessions, refuseForgedRequests, mountRoutes(allRoutes, parts));
  app.use('/api/{*rest}', () => {
    throw new Problem('not-found', 'Nothing here under this address.');
  });
  return { app, sessions };
}

/** Put on last, after whatever serves the pages. */
export { answerProblem };
