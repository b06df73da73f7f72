import { useMutation, useQueryClient } from '@tanstack/react-query';
import { importSchema } from '../../../../shared/schemas/imports.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { fetchAfterConflict, keepImport } from './keep-import.ts';

/** Brings the buildings in as they were checked, all of them or none. */
export function useConfirmImport(schemeId: string, importId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (version: number) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/imports/${importId}/confirm`, importSchema, {
        version,
      }),
    onSuccess: (answer) => {
      keepImport(client, schemeId, answer);
    },
    onError: (error) => {
      fetchAfterConflict(client, schemeId, importId, error);
    },
  });
}
