import { randomBytes, timingSafeEqual } from 'node:crypto';
import type { NextFunction, Request, Response } from 'express';
import { AppError } from '../errors.ts';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/** The token of a session, made when first asked for. */
export function csrfTokenOf(req: Request): string {
  req.session.csrfToken ??= randomBytes(24).toString('base64url');
  return req.session.csrfToken;
}

function same(given: string, wanted: string): boolean {
  const [a, b] = [Buffer.from(given), Buffer.from(wanted)];
  return a.length === b.length && timingSafeEqual(a, b);
}

/** Whatever changes something must carry the session's token, which another site cannot read. */
export function requireCsrfToken(req: Request, _res: Response, next: NextFunction): void {
  if (SAFE.has(req.method)) {
    next();
    return;
  }
  const { csrfToken } = req.session;
  const given = req.get('x-csrf-token');
  if (csrfToken === undefined || given === undefined || !same(given, csrfToken)) {
    throw new AppError('csrf-failed');
  }
  next();
}
