import { createHash, randomBytes } from 'node:crypto';

/** What a link carries: 256 bits that nobody guesses. */
export function newLinkToken(): string {
  return randomBytes(32).toString('base64url');
}

/** What is kept of it. It is random already, so neither salt nor cost is called for. */
export function linkTokenHash(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
