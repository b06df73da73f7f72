import { z } from 'zod';
import { emailSchema, newPasswordSchema, PASSWORD_LIMITS } from './passwords.ts';

const givenPassword = z.string().min(1, 'Type your password.').max(PASSWORD_LIMITS.longest);

/**
 * What signing in asks for.
 *
 * Units: none. Valid: any address and password; whether they are right is for the server to say.
 * Source: [own].
 */
export const signInSchema = z.strictObject({ email: emailSchema, password: givenPassword });

/**
 * A change of one's own password.
 *
 * Units: none. Valid: the new one keeps to the rules of newPasswordSchema. Source: [own].
 */
export const changePasswordSchema = z.strictObject({
  currentPassword: givenPassword,
  newPassword: newPasswordSchema,
});

/**
 * Who is signed in, if anybody, and what the client needs to go on.
 *
 * Units: none. Valid: csrfToken until the next sign-in or sign-out; demo where demo people and the
 * mailbox are there. Source: [own].
 */
export const sessionSchema = z.strictObject({
  csrfToken: z.string(),
  person: z
    .strictObject({
      id: z.uuid(),
      name: z.string(),
      email: z.string(),
      isAdministrator: z.boolean(),
    })
    .nullable(),
  demo: z.boolean(),
});

/**
 * Who is signed in, as the server answers.
 *
 * Units: as sessionSchema. Valid: parsed by it. Source: [own].
 */
export type SessionAnswer = z.infer<typeof sessionSchema>;
