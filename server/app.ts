import type { OpenDatabase } from '@drizzle/database';
import compression from 'compression';
import express, { type Express, type RequestHandler, type Router } from 'express';
import type { Logger } from 'pino';
import { mountSession } from './accounts/session-router';
import { createPassport } from './accounts/sign-in';
import { API_ROUTES } from './api-routes';
import { mountBundles } from './bundles/bundles-router';
import { mountCommissions } from './commissions/commissions-router';
import type { Config } from './config';
import { createCsrfGuard } from './http/csrf';
import { answerError, noSuchRoute } from './http/errors';
import { mountEvents } from './events/events-router';
import type { LiveLayouts } from './events/live-layouts';
import { healthOf } from './http/health-store';
import { openApiDocument } from './http/openapi';
import { signInLimits } from './http/rate-limit';
import { requestLog } from './http/request-log';
import { mountOn } from './http/route';
import { securityHeaders } from './http/security-headers';
import { sessions } from './http/session';
import { appStatics } from './http/statics';
import { mountLayouts } from './layouts/layouts-router';
import { mountPictures } from './pictures/pictures-router';
import { mountVersions } from './versions/versions-router';

export interface AppDependencies {
  readonly config: Config;
  readonly open: OpenDatabase;
  readonly logger: Logger;
  readonly live: LiveLayouts;
}

/** The whole server as one request handler; it listens nowhere yet. */
export function createApp(dependencies: AppDependencies): Express {
  const { config, logger } = dependencies;
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', config.trustProxy);
  app.use(requestLog(logger), securityHeaders(), compression());
  app.use('/api', api(dependencies));
  app.use(appStatics(config.appFolder));
  app.use(noSuchRoute, answerError);
  return app;
}

function api({ config, open, logger, live }: AppDependencies): Router {
  const router = express.Router();
  router.use((_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  router.get('/health', async (_request, response) => {
    const health = await healthOf(open.database);
    response.status(health.status === 'ok' ? 200 : 503).json(health);
  });
  const document = openApiDocument(API_ROUTES);
  router.get('/openapi.json', (_request, response) => {
    response.json(document);
  });

  const passport = createPassport(open.database);
  const csrf = createCsrfGuard(config.sessionSecret);
  router.use(sessions(config, open.pool, logger));
  router.use(passport.session() as RequestHandler, (request, response, next) => {
    csrf.hand(request, response);
    next();
  });
  const mount = mountOn(router, csrf);
  mountSession(mount, passport, signInLimits(open.database));
  mountCommissions(mount, open.database);
  mountLayouts(mount, open.database);
  mountEvents(mount, { database: open.database, live, logger });
  mountPictures(mount);
  mountVersions(mount, open.database);
  mountBundles(mount, open.database);
  router.use(noSuchRoute);
  return router;
}
