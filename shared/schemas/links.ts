import { z } from 'zod';
import { emailSchema, newPasswordSchema } from './passwords.ts';

const LINK_PURPOSES = ['invitation', 'password-reset'] as const;

/**
 * What a link sent by mail is for.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export type LinkPurpose = (typeof LINK_PURPOSES)[number];

/**
 * Whom to send a link for a new password.
 *
 * Units: none. Valid: any address; the answer does not say whether it is known. Source: [own].
 */
export const passwordResetSchema = z.strictObject({ email: emailSchema });

/**
 * The password that somebody with a link chooses.
 *
 * Units: none. Valid: as newPasswordSchema. Source: [own].
 */
export const useLinkSchema = z.strictObject({ password: newPasswordSchema });

/**
 * Whose link it is, for the page that asks for a password.
 *
 * Units: none. Valid: until the link is used or too old. Source: [own].
 */
export const linkSchema = z.strictObject({
  purpose: z.enum(LINK_PURPOSES),
  email: z.string(),
  name: z.string(),
});

/**
 * Whose link it is.
 *
 * Units: as linkSchema. Valid: parsed by it. Source: [own].
 */
export type LinkAnswer = z.infer<typeof linkSchema>;
