import { queryOptions } from '@tanstack/react-query';
import { funnelSchema } from '../../../../shared/schemas/decision-answers.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { decisionsKey } from './decisions-key.ts';

/** How many buildings stand at each stage and in each state, by the run that is shown. */
export function funnelQuery(schemeId: string, runId: string | null) {
  return queryOptions({
    queryKey: [...decisionsKey(schemeId), 'funnel', runId],
    queryFn: ({ signal }) => apiGet(apiPath`/api/schemes/${schemeId}/funnel`, funnelSchema, signal),
    enabled: runId !== null,
  });
}
