import { queryOptions } from '@tanstack/react-query';
import { runMapSchema } from '../../../../shared/schemas/run-map.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The figures of a complete run that the map is coloured by. They never change. */
export function runMapQuery(schemeId: string, runId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'run-map', runId],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/runs/${runId}/map`, runMapSchema, signal),
    staleTime: Infinity,
  });
}
