import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { type Express } from 'express';
import { rateLimit } from 'express-rate-limit';
import {
  apiRouter,
  docsPage,
  healthRouter,
  openApiDocument,
  problemHandler,
  problemOf,
  requestLog,
  sendProblem,
  type ApiDependencies,
  type Config,
  type LiveHub,
} from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';
import { securityHeaders } from './security-headers';
import { serveApplications } from './serve-applications';
import type { House } from './house';

const VERSION = '0.1.0';

/** The HTTP server: security headers, the declared endpoints, health, live changes, webhooks, and the two applications. */
export function createServer(config: Config, house: House, dependencies: ApiDependencies, live: LiveHub): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', 'loopback');
  app.use(requestLog(dependencies.log), securityHeaders(config));
  app.use(healthRouter(dependencies.database, config.APP_DATABASE_URL));

  // Streams go past compression, which would hold them back.
  app.get('/api/v1/live', async (request, response) => {
    const caller = await dependencies.authenticate(request);
    if (!caller) throw new RefusalError({ code: 'not-signed-in', params: {} });
    live.attach(caller, request, response);
  });

  app.use(compression(), cookieParser());
  app.use(
    '/api',
    rateLimit({
      windowMs: 60_000,
      limit: config.REQUESTS_PER_MINUTE,
      standardHeaders: 'draft-8',
      legacyHeaders: false,
      handler: (request, response) =>
        sendProblem(response, problemOf(new RefusalError({ code: 'too-many', params: {} }), request.path)),
    }),
  );
  house.webhooks(app);
  app.use('/api/v1', apiRouter(house.implementations, dependencies));
  const endpoints = house.implementations.map(({ endpoint }) => endpoint);
  app.get('/api/openapi.json', (_request, response) => void response.json(openApiDocument(endpoints, VERSION)));
  app.get('/api/docs', (_request, response) => void response.type('html').send(docsPage(endpoints)));
  app.use('/api', () => {
    throw new RefusalError({ code: 'no-such-address', params: {} });
  });
  serveApplications(app, config);
  app.use(problemHandler(dependencies.log));
  return app;
}
