import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import { FormatMenu } from '../../../components/ui/format-menu.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { runExportPath } from '../api/export-path.ts';
import { runName } from '../../../../shared/presentation/run-words.ts';

type RunExportProps = { readonly schemeId: string; readonly run: RunAnswer };

const FORMATS = [
  { format: 'xlsx', name: 'XLSX', note: 'with what it went by' },
  { format: 'geojson', name: 'GeoJSON', note: 'with footprints' },
] as const;

/** All that a run found as a file. */
export function RunExport({ schemeId, run }: RunExportProps) {
  const buildings = run.buildings === 1 ? 'building' : 'buildings';
  return (
    <FormatMenu
      align="left"
      name={`Export ${runName(run).toLowerCase()}`}
      button={
        <>
          Export <span aria-hidden="true">▾</span>
        </>
      }
      buttonClassName="-my-1 flex min-h-6 items-center gap-1 hover:text-ink max-sm:min-h-11"
      holds={`${runName(run)}: ${formatCount(run.buildings)} ${buildings}, as recorded`}
      links={FORMATS.map(({ format, name, note }) => ({
        ...{ name, note, href: runExportPath(schemeId, run.id, format) },
      }))}
    />
  );
}
