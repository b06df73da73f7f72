import type { AuditEntryAnswer } from '../../../../shared/schemas/audit.ts';
import { ValueChanges } from '../../../components/ui/value-changes.tsx';
import { entryChanges, personAbout } from '../entry-words.ts';

/** From which values to which, and what the entry is about. */
export function AuditDetail({ entry }: { readonly entry: AuditEntryAnswer }) {
  const changes = entryChanges(entry);
  const person = personAbout(entry);
  return (
    <div className="sticky left-(--edge) max-w-[calc(100vw-32px)]">
      {changes.length === 0 ? (
        <p className="text-small text-ink-2">No values go with this.</p>
      ) : (
        <ValueChanges label={`Values of: ${entry.action}`} changes={changes} />
      )}
      <p className="mt-2 text-cap break-all text-ink-3">
        Entry {entry.id}, {entry.subject.kind}{' '}
        {person === undefined ? entry.subject.id : `${person.name}, ${person.email}`}
      </p>
    </div>
  );
}
