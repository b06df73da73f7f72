import { useState } from 'react';
import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useCancelImport } from '../api/cancel-import.ts';

/** Gives the import up, at any time before it is done. */
export function CancelImport({ answer }: { readonly answer: ImportAnswer }) {
  const scheme = useScheme();
  const [asks, setAsks] = useState(false);
  const cancel = useCancelImport(scheme.id, answer.id);

  function close() {
    setAsks(false);
  }
  return (
    <>
      <Button
        kind="quiet"
        onClick={() => {
          setAsks(true);
        }}
      >
        Cancel import
      </Button>
      <ConfirmDialog
        open={asks}
        title="Cancel this import?"
        doIt="Cancel import"
        busy={cancel.isPending}
        onClose={close}
        onConfirm={() => {
          cancel.mutate(undefined, { onSuccess: close });
        }}
      >
        <p className="mb-2">
          Nothing of {answer.fileName} comes into the register. What you chose here is forgotten.
        </p>
        <MutationError failed="It was not cancelled." error={cancel.error} />
      </ConfirmDialog>
    </>
  );
}
