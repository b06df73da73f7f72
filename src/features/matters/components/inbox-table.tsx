import { Link, useNavigate } from 'react-router-dom';
import type { MatterLine } from '../../../../shared/schemas/matter-answers.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { ShortWords } from '../../../components/ui/table/short-words.tsx';
import { Table } from '../../../components/ui/table/table.tsx';
import { matterPath } from '../../../config/paths.ts';
import { MATTER_SHAPES } from '../matter-words.ts';
import { DueDay } from './due-day.tsx';
import { BuildingLink } from '../../buildings/components/building-link.tsx';

function columnsOf(schemeId: string): readonly Column<MatterLine>[] {
  return [
    {
      id: 'title',
      heading: 'Matter',
      wide: true,
      cell: ({ id, number, title }) => (
        <Link to={matterPath(schemeId, id)} className="font-semibold">
          {title === '' ? `Matter ${number}, erased` : title}
        </Link>
      ),
    },
    { id: 'kind', heading: 'Kind', spare: true, cell: ({ kind }) => capital(kind) },
    {
      id: 'party',
      heading: 'From',
      spare: true,
      cell: ({ party }) => <ShortWords words={party.name === '' ? 'Erased' : party.name} />,
    },
    {
      id: 'building',
      heading: 'Building',
      spare: true,
      cell: ({ building }) => <BuildingLink {...{ schemeId, building }} />,
    },
    {
      id: 'due',
      heading: 'Answer by',
      sortBy: ({ due }) => due,
      cell: ({ due, state, isOverdue }) =>
        state === 'open' ? <DueDay {...{ due, isOverdue }} /> : '',
    },
    {
      id: 'assignedTo',
      heading: 'Given to',
      spare: true,
      cell: ({ assignedTo }) => assignedTo?.name ?? <span className="text-ink-3">Nobody</span>,
    },
    {
      id: 'state',
      heading: 'State',
      spare: true,
      cell: ({ state }) => <StateMark state={MATTER_SHAPES[state]}>{capital(state)}</StateMark>,
    },
  ];
}

type InboxTableProps = { readonly schemeId: string; readonly matters: readonly MatterLine[] };

/** Matters line by line, what is due first at the top; a line opens what was written. */
export function InboxTable({ schemeId, matters }: InboxTableProps) {
  const navigate = useNavigate();
  return (
    <Table
      label="Matters"
      wide
      columns={columnsOf(schemeId)}
      rows={matters}
      idOf={({ id }) => id}
      onOpen={({ id }) => void navigate(matterPath(schemeId, id))}
    />
  );
}
