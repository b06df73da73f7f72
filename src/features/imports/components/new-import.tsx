import { useRef, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { IMPORT_LIMITS } from '../../../../shared/schemas/imports.ts';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { importPath } from '../../../config/paths.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { UploadProgress } from '../../background/components/upload-progress.tsx';
import { useUploadImport } from '../api/upload-import.ts';
import { DropPlace } from './drop-place.tsx';

const MEGABYTE = 1024 * 1024;

function faultOf(file: File): string | null {
  const megabytes = Math.ceil(file.size / MEGABYTE);
  if (file.size === 0) return 'This file is empty.';
  if (file.size <= IMPORT_LIMITS.bytes) return null;
  return `It has ${formatCount(megabytes)} MB, and at most ${IMPORT_LIMITS.bytes / MEGABYTE} come at once. Cut it into parts by district.`;
}

/** Takes a file, sends it, and goes on to its preview. */
export function NewImport({ schemeId }: { readonly schemeId: string }) {
  const navigate = useNavigate();
  const { upload, progress } = useUploadImport(schemeId);
  const [fault, setFault] = useState<string | null>(null);
  const stop = useRef<AbortController>(null);

  function send(file: File) {
    const wrong = faultOf(file);
    setFault(wrong);
    upload.reset();
    if (wrong !== null) return;
    stop.current = new AbortController();
    upload.mutate(
      { file, signal: stop.current.signal },
      { onSuccess: ({ id }) => void navigate(importPath(schemeId, id)) },
    );
  }
  if (upload.isPending && progress !== undefined) {
    return (
      <div className="grid min-h-[220px] max-w-[860px] content-center border border-dashed border-control bg-sheet px-8 max-sm:min-h-[180px] max-sm:px-4">
        <UploadProgress
          name={upload.variables.file.name}
          progress={progress}
          onCancel={() => stop.current?.abort()}
        />
      </div>
    );
  }
  return (
    <div className="grid gap-3">
      <div className="max-w-[860px] empty:hidden">
        {fault !== null && <ErrorNote failed="Nothing was sent." stands={fault} />}
        <MutationError failed="Nothing was brought in." error={upload.error} />
      </div>
      <DropPlace
        onFile={send}
        onSeveral={() => {
          upload.reset();
          setFault('Drop one file at a time. The parts of a Shapefile go into one zip.');
        }}
      />
    </div>
  );
}
