import { queryOptions } from '@tanstack/react-query';
import { ownSchema } from '../../../../shared/schemas/own.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** All that is fetched of what is an owner's own stands under it. */
export function ownKey(schemeId: string): readonly string[] {
  return ['schemes', schemeId, 'own'];
}

/** An owner's buildings with all that they are told of them. */
export function ownQuery(schemeId: string) {
  return queryOptions({
    queryKey: [...ownKey(schemeId), 'buildings'],
    queryFn: ({ signal }) => apiGet(apiPath`/api/schemes/${schemeId}/own`, ownSchema, signal),
  });
}
