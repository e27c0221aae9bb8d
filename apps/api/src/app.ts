import express from 'express';
import type { Express } from 'express';
import type { Logger } from 'pino';
import { airflowRoutes } from './features/airflow/airflow-routes';
import { capacityRoutes } from './features/capacity/capacity-routes';
import { evaluationsRoutes } from './features/evaluations/evaluations-routes';
import { healthRoutes } from './features/health/health-routes';
import type { HealthDeps } from './features/health/health-routes';
import { openApiRoutes } from './features/openapi/openapi-routes';
import { psychrometricsRoutes } from './features/psychrometrics/psychrometrics-routes';
import { refrigerantsRoutes } from './features/refrigerants/refrigerants-routes';
import { sourcesRoutes } from './features/sources/sources-routes';
import { signInRoutes } from './features/sign-in/sign-in-routes';
import type { SignInDeps } from './features/sign-in/sign-in-service';
import { weighInRoutes } from './features/weigh-in/weigh-in-routes';
import { guard } from './http/access';
import { compress } from './http/compress';
import { limitEvaluations, limitRate } from './http/limits';
import type { Limits } from './http/limits';
import { openCors } from './http/open-cors';
import { notFound, problemHandler } from './http/problem-handler';
import { requestLog } from './http/request-log';
import { securityHeaders } from './http/security';
import { staticFiles } from './http/static-files';

export interface AppDeps extends HealthDeps, SignInDeps {
  readonly logger: Logger;
  readonly limits: Limits;
  readonly trustProxy: boolean | number | string;
  readonly secure: boolean;
  readonly webRoot: string;
  readonly publicUrl: string | undefined;
}

/** Routes that answer any origin. */
const OPEN_ROUTES = [
  '/api/v1/evaluations',
  '/api/v1/airflow',
  '/api/v1/capacity',
  '/api/v1/weigh-in',
  '/api/v1/refrigerants',
  '/api/v1/psychrometrics',
  '/api/v1/sources',
  '/api/v1/openapi.json',
  '/healthz',
  '/readyz',
];

/** The whole server, without a socket. */
export function createApp(deps: AppDeps): Express {
  const { logger, limits, trustProxy, secure, webRoot } = deps;
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', trustProxy);
  app.use(requestLog(logger));
  app.use(...securityHeaders({ secure }));
  app.use(compress);
  app.use(OPEN_ROUTES, openCors);
  app.use('/api', limitRate(limits), guard(deps));
  const limit = limitEvaluations(limits);
  app.use(evaluationsRoutes(limit));
  app.use(airflowRoutes(limit));
  app.use(capacityRoutes(limit));
  app.use(weighInRoutes(limit));
  app.use(refrigerantsRoutes());
  app.use(psychrometricsRoutes());
  app.use(sourcesRoutes());
  app.use(openApiRoutes());
  app.use(signInRoutes(deps));
  app.use('/api', notFound);
  app.use(healthRoutes(deps));
  app.use(staticFiles(webRoot));
  app.use(notFound);
  app.use(problemHandler);
  return app;
}
