import { useEffect, useMemo, useRef } from 'react';
import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { Table } from '../../../components/ui/table/table.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import type { ImportDraft } from '../hooks/use-import-draft.ts';
import type { Report } from '../hooks/use-report.ts';
import { isOpen } from '../import-states.ts';
import { OUTCOME_WORDS } from '../outcomes.ts';
import { ReportPages } from './report-pages.tsx';
import { reportColumns } from './report-columns.tsx';
import { RowDetail } from './row-detail.tsx';

type ReportTableProps = {
  readonly answer: ImportAnswer;
  readonly draft: ImportDraft;
  readonly report: Report;
};

/** The open line comes into view, also when it was pressed on the map. */
function useScrollToOpen(open: number | null, isThere: boolean) {
  const frame = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (open === null || !isThere) return;
    frame.current?.querySelector('[data-open-row]')?.scrollIntoView({ block: 'center' });
  }, [open, isThere]);
  return frame;
}

/** The report line by line; an opened line says all and is marked on the map. */
export function ReportTable({ answer, draft, report }: ReportTableProps) {
  const scheme = useScheme();
  const { page, asked, open, shown } = report;
  const { kind } = answer;
  const columns = useMemo(() => reportColumns(kind), [kind]);
  const frame = useScrollToOpen(open, shown !== undefined);
  const { data, isPlaceholderData } = page;
  return (
    <div ref={frame}>
      <div className="mb-1 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1">
        <h3 className="text-body">
          {asked.filter === null ? 'Report' : `Report: ${OUTCOME_WORDS[asked.filter].many}`}
        </h3>
        <a
          download
          href={apiPath`/api/schemes/${scheme.id}/imports/${answer.id}/report.csv`}
          className="text-small max-sm:inline-flex max-sm:min-h-11 max-sm:items-center"
        >
          Download the report (CSV)
        </a>
      </div>
      {!isOpen(answer.state) && (
        <p className="mb-1 text-small text-ink-2">
          Once an import has ended, only rows with a remark are kept here.
        </p>
      )}
      {page.error !== null && (
        <QueryError what="The report" error={page.error} onRetry={() => void page.refetch()} />
      )}
      {data === undefined && page.error === null && <LoadingRows what="the report" />}
      {data !== undefined && (
        <>
          <Table
            label="Report by row"
            columns={columns}
            rows={data.rows}
            idOf={({ row }) => String(row)}
            onOpen={({ row }) => {
              report.setOpen(row === open ? null : row);
            }}
            detailOf={(row) =>
              row.row === open ? (
                <div data-open-row className="border-l-4 border-select pl-3">
                  <RowDetail answer={answer} row={row} draft={draft} />
                </div>
              ) : undefined
            }
            // a press on rows that are about to go would fall on those that come
            className={classNames(isPlaceholderData && 'pointer-events-none opacity-60')}
          />
          <ReportPages offset={asked.offset} found={data.found} onGoTo={report.goTo} />
        </>
      )}
    </div>
  );
}
