import path from 'node:path';
import express, { type Express } from 'express';
import helmet from 'helmet';
import passport from 'passport';
import type pg from 'pg';
import { pinoHttp } from 'pino-http';
import { AppError } from './errors.ts';
import { answerErrors } from './middleware/answer-errors.ts';
import { requireCsrfToken } from './middleware/csrf.ts';
import { sessions } from './middleware/sessions.ts';
import { handlerOf } from './routes/define-route.ts';
import { ROUTES } from './routes/index.ts';
import type { Services } from './services.ts';

const CONTENT_SECURITY_POLICY = {
  useDefaults: false,
  directives: {
    defaultSrc: ["'self'"],
    baseUri: ["'none'"],
    connectSrc: ["'self'"],
    fontSrc: ["'self'", 'data:'],
    formAction: ["'self'"],
    frameAncestors: ["'none'"],
    imgSrc: ["'self'", 'data:', 'blob:'],
    objectSrc: ["'none'"],
    scriptSrc: ["'self'"],
    styleSrc: ["'self'"],
    workerSrc: ["'self'"],
  },
};

/** The built client and the basemap, and the client's page for every address that is not an API's. */
function servePages(app: Express, root: string): void {
  const client = path.join(root, 'dist', 'client');
  app.use('/tiles', express.static(path.join(root, 'public', 'tiles'), { fallthrough: false }));
  app.use(express.static(client, { index: false, maxAge: '1h' }));
  app.get('/{*page}', (_req, res) => {
    res.sendFile(path.join(client, 'index.html'));
  });
}

/** Builds the application; `pool` holds the sessions, `root` the built client. */
export function createApp(services: Services, pool: pg.Pool, root: string): Express {
  const app = express();
  app.disable('x-powered-by');
  app.use(helmet({ contentSecurityPolicy: CONTENT_SECURITY_POLICY }));
  app.use(pinoHttp({ logger: services.logger }));
  const api = express.Router();
  api.use(sessions(services.env, pool), passport.session(), requireCsrfToken);
  api.use(express.json({ limit: '256kb' }));
  app.use('/api', api);
  for (const route of ROUTES) {
    app[route.method](route.path, ...route.before, handlerOf(route, services));
  }
  app.use('/api', () => {
    throw new AppError('not-found');
  });
  servePages(app, root);
  app.use(answerErrors(services));
  return app;
}
