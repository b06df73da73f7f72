import { z } from 'zod';
import { ROLES, roleSchema } from './roles.ts';

/**
 * The address of a person in a scheme.
 *
 * Units: none. Valid: ids of both. Source: [own].
 */
export const memberParamsSchema = z.object({ schemeId: z.string(), personId: z.uuid() });

/**
 * All roles of a person in a scheme from now on; none removes the person from it.
 *
 * Units: none. Valid: each role once. Source: [own].
 */
export const memberRolesSchema = z.strictObject({
  roles: z
    .array(roleSchema)
    .max(ROLES.length)
    .refine((roles) => new Set(roles).size === roles.length, 'Name each role once.'),
});

/**
 * A person with their roles in a scheme.
 *
 * Units: none. Valid: accepted is false until the invitation is. Source: [own].
 */
export const memberSchema = z.strictObject({
  person: z.strictObject({ id: z.uuid(), name: z.string(), email: z.string() }),
  roles: z.array(roleSchema),
  accepted: z.boolean(),
});

/**
 * Everybody in a scheme, by name.
 *
 * Units: as memberSchema. Valid: nobody without a role. Source: [own].
 */
export const membersSchema = z.array(memberSchema);

/**
 * A person with their roles in a scheme.
 *
 * Units: as memberSchema. Valid: parsed by it. Source: [own].
 */
export type MemberAnswer = z.infer<typeof memberSchema>;
