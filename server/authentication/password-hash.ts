import { randomBytes } from 'node:crypto';
import { hash, verify } from '@node-rs/argon2';

/** argon2id, the library's default, at the least cost that OWASP asks for. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password, COST);
}

/** Stands in where there is no hash, so that the answer takes as long as for a wrong password. */
const DUMMY = hashPassword(randomBytes(24).toString('base64url'));

/** Whether a password is right; never without a hash, and no sooner. */
export async function isRightPassword(
  passwordHash: string | null | undefined,
  password: string,
): Promise<boolean> {
  const matches = await verify(passwordHash ?? (await DUMMY), password);
  return matches && typeof passwordHash === 'string';
}
