import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import { runName } from '../../../../shared/presentation/run-words.ts';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { runExportPath } from '../../runs/api/export-path.ts';

type ScheduleNoteProps = { readonly schemeId: string; readonly run: RunAnswer | null };

/** What stands in place of a sheet where a table is to be printed, with its figures as a workbook. */
export function ScheduleNote({ schemeId, run }: ScheduleNoteProps) {
  const workbook = run !== null && (
    <a href={runExportPath(schemeId, run.id, 'xlsx')} download className="font-semibold">
      Download {runName(run).toLowerCase()} as XLSX
    </a>
  );
  return (
    <EmptyState action={workbook}>
      A schedule is a table over as many pages as it needs. Print it to see it. The workbook has all
      that it shows, to the last digit.
    </EmptyState>
  );
}
