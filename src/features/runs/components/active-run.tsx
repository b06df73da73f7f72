import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Progress } from '../../../components/ui/progress.tsx';
import { useCancelRun } from '../api/cancel-run.ts';
import { useTimeLeft } from '../hooks/use-time-left.ts';
import { runName } from '../../../../shared/presentation/run-words.ts';

type ActiveRunProps = {
  readonly schemeId: string;
  readonly run: RunAnswer;
  /** When this was known, in ms. */
  readonly at: number;
  readonly mayCancel: boolean;
};

/** How far a run is, and the way to stop it. */
export function ActiveRun({ schemeId, run, at, mayCancel }: ActiveRunProps) {
  const { done, buildings, option } = run;
  const cancel = useCancelRun(schemeId, run.id);
  const left = useTimeLeft(done, buildings, at);
  return (
    <>
      <Progress
        label={`${runName(run)}, ${option.name}`}
        done={done}
        total={buildings}
        unit="buildings"
        {...(left !== undefined && { left })}
        {...(mayCancel && {
          onCancel: () => {
            if (!cancel.isPending) cancel.mutate();
          },
        })}
      />
      <MutationError failed="The run was not stopped." error={cancel.error} />
    </>
  );
}
