import { z } from 'zod';

/**
 * What a person may be in a scheme; one person may be several.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const ROLES = ['designer', 'assessor', 'owner', 'witness'] as const;

/**
 * A role in a scheme.
 *
 * Units: none. Valid: one of ROLES. Source: [own].
 */
export const roleSchema = z.enum(ROLES);

/**
 * A role in a scheme.
 *
 * Units: none. Valid: one of ROLES. Source: [own].
 */
export type Role = z.infer<typeof roleSchema>;
