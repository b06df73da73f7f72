import { useMutation, useQueryClient } from '@tanstack/react-query';
import { runSchema } from '../../../../shared/schemas/runs.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { runsQuery } from './list-runs.ts';

/** Stops a run, which keeps what it has worked out. */
export function useCancelRun(schemeId: string, runId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/runs/${runId}/cancel`, runSchema),
    onSettled: () => client.invalidateQueries({ queryKey: runsQuery(schemeId).queryKey }),
  });
}
