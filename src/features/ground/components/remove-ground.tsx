import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useRemoveGround } from '../api/remove-ground.ts';

/** Takes the ground away once that is confirmed. */
export function RemoveGround({ schemeId }: { readonly schemeId: string }) {
  const [asks, setAsks] = useState(false);
  const remove = useRemoveGround(schemeId);

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
        Remove
      </Button>
      <ConfirmDialog
        open={asks}
        title="Remove the ground?"
        doIt="Remove it"
        busy={remove.isPending}
        onClose={close}
        onConfirm={() => {
          remove.mutate(undefined, { onSuccess: close });
        }}
      >
        <p className="mb-2">
          Buildings that took their level from it have none then. Levels from files and by hand
          stay.
        </p>
        <MutationError failed="It was not removed." error={remove.error} />
      </ConfirmDialog>
    </>
  );
}
