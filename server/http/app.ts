import express, { Router, type Express } from 'express';
import helmet from 'helmet';
import { BASE_PATH } from '#shared/api/endpoint.ts';
import type { Services } from '../services.ts';
import { compressAnswers } from './compress.ts';
import { mountConsole } from './console.ts';
import { mountHealth } from './health-pages.ts';
import { mountDocumentation } from './documentation.ts';
import { attitudeRoutes } from './routes/attitude.ts';
import { conventionRoutes } from './routes/conventions.ts';
import { healthRoutes } from './routes/health.ts';
import { historyRoutes } from './routes/history.ts';
import { keyRoutes } from './routes/keys.ts';
import { sessionRoutes } from './routes/sessions.ts';
import { runRoutes } from './routes/runs.ts';
import { usageRoutes } from './routes/usage.ts';
import { contentSecurityPolicy } from './security-policy.ts';
import { mountUnmatched } from './unmatched.ts';

/** The application without a listening socket: the API, its documentation, and the console. */
export function createApp(services: Services): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('etag', false);
  app.set('query parser', 'simple');
  app.use(helmet({ contentSecurityPolicy: contentSecurityPolicy(services.config.publicUrl), strictTransportSecurity: services.config.publicUrl.protocol === 'https:' }));
  app.use(compressAnswers());

  const api = Router({ caseSensitive: true, strict: true });
  api.use((_request, response, next) => {
    response.setHeader('Cache-Control', 'no-store');
    next();
  });
  for (const mountRoutes of [attitudeRoutes, conventionRoutes, keyRoutes, historyRoutes, runRoutes, usageRoutes, sessionRoutes, healthRoutes]) mountRoutes(services, api);
  mountUnmatched(services, api);
  app.use(BASE_PATH, api);

  mountHealth(app, services);
  mountDocumentation(app);
  mountConsole(app);
  return app;
}
