import { queryOptions } from '@tanstack/react-query';
import { ownLetterTextSchema } from '../../../../shared/schemas/own.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { ownKey } from './get-own.ts';

/** A letter to an owner, as it was sent. */
export function ownLetterQuery(schemeId: string, letterId: string) {
  return queryOptions({
    queryKey: [...ownKey(schemeId), 'letters', letterId],
    queryFn: ({ signal }) =>
      apiGet(
        apiPath`/api/schemes/${schemeId}/own/letters/${letterId}`,
        ownLetterTextSchema,
        signal,
      ),
  });
}
