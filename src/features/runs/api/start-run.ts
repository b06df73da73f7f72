import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import { runSchema } from '../../../../shared/schemas/runs.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { alignmentsQuery } from '../../alignments/api/list-alignments.ts';
import { runsQuery } from './list-runs.ts';

/** Starts a run of an option at the version that was seen, over the register as it is. */
export function useStartRun(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, version }: Pick<AlignmentAnswer, 'id' | 'version'>) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/runs`, runSchema, {
        alignmentId: id,
        alignmentVersion: version,
      }),
    onSuccess: () => client.invalidateQueries({ queryKey: runsQuery(schemeId).queryKey }),
    // somebody else changed it, or took it away
    onError: () => client.invalidateQueries({ queryKey: alignmentsQuery(schemeId).queryKey }),
  });
}
