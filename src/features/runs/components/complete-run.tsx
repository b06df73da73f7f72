import { useQuery } from '@tanstack/react-query';
import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import { Button } from '../../../components/ui/button.tsx';
import { runQuery } from '../api/get-run.ts';
import { countsWords, runName } from '../../../../shared/presentation/run-words.ts';

type CompleteRunProps = {
  readonly schemeId: string;
  readonly run: RunAnswer;
  readonly onClose: () => void;
};

/** A run that was waited for has come to its end: what it found, in one line. */
export function CompleteRun({ schemeId, run, onClose }: CompleteRunProps) {
  const { data } = useQuery(runQuery(schemeId, run.id));
  const counts = data?.counts ?? null;
  return (
    <div className="flex flex-wrap items-center gap-x-3 text-small">
      <p role="status">
        <b className="font-semibold">{runName(run)} is complete</b>
        {counts === null ? '.' : `: ${countsWords(counts)}.`}
      </p>
      <Button kind="quiet" className="ml-auto h-6" onClick={onClose}>
        Close
      </Button>
    </div>
  );
}
