import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { z } from 'zod';
import type { Env } from '../env.ts';
import { AppError } from '../errors.ts';

const QUARTER_HOUR = 15 * 60 * 1000;
/** Behind one IP address there may be a whole office. */
const PEOPLE_BEHIND_AN_IP = 10;

/** What is limited: a route names one. */
export type RateLimitName = 'sign-in' | 'letter' | 'link' | 'own-password';

const withEmail = z.object({ email: z.string() });

function byIp({ ip }: Request): string {
  return ipKeyGenerator(ip ?? '');
}

function byIpAndEmail(req: Request): string {
  const body = withEmail.safeParse(req.body);
  const email = body.success ? body.data.email.trim().toLowerCase().slice(0, 254) : '';
  return `${byIp(req)} ${email}`;
}

function byPerson(req: Request): string {
  return req.user?.id ?? byIp(req);
}

/** How long to wait, of the seconds that the answer's head names. */
function waitInWords(seconds: string | undefined): string | undefined {
  const minutes = Math.ceil(Number(seconds ?? NaN) / 60);
  if (!(minutes > 0)) return undefined;
  return `Too many tries. Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`}.`;
}

function limiter(
  limit: number,
  keyGenerator: (req: Request) => string,
  skipSuccessfulRequests: boolean,
): RequestHandler {
  return rateLimit({
    windowMs: QUARTER_HOUR,
    limit,
    keyGenerator,
    skipSuccessfulRequests,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: (_req, res, next) => {
      next(new AppError('too-many-requests', waitInWords(res.get('Retry-After'))));
    },
  });
}

/** Counters for one application; tries that succeed do not count, except letters. */
export function rateLimits({
  RATE_LIMIT,
}: Pick<Env, 'RATE_LIMIT'>): Readonly<Record<RateLimitName, readonly RequestHandler[]>> {
  const many = RATE_LIMIT * PEOPLE_BEHIND_AN_IP;
  return {
    'sign-in': [limiter(many, byIp, true), limiter(RATE_LIMIT, byIpAndEmail, true)],
    letter: [limiter(many, byIp, false), limiter(RATE_LIMIT, byIpAndEmail, false)],
    link: [limiter(many, byIp, true)],
    'own-password': [limiter(RATE_LIMIT, byPerson, true)],
  };
}
