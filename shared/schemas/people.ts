import { z } from 'zod';
import { emailSchema } from './passwords.ts';
import { roleSchema } from './roles.ts';

const LIMITS = { name: 120, memberships: 100 } as const;

const name = z
  .string()
  .trim()
  .min(1, 'Say who it is.')
  .max(LIMITS.name, `Use at most ${LIMITS.name} characters.`)
  .regex(/^\P{Cc}*$/u, 'Write the name on one line.');

/**
 * A new person: an invitation goes to the address.
 *
 * Units: none. Valid: the address is nobody's yet and every scheme is there, checked by the server.
 * Source: [own].
 */
export const newPersonSchema = z.strictObject({
  name,
  email: emailSchema,
  isAdministrator: z.boolean().default(false),
  memberships: z
    .array(z.strictObject({ schemeId: z.uuid(), role: roleSchema }))
    .max(LIMITS.memberships)
    .default([]),
});

/**
 * A change of a person; what is left out stays.
 *
 * Units: none. Valid: one administrator who can sign in must remain; the address changes only while there
 * is no password. Source: [own].
 */
export const changePersonSchema = z.strictObject({
  name: name.optional(),
  email: emailSchema.optional(),
  isAdministrator: z.boolean().optional(),
});

/**
 * Keeps a person from signing in, or lets them in again.
 *
 * Units: none. Valid: not oneself, and not the last administrator. Source: [own].
 */
export const shutOutSchema = z.strictObject({ shutOut: z.boolean() });

/**
 * A person as the administrator sees them.
 *
 * Units: none. Valid: `invitedUntil` is when the open invitation ends, null without one; `letter` is how its
 * letter fares, with what the mail server last said to it; `shutOutAt` since when they may not sign in;
 * abilities are the server's answers. Source: [own].
 */
export const personSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  isAdministrator: z.boolean(),
  hasPassword: z.boolean(),
  invitedUntil: z.iso.datetime().nullable(),
  letter: z
    .strictObject({
      state: z.enum(['waiting', 'sent', 'failed']),
      serverWords: z.string().nullable(),
    })
    .nullable(),
  shutOutAt: z.iso.datetime().nullable(),
  createdAt: z.iso.datetime(),
  memberships: z.array(
    z.strictObject({ schemeId: z.uuid(), schemeName: z.string(), role: roleSchema }),
  ),
  abilities: z.strictObject({
    invite: z.boolean(),
    withdraw: z.boolean(),
    changeEmail: z.boolean(),
    shutOut: z.boolean(),
    readmit: z.boolean(),
  }),
});

/**
 * A person as the administrator sees them.
 *
 * Units: as personSchema. Valid: parsed by it. Source: [own].
 */
export type PersonAnswer = z.infer<typeof personSchema>;
