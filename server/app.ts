import path from 'node:path';
import express, { type Express, type NextFunction, type Request, type Response } from 'express';
import helmet from 'helmet';
import type pg from 'pg';
import { passport } from './authentication/passport.ts';
import { AppError } from './errors.ts';
import { answerErrors } from './middleware/answer-errors.ts';
import { compress } from './middleware/compress.ts';
import { logRequests } from './middleware/log-requests.ts';
import { requireCsrfToken } from './middleware/csrf.ts';
import { rateLimits } from './middleware/rate-limits.ts';
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

function answerNotFound(): never {
  throw new AppError('not-found');
}

/** Answers are somebody's and of the moment; a tile, which is neither, says otherwise itself. */
function notKept(_req: Request, res: Response, next: NextFunction): void {
  res.set('Cache-Control', 'no-store');
  next();
}

/** The built client and the basemap, and the client's page for every address that is not an API's. */
function servePages(app: Express, root: string): void {
  const client = path.join(root, 'dist', 'client');
  app.use('/tiles', express.static(path.join(root, 'public', 'tiles')), answerNotFound);
  // a page that is older than the build must not take the client's page for a part of its program
  const parts = express.static(path.join(client, 'assets'), { immutable: true, maxAge: '1y' });
  app.use('/assets', parts, answerNotFound);
  app.use(express.static(client, { index: false, maxAge: '1h' }));
  app.get(['/favicon.ico', '/favicon.svg'], (_req, res) => {
    res.set('Cache-Control', 'public, max-age=86400');
    res.sendFile('mark.svg', { root: path.join(root, 'src', 'theme'), cacheControl: false });
  });
  app.get('/robots.txt', (_req, res) => {
    res.type('text/plain').send('User-agent: *\nDisallow: /\n');
  });
  app.get('/{*page}', (_req, res) => {
    res.set('Cache-Control', 'no-cache');
    // by its own name: a path through a folder whose name begins with a dot would be refused
    res.sendFile('index.html', { root: client });
  });
  app.use(answerNotFound);
}

/** Builds the application; `pool` holds the sessions, `root` the built client. */
export function createApp(services: Services, pool: pg.Pool, root: string): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', services.env.TRUST_PROXY);
  app.use(helmet({ contentSecurityPolicy: CONTENT_SECURITY_POLICY }));
  app.use(logRequests(services), compress());
  const api = express.Router();
  api.use(notKept, sessions(services.env, pool), passport.session());
  api.use(requireCsrfToken(services.env));
  app.use('/api', api);
  const limits = rateLimits(services.env);
  for (const route of ROUTES) {
    const limit = route.limit === undefined ? [] : limits[route.limit];
    const readBody = express.json({ limit: route.bodyLimit });
    app[route.method](route.path, readBody, ...limit, handlerOf(route, services));
  }
  app.use('/api', answerNotFound);
  servePages(app, root);
  app.use(answerErrors(services));
  return app;
}
