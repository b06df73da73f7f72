import { useMutation, useQueryClient } from '@tanstack/react-query';
import { alignmentSchema } from '../../../../shared/schemas/alignments.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { alignmentsQuery } from './list-alignments.ts';

/** Adds an option that starts as another one is. */
export function useCopyAlignment(schemeId: string, alignmentId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (name: string) =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/alignments/${alignmentId}/copies`,
        alignmentSchema,
        { name },
      ),
    onSuccess: () => client.invalidateQueries({ queryKey: alignmentsQuery(schemeId).queryKey }),
  });
}
