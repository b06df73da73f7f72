import { queryOptions } from '@tanstack/react-query';
import { runDetailSchema } from '../../../../shared/schemas/runs.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { runsQuery } from './list-runs.ts';

/** One run with what was put in, and once it is complete how many buildings stand where. */
export function runQuery(schemeId: string, runId: string) {
  return queryOptions({
    queryKey: [...runsQuery(schemeId).queryKey, runId],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/runs/${runId}`, runDetailSchema, signal),
  });
}
