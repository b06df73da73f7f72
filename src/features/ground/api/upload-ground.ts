import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { groundSchema } from '../../../../shared/schemas/ground.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { apiUpload, type UploadProgress } from '../../../lib/api-upload.ts';
import { keepGround } from './keep-ground.ts';

type Upload = {
  readonly file: File;
  readonly source: string;
  /** The EPSG number of its points' grid; the scheme's where none is said. */
  readonly crs: number | undefined;
  readonly signal: AbortSignal;
};

/** Sends spot heights or a grid; what was there is replaced once all of it has been read. */
export function useUploadGround(schemeId: string) {
  const client = useQueryClient();
  const [progress, setProgress] = useState<UploadProgress>();
  const upload = useMutation({
    mutationFn: ({ file, source, crs, signal }: Upload) => {
      const words = new URLSearchParams({ source });
      if (crs !== undefined) words.set('crs', String(crs));
      const path = `${apiPath`/api/schemes/${schemeId}/ground/file`}?${words.toString()}`;
      return apiUpload({ path, file, signal, schema: groundSchema, onProgress: setProgress });
    },
    onMutate: ({ file }) => {
      setProgress({ sent: 0, total: file.size });
    },
    onSuccess: (answer) => keepGround(client, schemeId, answer),
  });
  return { upload, progress };
}
