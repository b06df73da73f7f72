import { queryOptions } from '@tanstack/react-query';
import { partyDetailSchema } from '../../../../shared/schemas/party-answers.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { partiesKey } from './list-parties.ts';

/** A party with its history. */
export function partyQuery(schemeId: string, partyId: string) {
  return queryOptions({
    queryKey: [...partiesKey(schemeId), 'one', partyId],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/parties/${partyId}`, partyDetailSchema, signal),
  });
}
