import { Link, useNavigate } from 'react-router-dom';
import type { z } from 'zod';
import type { importListSchema } from '../../../../shared/schemas/imports.ts';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { importPath } from '../../../config/paths.ts';
import { formatMoment } from '../../../lib/format-date.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { IMPORT_STATE_WORDS } from '../import-states.ts';

type ListedImport = z.infer<typeof importListSchema>[number];

function countCell(count: number | undefined): string {
  return count === undefined ? '' : formatCount(count);
}

function columnsOf(schemeId: string): readonly Column<ListedImport>[] {
  return [
    {
      id: 'file',
      heading: 'File',
      wide: true,
      cell: ({ id, fileName }) => <Link to={importPath(schemeId, id)}>{fileName}</Link>,
    },
    { id: 'who', heading: 'Who', spare: true, cell: ({ by }) => by ?? '–' },
    { id: 'when', heading: 'When', spare: true, cell: ({ at }) => formatMoment(at) },
    {
      id: 'state',
      heading: 'State',
      cell: ({ state }) => {
        const { words, mark } = IMPORT_STATE_WORDS[state];
        return <StateMark state={mark}>{words}</StateMark>;
      },
    },
    { id: 'new', heading: 'New', holds: 'figure', cell: ({ counts }) => countCell(counts?.new) },
    {
      id: 'changed',
      heading: 'Changed',
      holds: 'figure',
      spare: true,
      cell: ({ counts }) => countCell(counts?.changed),
    },
    {
      id: 'refused',
      heading: 'Refused',
      holds: 'figure',
      spare: true,
      cell: ({ counts }) => countCell(counts?.refused),
    },
  ];
}

type ImportsTableProps = { readonly schemeId: string; readonly imports: readonly ListedImport[] };

/** What was brought in before, or is still waiting. */
export function ImportsTable({ schemeId, imports }: ImportsTableProps) {
  const navigate = useNavigate();
  return (
    <Table
      label="Earlier imports"
      columns={columnsOf(schemeId)}
      rows={imports}
      idOf={({ id }) => id}
      onOpen={({ id }) => void navigate(importPath(schemeId, id))}
    />
  );
}
