import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { capital } from '../../../../shared/presentation/capital.ts';
import {
  PARTY_IMPORT_LIMITS,
  type PartyImport,
  type PartyImportRow,
} from '../../../../shared/schemas/party-imports.ts';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { apiPath } from '../../../lib/api-path.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { partyImportRowsQuery, type RowsOnly } from '../api/party-imports.ts';
import { Pages } from './pages.tsx';
import { PartyName } from './party-name.tsx';

const COLUMNS: readonly Column<PartyImportRow>[] = [
  { id: 'row', heading: 'Row', holds: 'figure', cell: ({ row }) => row },
  { id: 'reference', heading: 'Building', cell: ({ reference }) => reference },
  {
    id: 'outcome',
    heading: 'Comes to',
    cell: ({ outcome }) => (
      <span className={outcome === 'problem' ? 'font-medium text-clay-deep' : undefined}>
        {capital(outcome)}
      </span>
    ),
  },
  {
    id: 'name',
    heading: 'Name',
    wide: true,
    cell: ({ name }) => name !== '' && <PartyName name={name} />,
  },
];

/** Once an import has ended, names stand with the parties alone. */
const COLUMNS_WITHOUT_NAMES = COLUMNS.filter(({ id }) => id !== 'name');

type PartyImportRowsProps = {
  readonly answer: PartyImport;
  readonly only: RowsOnly | null;
};

/** What an import says about each row, with what to do under those that are at fault. */
export function PartyImportRows({ answer, only }: PartyImportRowsProps) {
  const scheme = useScheme();
  const [page, setPage] = useState({ only, offset: 0 });
  const offset = page.only === only ? page.offset : 0;
  const { data, error, refetch } = useQuery(
    partyImportRowsQuery(scheme.id, answer.id, { only, offset }),
  );
  return (
    <>
      <div className="mb-1 flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 className="text-body font-semibold">Row by row</h2>
        <a
          download
          className="text-small max-sm:inline-flex max-sm:min-h-11 max-sm:items-center"
          href={apiPath`/api/schemes/${scheme.id}/party-imports/${answer.id}/report.csv`}
        >
          Download the report (CSV)
        </a>
      </div>
      {error !== null && (
        <QueryError what="The report" error={error} onRetry={() => void refetch()} />
      )}
      {error === null && data === undefined && <LoadingRows what="the report" />}
      {data !== undefined && (
        <>
          <Table
            label="Report by row"
            columns={answer.state === 'checked' ? COLUMNS : COLUMNS_WITHOUT_NAMES}
            rows={data.rows}
            idOf={({ row }) => String(row)}
            detailOf={({ remarks }) =>
              remarks.length === 0 ? undefined : (
                <p className="max-w-[84ch] border-l-4 border-clay pl-3 text-small break-words whitespace-normal">
                  {remarks.join(' ')}
                </p>
              )
            }
          />
          <Pages
            one="row"
            many="rows"
            offset={offset}
            perPage={PARTY_IMPORT_LIMITS.page}
            found={data.found}
            onGoTo={(next) => {
              setPage({ only, offset: next });
            }}
          />
        </>
      )}
    </>
  );
}
