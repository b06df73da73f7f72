import { z } from 'zod';

/**
 * How long passwords and e-mail addresses may be.
 *
 * Units: characters. Valid: read only. Source: [own].
 */
export const PASSWORD_LIMITS = { shortest: 12, longest: 200, email: 254 } as const;

/**
 * An e-mail address, in small letters: capitals make no other person.
 *
 * Units: none. Valid: one address without a name. Source: [own].
 */
export const emailSchema = z
  .string()
  .trim()
  .toLowerCase()
  .max(PASSWORD_LIMITS.email, 'This is too long for an e-mail address.')
  .pipe(z.email('Type an e-mail address, such as name@example.org.'));

/**
 * A password that somebody chooses.
 *
 * Units: none. Valid: 12 to 200 characters; that it is not the e-mail address, isOwnEmail tells.
 * Source: [own].
 */
export const newPasswordSchema = z
  .string()
  .min(PASSWORD_LIMITS.shortest, `Use at least ${PASSWORD_LIMITS.shortest} characters.`)
  .max(PASSWORD_LIMITS.longest, `Use at most ${PASSWORD_LIMITS.longest} characters.`);

/**
 * Whether a password is the person's own e-mail address, which others know.
 *
 * Units: none. Valid: any text; capitals and spaces around make no difference. Source: [own].
 */
export function isOwnEmail(password: string, email: string): boolean {
  return password.trim().toLowerCase() === email.trim().toLowerCase();
}
