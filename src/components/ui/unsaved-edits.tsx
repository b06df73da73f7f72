import { useUnsavedEdits } from '../../hooks/use-unsaved-edits.ts';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';

/** Asks before what has been written on this page is lost. */
export function UnsavedEdits({ hasEdits }: { readonly hasEdits: boolean }) {
  const blocker = useUnsavedEdits(hasEdits);
  return (
    <Dialog
      open={blocker.state === 'blocked'}
      title="Leave without saving?"
      onClose={() => blocker.reset?.()}
    >
      <p className="text-body">What you wrote here is not saved yet. Leaving throws it away.</p>
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
