import { useUnsavedEdits } from '../../hooks/use-unsaved-edits.ts';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';

type UnsavedEditsProps = {
  readonly hasEdits: boolean;
  /** Begins the sentence that says what would be lost. */
  readonly what?: string;
};

/** Asks before what has been written on this page is lost. */
export function UnsavedEdits({ hasEdits, what = 'What you wrote here' }: UnsavedEditsProps) {
  const blocker = useUnsavedEdits(hasEdits);
  return (
    <Dialog
      open={blocker.state === 'blocked'}
      title="Leave without saving?"
      onClose={() => blocker.reset?.()}
    >
      <p className="text-body">{what} is not saved yet. Leaving throws it away.</p>
      <div className="mt-4 flex gap-2">
        <Button kind="main" onClick={() => blocker.proceed?.()}>
          Throw it away and leave
        </Button>
        <Button data-first-in-focus onClick={() => blocker.reset?.()}>
          Stay here
        </Button>
      </div>
    </Dialog>
  );
}
