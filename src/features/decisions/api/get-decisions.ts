import { queryOptions } from '@tanstack/react-query';
import { buildingDecisionsSchema } from '../../../../shared/schemas/decision-answers.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { decisionsKey } from './decisions-key.ts';

/** The decisions on a building for the option of a run, and what can be decided now. */
export function buildingDecisionsQuery(schemeId: string, runId: string, buildingId: number) {
  return queryOptions({
    queryKey: [...decisionsKey(schemeId), 'building', runId, buildingId],
    queryFn: ({ signal }) =>
      apiGet(
        apiPath`/api/schemes/${schemeId}/runs/${runId}/buildings/${buildingId}/decisions`,
        buildingDecisionsSchema,
        signal,
      ),
  });
}
