import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { partyImportSchema } from '../../../../shared/schemas/party-imports.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { apiUpload, type UploadProgress } from '../../../lib/api-upload.ts';
import { partyImportQuery, partyImportsQuery } from './party-imports.ts';

type Upload = { readonly file: File; readonly signal: AbortSignal };

/** Sends a table of parties to be checked. */
export function useUploadPartyImport(schemeId: string) {
  const client = useQueryClient();
  const [progress, setProgress] = useState<UploadProgress>();
  const path = apiPath`/api/schemes/${schemeId}/party-imports`;
  const upload = useMutation({
    mutationFn: ({ file, signal }: Upload) =>
      apiUpload({
        path,
        method: 'POST',
        file,
        signal,
        schema: partyImportSchema,
        onProgress: setProgress,
      }),
    onMutate: ({ file }) => {
      setProgress({ sent: 0, total: file.size });
    },
    onSuccess: (answer) => {
      client.setQueryData(partyImportQuery(schemeId, answer.id).queryKey, answer);
      void client.invalidateQueries({ queryKey: partyImportsQuery(schemeId).queryKey });
    },
  });
  return { upload, progress };
}
