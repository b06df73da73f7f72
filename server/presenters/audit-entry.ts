import type { AuditEntryAnswer } from '../../shared/schemas/audit.ts';
import type { AuditRecord } from '../models/find-audit-page.ts';

/** What leaves the server of an entry of the audit trail. */
export function presentAuditEntry({ entry, person, scheme }: AuditRecord): AuditEntryAnswer {
  return {
    id: entry.id,
    at: entry.at.toISOString(),
    person: person ? { id: person.id, name: person.name, email: person.email } : null,
    scheme: scheme ? { id: scheme.id, name: scheme.name } : null,
    action: entry.action,
    subject: { kind: entry.subjectKind, id: entry.subjectId },
    before: entry.before && { ...entry.before },
    after: entry.after && { ...entry.after },
  };
}
