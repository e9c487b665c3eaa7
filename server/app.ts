import { randomUUID } from 'node:crypto';
import compression from 'compression';
import express, { type Express } from 'express';
import passport from 'passport';
import { pinoHttp } from 'pino-http';
import { Problem } from '@/shared/problems/problems';
import type { Deps } from './deps';
import { answerProblem } from './http/answer-problem';
import { clientFiles } from './http/client-files';
import { securityHeaders } from './http/headers';
import { loggedError } from './http/logger';
import { mount } from './http/mount';
import { openApiOf } from './http/openapi';
import { rateLimits } from './http/rate-limit';
import { currentPerson, sessions } from './http/session';
import { timeBudget } from './http/time-budget';
import { csrfToken, fromOwnPages } from './http/trust';
import { healthRoutes } from './modules/health/router';
import { allRoutes } from './routes';

/** The whole program over HTTP, from what it is handed. */
export function createApp(deps: Deps): Express {
  const { config } = deps;
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', config.TRUST_PROXY ? 1 : false);
  app.set('query parser', 'simple');
  app.use(
    pinoHttp({
      logger: deps.logger,
      genReqId: () => randomUUID(),
      autoLogging: { ignore: (request) => !request.url?.startsWith('/api/') },
      serializers: {
        err: loggedError,
        req: (request: { id: string; method: string; url: string }) => ({
          id: request.id,
          method: request.method,
          path: request.url.split('?')[0],
        }),
      },
    }),
  );
  app.use((request, response, next) => {
    response.setHeader('x-request-id', String(request.id));
    next();
  });
  app.use(securityHeaders(config));
  app.use(compression());
  app.use('/api', api(deps));
  app.use(clientFiles(config.CLIENT_DIR));
  app.use(() => {
    throw new Problem('not found');
  });
  app.use(answerProblem(deps));
  return app;
}

function api(deps: Deps): express.Router {
  const router = express.Router();
  const routes = allRoutes(deps, rateLimits(deps.pool));
  router.use((_request, response, next) => {
    response.setHeader('cache-control', 'no-store');
    next();
  });
  router.use(timeBudget(deps.config.REQUEST_SECONDS));
  router.get('/openapi.json', (_request, response) => {
    response.json(openApiOf(routes));
  });
  // Asked by machines every few seconds: no session for it.
  router.use(mount(healthRoutes, deps));
  router.use(fromOwnPages(deps.config.PUBLIC_URL));
  router.use(sessions(deps), passport.session(), currentPerson(deps), csrfToken);
  router.use(express.json({ limit: '1mb', strict: true }));
  router.use(
    mount(
      routes.filter((route) => !healthRoutes.includes(route)),
      deps,
    ),
  );
  return router;
}
