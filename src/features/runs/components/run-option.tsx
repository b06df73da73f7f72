import type { AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { RunButton } from './run-button.tsx';

type RunOptionProps = {
  readonly option: AlignmentAnswer;
  readonly hasRuns: boolean;
  readonly onStarted: () => void;
};

/** Running the option that is shown, for who may; and what a run is for while there is none. */
export function RunOption({ option, hasRuns, onStarted }: RunOptionProps) {
  const scheme = useScheme();
  if (!can(scheme, 'readRuns')) return null;
  const mayRun = can(scheme, 'startRuns');
  const button = mayRun && (
    <RunButton kind="main" {...{ option, onStarted }}>
      Run
    </RunButton>
  );
  if (hasRuns) return <div className="mt-3 flex flex-wrap items-center gap-2">{button}</div>;
  return (
    <EmptyState action={button}>
      {mayRun
        ? 'No run yet. Run an option to see what it does to the buildings.'
        : 'No run yet. Once an option is run, buildings show here what it does to them.'}
    </EmptyState>
  );
}
