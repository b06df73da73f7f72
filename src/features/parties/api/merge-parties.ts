import { useMutation, useQueryClient } from '@tanstack/react-query';
import { partySchema, type Party } from '../../../../shared/schemas/parties.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { partiesKey } from './list-parties.ts';

type Seen = Pick<Party, 'id' | 'version'>;

/** Makes one of two parties. */
export function useMergeParties(schemeId: string, onDone: (party: Party) => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ stays, goes }: { readonly stays: Seen; readonly goes: Seen }) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/parties/${stays.id}/merge`, partySchema, {
        version: stays.version,
        other: { id: goes.id, version: goes.version },
      }),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: partiesKey(schemeId) }),
  });
}
