import { useState } from 'react';
import type { AuditEntryAnswer } from '../../../../shared/schemas/audit.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { formatMoment } from '../../../lib/format-date.ts';
import { doerWithoutPerson, personAbout } from '../entry-words.ts';
import { AuditDetail } from './audit-detail.tsx';

function inCapitals(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

const COLUMNS: readonly Column<AuditEntryAnswer>[] = [
  { id: 'at', heading: 'When', cell: ({ at }) => formatMoment(at) },
  {
    id: 'person',
    heading: 'Who',
    cell: (entry) => (
      <span
        className="inline-block max-w-[220px] truncate align-middle"
        title={entry.person?.email}
      >
        {entry.person?.name ?? <span className="text-ink-3">{doerWithoutPerson(entry)}</span>}
      </span>
    ),
  },
  {
    id: 'action',
    heading: 'What',
    cell: ({ action }) => <b className="font-semibold">{inCapitals(action)}</b>,
  },
  {
    id: 'subject',
    heading: 'About',
    spare: true,
    cell: (entry) => {
      const person = personAbout(entry);
      return person === undefined ? (
        entry.subject.kind
      ) : (
        <span
          className="inline-block max-w-[220px] truncate align-middle"
          title={`${person.name}, ${person.email}`}
        >
          {person.name}
        </span>
      );
    },
  },
  {
    id: 'scheme',
    heading: 'Scheme',
    wide: true,
    cell: ({ scheme }) => <span className="text-ink-2">{scheme?.name}</span>,
  },
];

/** The audit trail, newest first; a row opens on what it was before and what it is since. */
export function AuditTable({ entries }: { readonly entries: readonly AuditEntryAnswer[] }) {
  const [openId, setOpenId] = useState<string>();
  return (
    <Table
      label="Audit trail"
      wide
      className="max-h-[calc(100dvh-210px)]"
      columns={COLUMNS}
      rows={entries}
      idOf={({ id }) => id}
      onOpen={({ id }) => {
        setOpenId(id === openId ? undefined : id);
      }}
      detailOf={(entry) => (entry.id === openId ? <AuditDetail entry={entry} /> : undefined)}
    />
  );
}
