import { useQueryClient } from '@tanstack/react-query';
import {
  backgroundAnswerSchema,
  type BackgroundLayer,
} from '../../../../shared/schemas/background.ts';
import { useUpload } from '../../../hooks/use-upload.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshBackground } from './refresh-background.ts';

/** Sends a file for a layer of the background; what was there is replaced once it has been read. */
export function useUploadBackground(schemeId: string, layer: BackgroundLayer) {
  const client = useQueryClient();
  return useUpload({
    path: apiPath`/api/schemes/${schemeId}/background/${layer}`,
    schema: backgroundAnswerSchema,
    onSuccess: () => refreshBackground(client, schemeId),
  });
}
