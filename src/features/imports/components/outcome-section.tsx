import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import type { ImportDraft } from '../hooks/use-import-draft.ts';
import type { CheckedImport } from '../hooks/use-last-checked.ts';
import type { Report } from '../hooks/use-report.ts';
import { isOpen } from '../import-states.ts';
import { MendChoice } from './mend-choice.tsx';
import { OutcomeCounts } from './outcome-counts.tsx';
import { ReportTable } from './report-table.tsx';
import { SettleAll } from './settle-all.tsx';

type Counts = NonNullable<ImportAnswer['counts']>;

type OutcomeSectionProps = {
  readonly answer: CheckedImport;
  /** The file is being checked again. */
  readonly isOlder: boolean;
  readonly draft: ImportDraft;
  readonly report: Report;
};

function absentWords(absent: number): string {
  if (absent === 0) return 'Every building of the scheme is in the file.';
  const [are, they] = absent === 1 ? ['building is', 'it stays'] : ['buildings are', 'they stay'];
  return `${formatCount(absent)} ${are} not in the file; ${they} as before.`;
}

/** How much there is, and what the scheme has beside. */
function Sums({ kind, counts }: { readonly kind: ImportAnswer['kind']; readonly counts: Counts }) {
  const hasOthers = counts.absent > 0 || counts.same + counts.changed + counts.conflict > 0;
  return (
    <p className="text-body text-ink-2">
      {formatCount(counts.rows)} {counts.rows === 1 ? 'row' : 'rows'}
      {kind === 'footprints' && (
        <>
          , <b className="font-semibold text-ink">{formatCount(Math.round(counts.area))} m²</b> of
          footprints
        </>
      )}
      . {hasOthers && absentWords(counts.absent)}
    </p>
  );
}

/** What will happen: how many rows come to what, what there is to settle, and the report by row. */
export function OutcomeSection({ answer, isOlder, draft, report }: OutcomeSectionProps) {
  const asks = isOpen(answer.state);
  const { counts } = answer;
  return (
    <Panel
      title={answer.state === 'done' ? 'What happened' : 'What will happen'}
      note={isOlder && 'Being checked again; these figures are older.'}
    >
      <div className="grid grid-cols-1 gap-3 pt-2">
        <OutcomeCounts counts={counts} chosen={report.asked.filter} onChoose={report.narrow} />
        <Sums kind={answer.kind} counts={counts} />
        {asks && counts.conflict > 0 && <SettleAll count={counts.conflict} draft={draft} />}
        {asks && counts.mendable > 0 && (
          <MendChoice
            count={counts.mendable}
            draft={draft}
            onShow={() => {
              report.narrow('noted');
            }}
          />
        )}
        <ReportTable answer={answer} draft={draft} report={report} />
      </div>
    </Panel>
  );
}
