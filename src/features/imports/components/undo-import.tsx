import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useUndoChanges } from '../../buildings/api/undo-changes.ts';
import { useScheme } from '../../schemes/scheme-context.ts';

type Turn = { readonly changeIds: readonly string[]; readonly isUndone: boolean };

/** Takes an import back once that is confirmed, and puts it back. */
export function UndoImport({ changeId }: { readonly changeId: string }) {
  const scheme = useScheme();
  const [asks, setAsks] = useState(false);
  const [{ changeIds, isUndone }, setTurn] = useState<Turn>({
    changeIds: [changeId],
    isUndone: false,
  });
  const undo = useUndoChanges(scheme.id);

  function close() {
    setAsks(false);
  }
  function turn() {
    undo.mutate(changeIds, {
      onSuccess: (made) => {
        setTurn({ changeIds: made.map((one) => one.changeId), isUndone: !isUndone });
        close();
      },
    });
  }
  if (isUndone) {
    return (
      <>
        <DoneNote>Undone. The register is as it was before.</DoneNote>
        <Button busy={undo.isPending} onClick={turn}>
          Put it back
        </Button>
        <MutationError failed="It was not put back." error={undo.error} />
      </>
    );
  }
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
        onConfirm={turn}
      >
        <p className="mb-2">
          Its new buildings are taken out and changed values go back. The history keeps both.
        </p>
        <MutationError failed="It was not undone." error={undo.error} />
      </ConfirmDialog>
    </>
  );
}
