import type { RequestHandler } from 'express';
import session from 'express-session';
import type pg from 'pg';
import { SessionStore } from '../authentication/session-store.ts';
import type { Env } from '../env.ts';

const SESSION_COOKIE = 'groundsill';
const TWELVE_HOURS = 12 * 60 * 60 * 1000;

/** Sessions in PostgreSQL; the cookie is out of reach of scripts and of other sites. */
export function sessions({ SESSION_SECRET, PUBLIC_URL }: Env, pool: pg.Pool): RequestHandler {
  return session({
    name: SESSION_COOKIE,
    secret: SESSION_SECRET,
    store: new SessionStore({ pool, tableName: 'sessions', pruneSessionInterval: 900 }),
    resave: false,
    saveUninitialized: false,
    rolling: true,
    cookie: {
      httpOnly: true,
      sameSite: 'lax',
      secure: PUBLIC_URL.startsWith('https:'),
      maxAge: TWELVE_HOURS,
    },
  });
}
