import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { letterSchema, listedLettersSchema } from '../../../../shared/schemas/letters.ts';
import { apiGet, apiSend, noAnswer } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { lettersKey } from './letters-key.ts';

/** Letters that nobody has answered in the days they had, or for so long that somebody has to call or go. */
export function lateLettersQuery(schemeId: string, overdue: 'answer' | 'call') {
  return queryOptions({
    queryKey: [...lettersKey(schemeId), 'late', overdue],
    queryFn: ({ signal }) =>
      apiGet(
        `${apiPath`/api/schemes/${schemeId}/letters`}?overdue=${overdue}`,
        listedLettersSchema,
        signal,
      ),
  });
}

/** The letters that name a building. */
export function lettersOfBuildingQuery(schemeId: string, buildingId: number) {
  return queryOptions({
    queryKey: [...lettersKey(schemeId), 'building', buildingId],
    queryFn: ({ signal }) =>
      apiGet(
        `${apiPath`/api/schemes/${schemeId}/letters`}?building=${buildingId}`,
        listedLettersSchema,
        signal,
      ),
  });
}

/** A letter, whole. */
export function letterQuery(schemeId: string, letterId: string) {
  return queryOptions({
    queryKey: [...lettersKey(schemeId), 'letter', letterId],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/letters/${letterId}`, letterSchema, signal),
  });
}

/** Records that a letter was acknowledged in another way than on the owner's page. */
export function useAcknowledge(schemeId: string, letterId: string, onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (how: string) =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/letters/${letterId}/acknowledgement`,
        noAnswer,
        { how },
      ),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: lettersKey(schemeId) }),
  });
}
