import { randomUUID } from 'node:crypto';
import compression from 'compression';
import express, { type Express } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';
import { getHealth } from '../src/contracts/health';
import type { Services } from './composition';
import type { OpenDatabase } from './db/client';
import { pageRoutes, securityHeaders } from './http/pages';
import { problemHandler, ProblemError } from './http/problem';
import { route } from './http/route';
import { sameOriginOnly } from './http/same-origin';
import { sessions } from './http/session';
import { accountsRoutes } from './modules/accounts/accounts.routes';
import { createPassport } from './modules/accounts/passport';
import { createSessionRows } from './modules/accounts/sessions.repo';
import { estimatesRoutes } from './modules/estimates/estimates.routes';
import { ownersRoutes } from './modules/owners/owners.routes';
import { papersRoutes } from './modules/papers/papers.routes';
import { practiceRoutes } from './modules/practice/practice.routes';
import { restatementsRoutes } from './modules/restatements/restatements.routes';
import { setsRoutes } from './modules/sets/sets.routes';

export interface AppDeps {
  readonly database: OpenDatabase;
  readonly services: Services;
  readonly sessionSecret: string;
  readonly https: boolean;
  readonly now: () => number;
  readonly log: Logger;
  /** Folder of the built pages; null serves the interface for programs alone. */
  readonly pagesFolder: string | null;
  /** Whether every answer must fit its contract (tests and development). */
  readonly checkReplies: boolean;
}

/** The whole application as an Express app; it listens nowhere by itself. */
export function createApp(deps: AppDeps): Express {
  const { services } = deps;
  const app = express();
  app.disable('x-powered-by');
  app.set('query parser', 'simple');
  app.set('check replies', deps.checkReplies);
  if (deps.https) app.set('trust proxy', 'loopback');

  app.use(
    pinoHttp({ logger: deps.log, genReqId: () => randomUUID(), quietReqLogger: true, redact: ['req.headers.cookie'] }),
  );
  app.use(securityHeaders());
  app.use(compression());
  app.use('/api', sameOriginOnly, express.json({ limit: '256kb' }));

  // Open to anyone and without a session: nothing here reads who is asking.
  app.use(restatementsRoutes({ restatements: services.restatements }));
  const open = express.Router();
  route(open, getHealth, () => ({ status: 'ready' as const }));
  app.use(open);

  const passport = createPassport(services.accounts);
  app.use('/api', [
    sessions({
      rows: createSessionRows(deps.database.db),
      secret: deps.sessionSecret,
      secure: deps.https,
      now: deps.now,
    }),
    passport.initialize(),
    passport.session(),
  ]);
  app.use(accountsRoutes({ accounts: services.accounts, passport }));
  app.use(practiceRoutes({ practice: services.practice }));
  app.use(ownersRoutes({ owners: services.owners }));
  app.use(setsRoutes({ sets: services.sets }));
  app.use(estimatesRoutes({ estimates: services.estimates }));
  app.use(papersRoutes({ papers: services.papers }));
  app.use('/api', () => {
    throw new ProblemError('not-found', { detail: 'No such address.' });
  });

  if (deps.pagesFolder !== null) app.use(pageRoutes(deps.pagesFolder));
  app.use(problemHandler(deps.log));
  return app;
}
