import { QueryError } from '../../../components/ui/query-error.tsx';
import type { PlanLine } from '../../alignments/hooks/use-plan-line.ts';
import { RunStrip } from './run-strip.tsx';
import { StaleRun } from './stale-run.tsx';

/** What there is to say of the run that is shown: that it did not come, or is older than what it went by. */
export function RunNotes({ line }: { readonly line: PlanLine }) {
  const { run, recorded } = line;
  if (run === null) return null;
  const { failed } = recorded;
  if (failed === undefined || failed.error === null) return <StaleRun {...{ run, line }} />;
  return (
    <RunStrip>
      <QueryError what="The run" error={failed.error} onRetry={() => void failed.refetch()} />
    </RunStrip>
  );
}
