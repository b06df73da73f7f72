import { useRef } from 'react';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { FileButton } from '../../../components/ui/file-button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { UploadProgress } from '../../background/components/upload-progress.tsx';
import { useUploadGround } from '../api/upload-ground.ts';

type Origin = { readonly source: string; readonly crs: number | undefined };

type SendLevelsProps = {
  readonly schemeId: string;
  /** What goes with the file; null where that is not written rightly yet. */
  readonly originOf: () => Origin | null;
};

/** Chooses a file of levels, sends it, and says what came of it. */
export function SendLevels({ schemeId, originOf }: SendLevelsProps) {
  const { upload, progress } = useUploadGround(schemeId);
  const stop = useRef<AbortController>(null);

  function send(file: File) {
    const origin = originOf();
    if (origin === null) return;
    stop.current = new AbortController();
    upload.mutate({ file, ...origin, signal: stop.current.signal });
  }
  return (
    <>
      {upload.isPending && progress !== undefined ? (
        <UploadProgress name="levels" progress={progress} onCancel={() => stop.current?.abort()} />
      ) : (
        <div>
          <FileButton label="Bring in a file of levels" accept=".csv,.txt,.asc,.grd" onFile={send}>
            Bring in a file
          </FileButton>
        </div>
      )}
      <div className="empty:hidden">
        <MutationError
          failed="Nothing was brought in; what was there stands."
          error={upload.error}
        />
        {upload.isSuccess && upload.data.ground !== null && (
          <DoneNote>{formatCount(upload.data.ground.points)} points brought in.</DoneNote>
        )}
      </div>
    </>
  );
}
