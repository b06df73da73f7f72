import { useMutation, useQueryClient } from '@tanstack/react-query';
import { partySchema, type Party } from '../../../../shared/schemas/parties.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { partiesKey } from './list-parties.ts';

type Asked = { readonly ground: string; readonly askedOn: string };

/** Erases what is known of a party. */
export function useEraseParty(
  schemeId: string,
  { id, version }: Pick<Party, 'id' | 'version'>,
  onDone: () => void,
) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (asked: Asked) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/parties/${id}/erase`, partySchema, {
        version,
        ...asked,
      }),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: partiesKey(schemeId) }),
  });
}
