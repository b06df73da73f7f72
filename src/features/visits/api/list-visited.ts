import { queryOptions } from '@tanstack/react-query';
import { visitedBuildingsSchema } from '../../../../shared/schemas/visits.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** Which buildings of a scheme have been visited, the last visit first. */
export function visitedQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'visits'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/visits`, visitedBuildingsSchema, signal),
  });
}
