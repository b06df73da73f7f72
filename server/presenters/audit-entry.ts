import type { AuditEntryAnswer } from '../../shared/schemas/audit.ts';
import type { AuditRecord } from '../models/find-audit-page.ts';
import type { Person } from '../models/person.ts';

function presentNamed({ id, name, email }: Person): AuditEntryAnswer['named'][number] {
  return { id, name, email };
}

/** What leaves the server of an entry of the audit trail. */
export function presentAuditEntry({ entry, person, scheme, named }: AuditRecord): AuditEntryAnswer {
  return {
    id: entry.id,
    at: entry.at.toISOString(),
    person: person ? presentNamed(person) : null,
    scheme: scheme ? { id: scheme.id, name: scheme.name } : null,
    action: entry.action,
    subject: { kind: entry.subjectKind, id: entry.subjectId },
    named: named.map(presentNamed),
    before: entry.before && { ...entry.before },
    after: entry.after && { ...entry.after },
  };
}
