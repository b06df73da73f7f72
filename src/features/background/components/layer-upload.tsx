import { useRef, type ReactNode } from 'react';
import type { BackgroundLayer } from '../../../../shared/schemas/background.ts';
import { FileButton } from '../../../components/ui/file-button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Progress } from '../../../components/ui/progress.tsx';
import { useUploadBackground } from '../api/upload-background.ts';
import { LAYER_WORDS } from '../layer-words.ts';

type LayerUploadProps = {
  readonly schemeId: string;
  readonly layer: BackgroundLayer;
  /** Said once a file with so many features is in. */
  readonly done: (features: number) => ReactNode;
};

function inKilobytes(bytes: number): number {
  return Math.ceil(bytes / 1024);
}

/** Brings in the file of a layer, with how much of it has gone and a way to stop. */
export function LayerUpload({ schemeId, layer, done }: LayerUploadProps) {
  const { upload, progress } = useUploadBackground(schemeId, layer);
  const stop = useRef<AbortController>(null);
  const { name } = LAYER_WORDS[layer];

  function send(file: File) {
    stop.current = new AbortController();
    upload.mutate({ file, signal: stop.current.signal });
  }
  if (upload.isPending && progress !== undefined) {
    const isSent = progress.sent >= progress.total;
    return (
      <Progress
        label={isSent ? `Reading ${name.toLowerCase()}` : `Sending ${name.toLowerCase()}`}
        done={inKilobytes(progress.sent)}
        total={inKilobytes(progress.total)}
        unit="kB"
        onCancel={() => stop.current?.abort()}
      />
    );
  }
  return (
    <div className="grid justify-items-start gap-2">
      <MutationError
        failed="Nothing was brought in; what was there before stands."
        error={upload.error}
      />
      <FileButton
        label={`Bring in a file for ${name.toLowerCase()}`}
        accept=".geojson,.json,.zip"
        onFile={send}
      >
        Bring in a file
      </FileButton>
      {upload.data !== undefined && done(upload.data.features)}
    </div>
  );
}
