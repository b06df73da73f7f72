import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import type { PlanLine } from '../../alignments/hooks/use-plan-line.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { staleWords } from '../../../../shared/presentation/run-words.ts';
import { RunButton } from './run-button.tsx';
import { RunStrip } from './run-strip.tsx';

type StaleRunProps = {
  readonly run: RunAnswer;
  readonly line: Pick<PlanLine, 'option' | 'recorded' | 'editor' | 'choose'>;
};

/** Says that what a run went by has changed since, and offers another. */
export function StaleRun({ run, line }: StaleRunProps) {
  const scheme = useScheme();
  const { option, recorded, editor, choose } = line;
  const words = staleWords(run, {
    // the scheme may be newer than the list of runs
    register: run.since.register || scheme.registerVersion !== run.registerVersion,
    rules: run.since.rules,
    option: option === null ? run.since.option : recorded.hasChanged,
  });
  if (words === null) return null;
  return (
    <RunStrip>
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1 text-small">
        <p>{words}</p>
        {can(scheme, 'startRuns') && option !== null && (
          <RunButton
            {...{ option }}
            isEditing={editor.isEditing}
            onStarted={() => {
              choose(option.id);
            }}
          >
            Run again
          </RunButton>
        )}
      </div>
    </RunStrip>
  );
}
