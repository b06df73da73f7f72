import { useState } from 'react';
import type { BackgroundLayer } from '../../../../shared/schemas/background.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import { formatCount } from '../../../lib/format-number.ts';
import { useRemoveBackground } from '../api/remove-background.ts';
import { LAYER_WORDS } from '../layer-words.ts';
import { LayerUpload } from './layer-upload.tsx';

type LayerRowProps = {
  readonly schemeId: string;
  readonly layer: BackgroundLayer;
  readonly features: number;
};

function RemoveLayer({ schemeId, layer }: Omit<LayerRowProps, 'features'>) {
  const [asks, setAsks] = useState(false);
  const remove = useRemoveBackground(schemeId, layer);
  const { name } = LAYER_WORDS[layer];
  function close() {
    setAsks(false);
  }
  return (
    <>
      <Button
        kind="quiet"
        aria-label={`Remove ${name.toLowerCase()}`}
        onClick={() => {
          setAsks(true);
        }}
      >
        Remove
      </Button>
      <ConfirmDialog
        open={asks}
        title={`Remove ${name.toLowerCase()} from the background?`}
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

/** One layer: what it holds, and a file in its place. */
export function LayerRow({ schemeId, layer, features }: LayerRowProps) {
  const { name, holds } = LAYER_WORDS[layer];
  return (
    <li className="grid grid-cols-[minmax(0,1fr)_auto] items-start gap-x-4 gap-y-2 border-b border-hairline py-2.5">
      <div>
        <h2 className="text-roomy">{name}</h2>
        <p className="text-small text-ink-2">{holds}</p>
      </div>
      <div className="flex items-center gap-2 text-small">
        {features === 0 ? (
          <StateMark state="not-started">Nothing yet</StateMark>
        ) : (
          <StateMark state="done">
            {formatCount(features)} {features === 1 ? 'feature' : 'features'}
          </StateMark>
        )}
        {features > 0 && <RemoveLayer schemeId={schemeId} layer={layer} />}
      </div>
      <div className="col-span-2">
        <LayerUpload
          schemeId={schemeId}
          layer={layer}
          done={(held) => <DoneNote>{formatCount(held)} brought in.</DoneNote>}
        />
      </div>
    </li>
  );
}
