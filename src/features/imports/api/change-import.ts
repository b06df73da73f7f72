import { useMutation, useQueryClient } from '@tanstack/react-query';
import { importSchema, type ImportOptions } from '../../../../shared/schemas/imports.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { fetchAfterConflict, keepImport } from './keep-import.ts';

type Change = { readonly version: number; readonly options: ImportOptions };

/** Chooses otherwise; the server then checks the file again. */
export function useChangeImport(schemeId: string, importId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: Change) =>
      apiSend('PATCH', apiPath`/api/schemes/${schemeId}/imports/${importId}`, importSchema, change),
    onSuccess: (answer) => {
      keepImport(client, schemeId, answer);
    },
    onError: (error) => {
      fetchAfterConflict(client, schemeId, importId, error);
    },
  });
}
