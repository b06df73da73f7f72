import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { capital } from '../../../shared/presentation/capital.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';
import type { PartyImport } from '../../../shared/schemas/party-imports.ts';
import { Page } from '../../components/layout/page.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import type { Column } from '../../components/ui/table/column.ts';
import { Table } from '../../components/ui/table/table.tsx';
import { partyImportPath } from '../../config/paths.ts';
import { apiPath } from '../../lib/api-path.ts';
import { formatMoment } from '../../lib/format-date.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { partyImportsQuery } from './api/party-imports.ts';
import { NewPartyImport } from './components/new-party-import.tsx';

function columnsOf(schemeId: string): readonly Column<PartyImport>[] {
  return [
    {
      id: 'file',
      heading: 'File',
      wide: true,
      cell: ({ id, fileName }) => <Link to={partyImportPath(schemeId, id)}>{fileName}</Link>,
    },
    { id: 'state', heading: 'State', cell: ({ state }) => capital(state) },
    {
      id: 'rows',
      heading: 'Rows',
      holds: 'figure',
      cell: ({ counts }) => formatCount(counts.rows),
    },
    { id: 'by', heading: 'By', spare: true, cell: ({ by }) => by },
    { id: 'sent', heading: 'Sent', spare: true, cell: ({ sentAt }) => formatMoment(sentAt) },
  ];
}

function FormToFillIn({ schemeId }: { readonly schemeId: string }) {
  const path = apiPath`/api/schemes/${schemeId}/parties/form`;
  return (
    <p className="mt-3 max-w-[84ch] text-body">
      Nothing at hand yet? Take the form with all buildings of the register and fill it in:{' '}
      <a download href={`${path}?format=xlsx`}>
        XLSX
      </a>{' '}
      or{' '}
      <a download href={`${path}?format=csv`}>
        CSV
      </a>
      . Lines that stay empty are passed over.
    </p>
  );
}

/** Brings parties in from a table, and lists what was brought in before. */
export function PartyImportsPage() {
  const scheme = useScheme();
  const mayBringIn = can(scheme, 'updateParties');
  const { data, error, refetch } = useQuery({
    ...partyImportsQuery(scheme.id),
    enabled: mayBringIn,
  });
  if (!mayBringIn) return <EmptyState>Parties are brought in by assessors.</EmptyState>;
  return (
    <Page
      title="Bring in parties"
      lead="You see row by row what will happen before anything is written. Who is there already gets only what was missing; nothing is overwritten."
    >
      <NewPartyImport schemeId={scheme.id} />
      <FormToFillIn schemeId={scheme.id} />
      <Panel title="Earlier imports" className="mt-8 max-w-[860px]">
        {error !== null && (
          <QueryError what="The list" error={error} onRetry={() => void refetch()} />
        )}
        {data?.length === 0 && <p className="py-3 text-body text-ink-2">None yet.</p>}
        {data !== undefined && data.length > 0 && (
          <Table
            label="Earlier imports"
            columns={columnsOf(scheme.id)}
            rows={data}
            idOf={({ id }) => id}
          />
        )}
      </Panel>
    </Page>
  );
}
