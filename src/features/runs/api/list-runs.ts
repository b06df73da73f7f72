import { queryOptions } from '@tanstack/react-query';
import { runsSchema } from '../../../../shared/schemas/runs.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The runs of a scheme, the newest first. Each run stands under the same key. */
export function runsQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'runs'],
    queryFn: ({ signal }) => apiGet(apiPath`/api/schemes/${schemeId}/runs`, runsSchema, signal),
  });
}
