import { useMutation, useQueryClient } from '@tanstack/react-query';
import { alignmentSchema, type AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { alignmentsQuery } from './list-alignments.ts';

/** Gives an option another name and leaves its line as it is. */
export function useRenameAlignment(
  schemeId: string,
  { id, version }: Pick<AlignmentAnswer, 'id' | 'version'>,
) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (name: string) =>
      apiSend('PATCH', apiPath`/api/schemes/${schemeId}/alignments/${id}`, alignmentSchema, {
        version,
        name,
      }),
    onSettled: () => client.invalidateQueries({ queryKey: alignmentsQuery(schemeId).queryKey }),
  });
}
