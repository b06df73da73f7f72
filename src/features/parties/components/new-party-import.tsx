import { useRef } from 'react';
import { useNavigate } from 'react-router-dom';
import { FileButton } from '../../../components/ui/file-button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { partyImportPath } from '../../../config/paths.ts';
import { UploadProgress } from '../../background/components/upload-progress.tsx';
import { useUploadPartyImport } from '../api/upload-party-import.ts';

/** Takes a table of parties, sends it, and goes on to its report. */
export function NewPartyImport({ schemeId }: { readonly schemeId: string }) {
  const navigate = useNavigate();
  const { upload, progress } = useUploadPartyImport(schemeId);
  const stop = useRef<AbortController>(null);
  function send(file: File) {
    stop.current = new AbortController();
    upload.mutate(
      { file, signal: stop.current.signal },
      { onSuccess: ({ id }) => void navigate(partyImportPath(schemeId, id)) },
    );
  }
  return (
    <div className="grid max-w-[860px] gap-3">
      <MutationError failed="Nothing was brought in." error={upload.error} />
      <div className="grid min-h-[150px] content-center justify-items-center gap-3 border border-dashed border-control bg-sheet px-4 py-6 text-center">
        {upload.isPending && progress !== undefined ? (
          <UploadProgress
            name={upload.variables.file.name}
            progress={progress}
            onCancel={() => stop.current?.abort()}
          />
        ) : (
          <>
            <FileButton
              label="Choose a table of parties"
              accept=".csv,.txt,.tsv,.xlsx"
              onFile={send}
            >
              Choose a table
            </FileButton>
            <p className="max-w-[60ch] text-small text-ink-2">
              CSV or XLSX, a line for each interest in a building: which building, which interest,
              who, their address. Up to 50,000 lines.
            </p>
          </>
        )}
      </div>
    </div>
  );
}
