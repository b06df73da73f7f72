import { useQuery } from '@tanstack/react-query';
import type { Measure } from '../../../shared/schemas/measures.ts';
import { Content } from '../../components/layout/content.tsx';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { MutationError } from '../../components/ui/mutation-error.tsx';
import { StateMark } from '../../components/ui/state-mark.tsx';
import { Table } from '../../components/ui/table/table.tsx';
import type { Column } from '../../components/ui/table/column.ts';
import { formatDay } from '../../lib/format-date.ts';
import { BuildingLink } from '../buildings/components/building-link.tsx';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { measuresQuery } from './api/list-measures.ts';
import { limitWords, MEASURE_SHAPES } from './measure-words.ts';
import { capital } from '../../../shared/presentation/capital.ts';

/** So many are named; the others are counted. */
const NAMED = 3;

function Buildings({ schemeId, buildings }: Pick<Measure, 'buildings'> & { schemeId: string }) {
  const more = buildings.length - NAMED;
  return (
    <span className="flex flex-wrap gap-x-2">
      {buildings.slice(0, NAMED).map((building) => (
        <BuildingLink key={building.id} {...{ schemeId, building }} />
      ))}
      {more > 0 && <span className="text-ink-2">and {more} more</span>}
    </span>
  );
}

function columnsOf(schemeId: string): readonly Column<Measure>[] {
  return [
    {
      id: 'title',
      heading: 'Measure',
      wide: true,
      cell: ({ title, limit }) => (
        <>
          <b className="font-semibold">{title}</b>{' '}
          {limit !== null && <span className="text-ink-2">{limitWords(limit)}</span>}
        </>
      ),
    },
    { id: 'kind', heading: 'Where it acts', cell: ({ kind }) => capital(kind) },
    {
      id: 'buildings',
      heading: 'Buildings',
      cell: ({ buildings }) => <Buildings {...{ schemeId, buildings }} />,
    },
    { id: 'responsible', heading: 'Responsible', cell: ({ responsible }) => responsible },
    { id: 'due', heading: 'Due', cell: ({ due }) => (due === null ? '' : formatDay(due)) },
    {
      id: 'state',
      heading: 'State',
      cell: ({ state }) => <StateMark state={MEASURE_SHAPES[state]}>{capital(state)}</StateMark>,
    },
  ];
}

/** The protective measures of a scheme, what is due first at the top. */
export function MeasuresPage() {
  const scheme = useScheme();
  const mayRead = can(scheme, 'readDecisions');
  const { data, error } = useQuery({ ...measuresQuery(scheme.id), enabled: mayRead });
  return (
    <Content>
      <PageTitle>{`Protective measures of ${scheme.name}`}</PageTitle>
      <div className="p-8 max-sm:p-4">
        <h1 className="mb-3 text-h3">Protective measures</h1>
        <MutationError failed="Measures could not be fetched." error={error} />
        {!mayRead && <EmptyState>Measures are for those who work on the scheme.</EmptyState>}
        {data?.length === 0 && (
          <EmptyState>
            No measures yet. They are added on the sheet of the building that they protect.
          </EmptyState>
        )}
        {data !== undefined && data.length > 0 && (
          <Table
            label="Protective measures"
            columns={columnsOf(scheme.id)}
            rows={data}
            idOf={({ id }) => id}
          />
        )}
      </div>
    </Content>
  );
}
