import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { classNames } from '../../../lib/class-names.ts';
import type { ImportDraft } from '../hooks/use-import-draft.ts';
import type { CheckedImport } from '../hooks/use-last-checked.ts';
import type { Report } from '../hooks/use-report.ts';
import { isOpen } from '../import-states.ts';
import { ColumnsSection } from './columns-section.tsx';
import { HowItWasRead } from './how-it-was-read.tsx';
import { ImportEnd } from './import-end.tsx';
import { LayerSection } from './layer-section.tsx';
import { OutcomeSection } from './outcome-section.tsx';
import { PlaceSection } from './place-section.tsx';

type ImportReadingProps = {
  readonly answer: ImportAnswer;
  readonly checked: CheckedImport | null;
  readonly draft: ImportDraft;
  readonly report: Report;
};

function titleOf({ state, kind }: ImportAnswer): string {
  if (state === 'done') return 'Brought in';
  return kind === 'values' ? 'Join values' : 'Bring in buildings';
}

/** What is read from top to bottom. */
export function ImportReading({ answer, checked, draft, report }: ImportReadingProps) {
  const asks = isOpen(answer.state);
  const hasFailed = answer.state === 'failed' || answer.state === 'cancelled';
  const hasEnded = !asks && answer.state !== 'importing';
  return (
    <div className="min-h-0 flex-1 overflow-auto px-6 pt-4 pb-6 max-md:overflow-visible max-sm:px-4">
      <h1 className="mb-3 text-h2">{titleOf(answer)}</h1>
      {hasEnded && <ImportEnd answer={answer} />}
      {asks && answer.fault !== null && (
        <div className="mb-4">
          <ErrorNote failed="It was not brought in." stands={answer.fault} />
        </div>
      )}
      <div className={classNames('max-w-[1020px]', hasEnded && 'mt-5')}>
        {asks && answer.layers.length > 0 && <LayerSection answer={answer} draft={draft} />}
        {asks && answer.place !== null && answer.kind === 'footprints' && (
          <PlaceSection place={answer.place} draft={draft} />
        )}
        {asks && answer.columns.length > 0 && <ColumnsSection answer={answer} draft={draft} />}
        {answer.state === 'reading' && (
          <p className="max-w-[60ch] text-body text-ink-2">
            The file is being read. What you can choose stands here once its columns are known. You
            may leave this page; the work goes on.
          </p>
        )}
        {checked !== null && !hasFailed && (
          <OutcomeSection
            answer={checked}
            isOlder={answer.state === 'checking'}
            draft={draft}
            report={report}
          />
        )}
        {!asks && <HowItWasRead answer={answer} />}
      </div>
    </div>
  );
}
