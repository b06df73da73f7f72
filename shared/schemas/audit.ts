import { z } from 'zod';

const entryId = z.string().regex(/^\d{1,18}$/);

/**
 * Which part of the audit trail to read: entries older than `before`, of one scheme or of all.
 *
 * Units: before is the id of an entry. Valid: any; one that is not there reads from its place on.
 * Source: [own].
 */
export const auditQuerySchema = z.strictObject({
  before: entryId.optional(),
  schemeId: z.uuid().optional(),
});

const personSchema = z.strictObject({ id: z.uuid(), name: z.string(), email: z.string() });

const auditEntrySchema = z.strictObject({
  id: entryId,
  at: z.iso.datetime(),
  person: personSchema.nullable(),
  scheme: z.strictObject({ id: z.uuid(), name: z.string() }).nullable(),
  action: z.string(),
  subject: z.strictObject({ kind: z.string(), id: z.string() }),
  named: z.array(personSchema),
  before: z.record(z.string(), z.unknown()).nullable(),
  after: z.record(z.string(), z.unknown()).nullable(),
});

/**
 * A page of the audit trail, newest first; `next` asks for the one after it.
 *
 * Units: none. Valid: next null on the last page. Source: [own].
 */
export const auditPageSchema = z.strictObject({
  entries: z.array(auditEntrySchema),
  next: entryId.nullable(),
});

/**
 * One entry of the audit trail: who changed what, when, from which values to which.
 *
 * Units: none. Valid: person null where nobody was signed in; named are those whose ids stand in subject,
 * before or after; these two hold what changed. Source: [own].
 */
export type AuditEntryAnswer = z.infer<typeof auditEntrySchema>;

/**
 * A page of the audit trail.
 *
 * Units: as auditPageSchema. Valid: parsed by it. Source: [own].
 */
export type AuditPageAnswer = z.infer<typeof auditPageSchema>;
