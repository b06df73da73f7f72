import { useState, type ReactNode } from 'react';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useFollowedRuns } from '../hooks/use-followed-runs.ts';
import { isActive, isStopped } from '../run-states.ts';
import { ActiveRun } from './active-run.tsx';
import { CompleteRun } from './complete-run.tsx';
import { RunStrip } from './run-strip.tsx';
import { StoppedRun } from './stopped-run.tsx';

/**
 * How far the runs of the scheme are, wherever they were started; what became of the newest; nothing while
 * there is nothing to say. Stands on screens that show results; `children` stand there meanwhile.
 */
export function RunProgressLine({ children }: { readonly children?: ReactNode }) {
  const scheme = useScheme();
  const { id: schemeId } = scheme;
  const { runs, listed } = useFollowedRuns(schemeId, can(scheme, 'readRuns'));
  const [watched, setWatched] = useState<string | null>(null);
  const mayRun = can(scheme, 'startRuns');
  const active = runs.filter(isActive);
  const [newest] = runs;
  const [first] = active;
  if (first !== undefined && first.id !== watched) setWatched(first.id);

  if (listed.error !== null && listed.data === undefined) {
    const retry = () => void listed.refetch();
    return (
      <RunStrip>
        <QueryError what="The list of runs" error={listed.error} onRetry={retry} />
      </RunStrip>
    );
  }
  if (first !== undefined) {
    return (
      <RunStrip>
        {active.map((run) => (
          <ActiveRun
            key={run.id}
            {...{ schemeId, run }}
            at={listed.dataUpdatedAt}
            mayCancel={mayRun}
          />
        ))}
      </RunStrip>
    );
  }
  if (newest !== undefined && isStopped(newest)) {
    const standing = runs.find(({ isShown }) => isShown);
    return (
      <RunStrip>
        <StoppedRun {...{ schemeId, standing }} run={newest} mayGoOn={mayRun} />
      </RunStrip>
    );
  }
  if (newest?.id === watched) {
    return (
      <RunStrip>
        <CompleteRun
          {...{ schemeId }}
          run={newest}
          onClose={() => {
            setWatched(null);
          }}
        />
      </RunStrip>
    );
  }
  return children;
}
