import { queryOptions } from '@tanstack/react-query';
import { runBuildingSchema } from '../../../../shared/schemas/runs.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** One building in a complete run: what was put in, and what was found. */
export function runBuildingQuery(schemeId: string, runId: string, buildingId: number) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'run-buildings', runId, buildingId],
    queryFn: ({ signal }) =>
      apiGet(
        apiPath`/api/schemes/${schemeId}/runs/${runId}/buildings/${buildingId}`,
        runBuildingSchema,
        signal,
      ),
  });
}
