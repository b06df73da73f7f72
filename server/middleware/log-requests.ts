import type { RequestHandler } from 'express';
import type { SerializedRequest } from 'pino';
import { pinoHttp } from 'pino-http';
import type { Services } from '../services.ts';

/** An address as the log may hold it: who reads the log must not be able to use somebody's link. */
export function loggedUrl(url: string): string {
  return url.replace(/\/links\/[^/?#]+/, '/links/…');
}

/** Writes every request to the log. */
export function logRequests({ logger }: Pick<Services, 'logger'>): RequestHandler {
  return pinoHttp({
    logger,
    serializers: {
      req: (req: SerializedRequest) => ({ ...req, url: loggedUrl(req.url) }),
    },
  });
}
