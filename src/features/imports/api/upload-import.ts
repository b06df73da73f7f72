import { useQueryClient } from '@tanstack/react-query';
import { importSchema } from '../../../../shared/schemas/imports.ts';
import { useUpload } from '../../../hooks/use-upload.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { importQuery } from './get-import.ts';
import { importsQuery } from './list-imports.ts';

/** Sends a file of buildings. Nothing is written to the register before it is confirmed. */
export function useUploadImport(schemeId: string) {
  const client = useQueryClient();
  return useUpload({
    path: apiPath`/api/schemes/${schemeId}/imports`,
    method: 'POST',
    schema: importSchema,
    onSuccess: (answer) => {
      client.setQueryData(importQuery(schemeId, answer.id).queryKey, answer);
      void client.invalidateQueries({ queryKey: importsQuery(schemeId).queryKey, exact: true });
    },
  });
}
