import { queryOptions } from '@tanstack/react-query';
import { runContoursSchema } from '../../../../shared/schemas/run-map.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The contours of a complete run. They never change. */
export function runContoursQuery(schemeId: string, runId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'run-contours', runId],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/runs/${runId}/contours`, runContoursSchema, signal),
    staleTime: Infinity,
  });
}
