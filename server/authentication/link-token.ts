import { createHash, createHmac } from 'node:crypto';
import type { Env } from '../env.ts';

/**
 * What a link carries: 256 bits that nobody guesses who does not know the server's secret. It is made of the
 * link's number, so that a letter that waits to be sent need not hold it.
 */
function linkToken({ SESSION_SECRET }: Pick<Env, 'SESSION_SECRET'>, linkId: string): string {
  return createHmac('sha256', SESSION_SECRET).update(`link ${linkId}`).digest('base64url');
}

/** What is kept of it. It is random to others, so neither salt nor cost is called for. */
export function linkTokenHash(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}

/** A link's address and what is kept of it. */
export function linkAddress(
  env: Pick<Env, 'SESSION_SECRET' | 'PUBLIC_URL'>,
  linkId: string,
): { readonly url: string; readonly tokenHash: string } {
  const token = linkToken(env, linkId);
  return {
    url: new URL(`/links/${token}`, env.PUBLIC_URL).href,
    tokenHash: linkTokenHash(token),
  };
}
