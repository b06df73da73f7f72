import { useMutation, useQueryClient } from '@tanstack/react-query';
import { partySchema, type Party, type PartyValues } from '../../../../shared/schemas/parties.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { partiesKey } from './list-parties.ts';

/** Adds a party, or writes one anew on top of the version that was seen. */
export function useKeepParty(
  schemeId: string,
  seen: Pick<Party, 'id' | 'version'> | null,
  onDone: (party: Party) => void,
) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (values: PartyValues) =>
      seen === null
        ? apiSend('POST', apiPath`/api/schemes/${schemeId}/parties`, partySchema, values)
        : apiSend('PUT', apiPath`/api/schemes/${schemeId}/parties/${seen.id}`, partySchema, {
            version: seen.version,
            values,
          }),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: partiesKey(schemeId) }),
  });
}
