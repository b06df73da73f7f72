import compression from 'compression';
import type { Request, RequestHandler, Response } from 'express';

/** A large tile takes half a millisecond; more effort would save a twentieth. Brotli is at its 4 by itself. */
const LEVEL = 4;

/**
 * Answers that carry a secret: the CSRF token, or a single-use link in a letter. Compressed beside what a
 * stranger can put into a request, their length would give the secret away bit by bit.
 */
const SECRETIVE = /^\/api\/(?:sessions?|links|mailbox)(?:\/|$)/i;

/** Types that shrink and that the library does not know as such. */
const SHRINKING = /^application\/(?:x-protobuf|vnd\.mapbox-vector-tile|octet-stream)/;

function isWorthIt(req: Request, res: Response): boolean {
  const type = String(res.getHeader('Content-Type') ?? '');
  if (SECRETIVE.test(req.originalUrl.replace(/\?.*$/, ''))) return false;
  // events must leave at once, and a range counts bytes as they are stored
  if (type.startsWith('text/event-stream') || res.statusCode === 206) return false;
  return SHRINKING.test(type) || compression.filter(req, res);
}

/** Compresses what is sent, where it is worth it and the other side can read it. */
export function compress(): RequestHandler {
  return compression({ level: LEVEL, filter: isWorthIt });
}
