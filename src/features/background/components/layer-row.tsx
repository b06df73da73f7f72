import { useRef } from 'react';
import type { BackgroundLayer } from '../../../../shared/schemas/background.ts';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { FileButton } from '../../../components/ui/file-button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { useUploadBackground } from '../api/upload-background.ts';
import { LAYER_WORDS } from '../layer-words.ts';
import { RemoveLayer } from './remove-layer.tsx';
import { UploadProgress } from './upload-progress.tsx';

type LayerRowProps = {
  readonly schemeId: string;
  readonly layer: BackgroundLayer;
  readonly features: number;
  readonly canChange: boolean;
};

function Held({ features }: Pick<LayerRowProps, 'features'>) {
  if (features === 0) return <StateMark state="not-started">Nothing yet</StateMark>;
  const unit = features === 1 ? 'feature' : 'features';
  return (
    <StateMark state="done">
      {formatCount(features)} {unit}
    </StateMark>
  );
}

/** One layer: what it holds, and a file in its place for who may change it. */
export function LayerRow({ schemeId, layer, features, canChange }: LayerRowProps) {
  const { name, holds } = LAYER_WORDS[layer];
  const { upload, progress } = useUploadBackground(schemeId, layer);
  const stop = useRef<AbortController>(null);

  function send(file: File) {
    stop.current = new AbortController();
    upload.mutate({ file, signal: stop.current.signal });
  }
  return (
    <li className="grid min-h-[56px] grid-cols-[minmax(0,1fr)_auto] items-center gap-x-4 gap-y-2 border-b border-hairline py-2.5 max-sm:grid-cols-1">
      <div>
        <h2 className="text-roomy">{name}</h2>
        <p className="text-small text-ink-2">{holds}</p>
      </div>
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1 text-small">
        <Held features={features} />
        {canChange && features > 0 && <RemoveLayer schemeId={schemeId} layer={layer} />}
        {canChange && !upload.isPending && (
          <FileButton
            label={`Bring in a file for ${name.toLowerCase()}`}
            accept=".geojson,.json,.zip"
            onFile={send}
          >
            Bring in a file
          </FileButton>
        )}
      </div>
      <div className="col-span-full empty:hidden">
        {upload.isPending && progress !== undefined && (
          <UploadProgress name={name} progress={progress} onCancel={() => stop.current?.abort()} />
        )}
        <MutationError
          failed="Nothing was brought in; what was there before stands."
          error={upload.error}
        />
        {upload.data !== undefined && (
          <DoneNote>{formatCount(upload.data.features)} brought in.</DoneNote>
        )}
      </div>
    </li>
  );
}
