import { useQueryClient } from '@tanstack/react-query';
import { partyImportSchema } from '../../../../shared/schemas/party-imports.ts';
import { useUpload } from '../../../hooks/use-upload.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { partyImportQuery, partyImportsQuery } from './party-imports.ts';

/** Sends a table of parties to be checked. */
export function useUploadPartyImport(schemeId: string) {
  const client = useQueryClient();
  return useUpload({
    path: apiPath`/api/schemes/${schemeId}/party-imports`,
    method: 'POST',
    schema: partyImportSchema,
    onSuccess: (answer) => {
      client.setQueryData(partyImportQuery(schemeId, answer.id).queryKey, answer);
      void client.invalidateQueries({ queryKey: partyImportsQuery(schemeId).queryKey });
    },
  });
}
