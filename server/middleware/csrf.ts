import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto';
import type { NextFunction, Request, RequestHandler, Response } from 'express';
import type { Env } from '../env.ts';
import { AppError } from '../errors.ts';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);
const VISITOR_COOKIE = 'groundsill-visitor';
const VISITOR = new RegExp(`(?:^|;\\s*)${VISITOR_COOKIE}=([\\w-]{32})(?:;|$)`);

type Secrets = Pick<Env, 'SESSION_SECRET' | 'PUBLIC_URL'>;

function visitorOf(req: Request): string | undefined {
  return VISITOR.exec(req.headers.cookie ?? '')?.[1];
}

/** The token of a visitor's cookie: nobody makes one without the secret. */
function tokenOfVisitor(visitor: string, { SESSION_SECRET }: Secrets): string {
  return createHmac('sha256', SESSION_SECRET).update(`visitor ${visitor}`).digest('base64url');
}

/** Whoever is not signed in gets a cookie instead of a session, so that looking in leaves nothing behind. */
function visitorToken(req: Request, res: Response, secrets: Secrets): string {
  const visitor = visitorOf(req) ?? randomBytes(24).toString('base64url');
  const secure = secrets.PUBLIC_URL.startsWith('https:');
  if (!secure || req.secure) {
    res.cookie(VISITOR_COOKIE, visitor, { httpOnly: true, sameSite: 'lax', secure });
  }
  return tokenOfVisitor(visitor, secrets);
}

/** The token that the next change must carry: the session's, or the visitor's before there is one. */
export function csrfTokenOf(req: Request, res: Response, secrets: Secrets): string {
  if (req.user !== undefined) req.session.csrfToken ??= randomBytes(24).toString('base64url');
  return req.session.csrfToken ?? visitorToken(req, res, secrets);
}

function same(given: string, wanted: string): boolean {
  const [a, b] = [Buffer.from(given), Buffer.from(wanted)];
  return a.length === b.length && timingSafeEqual(a, b);
}

/** Whatever changes something must carry the token, which another site cannot read. */
export function requireCsrfToken(secrets: Secrets): RequestHandler {
  return (req: Request, _res: Response, next: NextFunction) => {
    if (SAFE.has(req.method)) {
      next();
      return;
    }
    const visitor = visitorOf(req);
    const ofVisitor = visitor === undefined ? undefined : tokenOfVisitor(visitor, secrets);
    const wanted = req.session.csrfToken ?? ofVisitor;
    const given = req.get('x-csrf-token');
    if (wanted === undefined || given === undefined || !same(given, wanted)) {
      throw new AppError('csrf-failed');
    }
    next();
  };
}
