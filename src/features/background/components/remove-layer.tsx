import { useState } from 'react';
import type { BackgroundLayer } from '../../../../shared/schemas/background.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useRemoveBackground } from '../api/remove-background.ts';
import { LAYER_WORDS } from '../layer-words.ts';

type RemoveLayerProps = { readonly schemeId: string; readonly layer: BackgroundLayer };

/** Takes a layer out of the background once that is confirmed. */
export function RemoveLayer({ schemeId, layer }: RemoveLayerProps) {
  const [asks, setAsks] = useState(false);
  const remove = useRemoveBackground(schemeId, layer);
  const name = LAYER_WORDS[layer].name.toLowerCase();

  function close() {
    setAsks(false);
  }
  return (
    <>
      <Button
        kind="quiet"
        aria-label={`Remove ${name}`}
        onClick={() => {
          setAsks(true);
        }}
      >
        Remove
      </Button>
      <ConfirmDialog
        open={asks}
        title={`Remove ${name} from the background?`}
        doIt="Remove it"
        busy={remove.isPending}
        onClose={close}
        onConfirm={() => {
          remove.mutate(undefined, { onSuccess: close });
        }}
      >
        <p className="mb-2">
          The map is drawn without it. To have it back, bring in its file again.
        </p>
        <MutationError failed="It was not removed." error={remove.error} />
      </ConfirmDialog>
    </>
  );
}
