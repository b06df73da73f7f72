import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { importSchema } from '../../../../shared/schemas/imports.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { apiUpload, type UploadProgress } from '../../../lib/api-upload.ts';
import { importQuery } from './get-import.ts';
import { importsQuery } from './list-imports.ts';

type Upload = { readonly file: File; readonly signal: AbortSignal };

/** Sends a file of buildings. Nothing is written to the register before it is confirmed. */
export function useUploadImport(schemeId: string) {
  const client = useQueryClient();
  const [progress, setProgress] = useState<UploadProgress>();
  const path = apiPath`/api/schemes/${schemeId}/imports`;
  const upload = useMutation({
    mutationFn: ({ file, signal }: Upload) =>
      apiUpload({
        path,
        method: 'POST',
        file,
        signal,
        schema: importSchema,
        onProgress: setProgress,
      }),
    onMutate: ({ file }) => {
      setProgress({ sent: 0, total: file.size });
    },
    onSuccess: (answer) => {
      client.setQueryData(importQuery(schemeId, answer.id).queryKey, answer);
      void client.invalidateQueries({ queryKey: importsQuery(schemeId).queryKey, exact: true });
    },
  });
  return { upload, progress };
}
