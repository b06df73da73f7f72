import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useUndoChanges } from '../../buildings/api/undo-changes.ts';
import { useScheme } from '../../schemes/scheme-context.ts';

/** Takes an import back once that is confirmed. */
export function UndoImport({ changeId }: { readonly changeId: string }) {
  const scheme = useScheme();
  const [asks, setAsks] = useState(false);
  const undo = useUndoChanges(scheme.id);

  function close() {
    setAsks(false);
  }
  if (undo.isSuccess) return <DoneNote>Undone. The register is as it was before.</DoneNote>;
  return (
    <>
      <Button
        onClick={() => {
          setAsks(true);
        }}
      >
        Undo
      </Button>
      <ConfirmDialog
        open={asks}
        title="Undo this import?"
        doIt="Undo it"
        busy={undo.isPending}
        onClose={close}
        onConfirm={() => {
          undo.mutate([changeId], { onSuccess: close });
        }}
      >
        <p className="mb-2">
          Its new buildings are taken out and changed values go back. The history keeps both.
        </p>
        <MutationError failed="It was not undone." error={undo.error} />
      </ConfirmDialog>
    </>
  );
}
