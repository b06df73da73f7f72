import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import {
  backgroundAnswerSchema,
  type BackgroundLayer,
} from '../../../../shared/schemas/background.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { apiUpload, type UploadProgress } from '../../../lib/api-upload.ts';
import { refreshBackground } from './refresh-background.ts';

type Upload = { readonly file: File; readonly signal: AbortSignal };

/** Sends a file for a layer of the background; what was there is replaced once it has been read. */
export function useUploadBackground(schemeId: string, layer: BackgroundLayer) {
  const client = useQueryClient();
  const [progress, setProgress] = useState<UploadProgress>();
  const path = apiPath`/api/schemes/${schemeId}/background/${layer}`;
  const upload = useMutation({
    mutationFn: ({ file, signal }: Upload) =>
      apiUpload({ path, file, signal, schema: backgroundAnswerSchema, onProgress: setProgress }),
    onMutate: ({ file }) => {
      setProgress({ sent: 0, total: file.size });
    },
    onSuccess: () => refreshBackground(client, schemeId),
  });
  return { upload, progress };
}
