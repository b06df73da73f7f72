import { useMutation, useQueryClient } from '@tanstack/react-query';
import { runSchema } from '../../../../shared/schemas/runs.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { runsQuery } from './list-runs.ts';

/** Goes on with a run from where it stopped. */
export function useResumeRun(schemeId: string, runId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/runs/${runId}/resume`, runSchema),
    onSettled: () => client.invalidateQueries({ queryKey: runsQuery(schemeId).queryKey }),
  });
}
