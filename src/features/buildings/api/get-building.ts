import { queryOptions } from '@tanstack/react-query';
import { buildingSchema } from '../../../../shared/schemas/buildings.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** One building of the register. */
export function buildingQuery(schemeId: string, buildingId: number) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'buildings', buildingId],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/buildings/${buildingId}`, buildingSchema, signal),
  });
}
