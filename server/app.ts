import compression from 'compression';
import express, { type Express } from 'express';
import type { Dependencies } from './dependencies';
import { errorHandler } from './errors/error-handler';
import { sendProblem } from './errors/problem';
import { ROUTES } from './routes';
import { createLimits } from './routes/limits';
import { createRequestReader } from './routes/read-request';
import { serveRoute } from './routes/serve-route';
import { verifyCredentials } from './services/session/verify-credentials';
import { refuseForgedRequests } from './session/forgery';
import { createSessions, type Sessions } from './session/sessions';
import { securityHeaders } from './static/security-headers';
import { serveClient } from './static/serve-client';

/** The application without a port, and how to end what it keeps running. */
export interface Application {
  readonly app: Express;
  /** Stops timers; the database stays open. */
  readonly stop: () => void;
}

/** Puts the application together out of what it depends on. */
export function createApp(dependencies: Dependencies): Application {
  const { config, log } = dependencies;
  const sessions = createSessions(dependencies, verifyCredentials);
  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  app.set('trust proxy', config.trustedProxies);
  app.use(securityHeaders(config));
  app.use(compression());
  mountApi(app, dependencies, sessions);
  app.use(serveClient(config.clientDirectory));
  app.use(errorHandler(config, log));
  return { app, stop: sessions.stop };
}

/** Order matters: who is it, does the request come from here, then the routes of the register. */
function mountApi(app: Express, dependencies: Dependencies, sessions: Sessions): void {
  const limits = createLimits(dependencies.config);
  const readRequest = createRequestReader(dependencies.config);
  app.use('/api', (_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  app.use('/api', ...sessions.handlers, refuseForgedRequests(dependencies));
  for (const route of ROUTES) {
    const limiters = route.limit === null ? [] : [limits[route.limit]];
    const serve = serveRoute(route, {
      dependencies,
      readRequest,
      sessionOf: sessions.sessionOf,
    });
    app[route.method](route.path, ...limiters, serve);
  }
  app.use('/api', (_request, response) => {
    sendProblem(response, { code: 'notFound' });
  });
}
