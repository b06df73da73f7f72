import { useId, useState, type ComponentProps } from 'react';
import type { AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useStartRun } from '../api/start-run.ts';

type RunButtonProps = Pick<ComponentProps<typeof Button>, 'kind' | 'children'> & {
  /** As it is saved; null for one that never was. */
  readonly option: AlignmentAnswer | null;
  /** What is drawn and written is not saved. */
  readonly isEditing?: boolean;
  readonly onStarted?: () => void;
};

/** Starts a run of an option; of one that is being changed it says why it does not. */
export function RunButton(props: RunButtonProps) {
  const { option, isEditing = false, onStarted, kind = 'plain', children = 'Run' } = props;
  const start = useStartRun(useScheme().id);
  const [isRefused, setRefused] = useState(false);
  const reason = useId();

  function press(): void {
    if (isEditing || option === null) setRefused(true);
    else if (!start.isPending) start.mutate(option, { onSuccess: () => onStarted?.() });
  }
  return (
    <>
      <Button
        kind={kind}
        aria-disabled={isEditing || start.isPending || undefined}
        aria-describedby={isRefused ? reason : undefined}
        onClick={press}
      >
        {children}
      </Button>
      {isRefused && isEditing && (
        <p id={reason} role="status" className="w-full text-small text-ink-2">
          Save the option first. A run works on what is saved.
        </p>
      )}
      {start.error !== null && (
        <div className="w-full">
          <MutationError failed="No run was started." error={start.error} />
        </div>
      )}
    </>
  );
}
