import { queryOptions } from '@tanstack/react-query';
import { visitsSchema } from '../../../../shared/schemas/visits.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The visits of one building, the newest first. */
export function visitsQuery(schemeId: string, buildingId: number) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'visits', buildingId],
    queryFn: ({ signal }) =>
      apiGet(
        apiPath`/api/schemes/${schemeId}/buildings/${buildingId}/visits`,
        visitsSchema,
        signal,
      ),
  });
}
