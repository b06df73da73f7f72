import { z } from 'zod';
import { roleSchema } from './roles.ts';

/**
 * Lengths of what people write about schemes.
 *
 * Units: characters. Valid: read only. Source: [own].
 */
export const SCHEME_LIMITS = { name: 200, description: 5000 } as const;

const name = z
  .string()
  .trim()
  .min(1, 'Give it a name.')
  .max(SCHEME_LIMITS.name)
  .regex(/^\P{Cc}*$/u, 'Write the name on one line.');
const description = z
  .string()
  .trim()
  .max(SCHEME_LIMITS.description)
  .regex(/^[^\0]*$/, 'Write letters only.');

/**
 * What a new scheme needs.
 *
 * Units: crs is an EPSG number. Valid: a projected system in metres, checked by the server.
 * Source: [own].
 */
export const newSchemeSchema = z.strictObject({
  name,
  description: description.default(''),
  crs: z.number().int().min(1024).max(32767),
});

/**
 * A change of a scheme; `version` is the one it was read at.
 *
 * Units: none. Valid: a version that is not the newest is refused. Source: [own].
 */
export const changeSchemeSchema = z.strictObject({
  version: z.number().int().positive(),
  name: name.optional(),
  description: description.optional(),
});

/**
 * Archives a scheme or brings it back; `version` is the one it was read at.
 *
 * Units: none. Valid: a version that is not the newest is refused. Source: [own].
 */
export const archiveSchemeSchema = z.strictObject({
  archived: z.boolean(),
  version: z.number().int().positive(),
});

/**
 * A scheme as the server answers, with the caller's roles and abilities. An archived one is only read.
 *
 * Units: crs is an EPSG number. Valid: abilities are the server's answers; the client never works them
 * out. Source: [own].
 */
export const schemeSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  description: z.string(),
  crs: z.number(),
  archivedAt: z.iso.datetime().nullable(),
  version: z.number(),
  registerVersion: z.number(),
  backgroundVersion: z.number(),
  roles: z.array(roleSchema),
  abilities: z.record(z.string(), z.boolean()),
});

/**
 * A scheme as the server answers.
 *
 * Units: as schemeSchema. Valid: parsed by it. Source: [own].
 */
export type SchemeAnswer = z.infer<typeof schemeSchema>;

/**
 * The schemes that the caller has a part in, by name; the administrator's are all.
 *
 * Units: as schemeSchema. Valid: archived ones are among them. Source: [own].
 */
export const schemesSchema = z.array(schemeSchema);
