import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useResumeRun } from '../api/resume-run.ts';
import { percentDone, stoppedWords } from '../../../../shared/presentation/run-words.ts';

type StoppedRunProps = {
  readonly schemeId: string;
  readonly run: RunAnswer;
  /** The run whose results are shown meanwhile. */
  readonly standing: RunAnswer | undefined;
  readonly mayGoOn: boolean;
};

/** A run that ended early: what still stands, and the way to go on. */
export function StoppedRun({ schemeId, run, standing, mayGoOn }: StoppedRunProps) {
  const resume = useResumeRun(schemeId, run.id);
  return (
    <>
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1 text-small">
        <p role="status">
          {stoppedWords(run, standing)}
          {mayGoOn && ` Go on from ${percentDone(run)} %?`}
        </p>
        {mayGoOn && (
          <Button
            busy={resume.isPending}
            onClick={() => {
              resume.mutate();
            }}
          >
            Go on
          </Button>
        )}
      </div>
      <MutationError failed="The run does not go on." error={resume.error} />
    </>
  );
}
