import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  undertakingSchema,
  type Undertaking,
  type UndertakingValues,
} from '../../../../shared/schemas/undertakings.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { waitingQuery } from '../../waiting/api/get-waiting.ts';
import { undertakingsKey } from './list-undertakings.ts';

/** Adds an undertaking, or writes one anew on top of the version that was seen. */
export function useKeepUndertaking(
  schemeId: string,
  seen: Pick<Undertaking, 'id' | 'version'> | null,
  onDone: () => void,
) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (values: UndertakingValues) => {
      const path = apiPath`/api/schemes/${schemeId}/undertakings`;
      if (seen === null) return apiSend('POST', path, undertakingSchema, values);
      const { id, version } = seen;
      return apiSend('PUT', `${path}/${id}`, undertakingSchema, { version, values });
    },
    onSuccess: onDone,
    onSettled: async () => {
      await client.invalidateQueries({ queryKey: undertakingsKey(schemeId) });
      await client.invalidateQueries({ queryKey: waitingQuery.queryKey });
    },
  });
}
