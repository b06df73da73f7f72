import { useMutation, useQueryClient } from '@tanstack/react-query';
import { apiSend, noAnswer } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { alignmentsQuery } from './list-alignments.ts';

/** Removes an option; the audit trail keeps its design. */
export function useRemoveAlignment(schemeId: string, alignmentId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () =>
      apiSend('DELETE', apiPath`/api/schemes/${schemeId}/alignments/${alignmentId}`, noAnswer),
    onSettled: () => client.invalidateQueries({ queryKey: alignmentsQuery(schemeId).queryKey }),
  });
}
