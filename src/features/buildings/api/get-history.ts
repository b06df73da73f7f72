import { queryOptions } from '@tanstack/react-query';
import { buildingHistorySchema } from '../../../../shared/schemas/register-changes.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** What happened to a building, the newest first. */
export function buildingHistoryQuery(schemeId: string, buildingId: number) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'buildings', buildingId, 'history'],
    queryFn: ({ signal }) =>
      apiGet(
        apiPath`/api/schemes/${schemeId}/buildings/${buildingId}/history`,
        buildingHistorySchema,
        signal,
      ),
  });
}
