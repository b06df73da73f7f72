import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { apiUpload, type Upload, type UploadProgress } from '../lib/api-upload.ts';

/** What is known of a file only once it is chosen. */
type Chosen = { readonly file: File; readonly signal: AbortSignal };

type Destination<T> = Pick<Upload<T>, 'path' | 'method' | 'schema'> & {
  readonly onSuccess: (answer: T) => unknown;
};

/** Sends a file that somebody chooses, and tells how far that is. */
export function useUpload<T>({ onSuccess, ...destination }: Destination<T>) {
  const [progress, setProgress] = useState<UploadProgress>();
  const upload = useMutation({
    mutationFn: (chosen: Chosen) =>
      apiUpload({ ...destination, ...chosen, onProgress: setProgress }),
    onMutate: ({ file }) => {
      setProgress({ sent: 0, total: file.size });
    },
    onSuccess,
  });
  return { upload, progress };
}
