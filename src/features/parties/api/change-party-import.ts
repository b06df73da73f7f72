import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  partyImportSchema,
  type PartyColumns,
  type PartyImport,
} from '../../../../shared/schemas/party-imports.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { partiesKey } from './list-parties.ts';
import { partyImportsKey } from './party-imports.ts';

/** What can be done with an import that was checked: check it anew, take it over, give it up. */
export function useChangePartyImport(schemeId: string, id: string) {
  const client = useQueryClient();
  const path = apiPath`/api/schemes/${schemeId}/party-imports/${id}`;
  const onSettled = () =>
    Promise.all(
      [partyImportsKey(schemeId), partiesKey(schemeId)].map((queryKey) =>
        client.invalidateQueries({ queryKey }),
      ),
    );
  const check = useMutation({
    mutationFn: (columns: PartyColumns) =>
      apiSend('PUT', `${path}/columns`, partyImportSchema, { columns }),
    onSettled,
  });
  const takeOver = useMutation({
    mutationFn: (counts: PartyImport['counts']) =>
      apiSend('POST', `${path}/take-over`, partyImportSchema, { counts }),
    onSettled,
  });
  const giveUp = useMutation({
    mutationFn: () => apiSend('DELETE', path, partyImportSchema),
    onSettled,
  });
  return { check, takeOver, giveUp };
}
