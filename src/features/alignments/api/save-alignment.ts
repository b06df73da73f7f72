import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  alignmentSchema,
  type AlignmentAnswer,
  type AlignmentDesign,
  type Shafts,
} from '../../../../shared/schemas/alignments.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { alignmentsQuery } from './list-alignments.ts';

type Saved = {
  /** The option in the version that was seen; null for a new one. */
  readonly base: Pick<AlignmentAnswer, 'id' | 'version'> | null;
  readonly name: string;
  readonly design: AlignmentDesign;
  readonly shafts: Shafts;
};

/** Adds an option, or changes one on top of the version that was seen. */
export function useSaveAlignment(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ base, name, design, shafts }: Saved) =>
      base === null
        ? apiSend('POST', apiPath`/api/schemes/${schemeId}/alignments`, alignmentSchema, {
            name,
            design,
            shafts,
          })
        : apiSend(
            'PATCH',
            apiPath`/api/schemes/${schemeId}/alignments/${base.id}`,
            alignmentSchema,
            { version: base.version, name, design, shafts },
          ),
    // after a conflict, what somebody else left is fetched too
    onSettled: () => client.invalidateQueries({ queryKey: alignmentsQuery(schemeId).queryKey }),
  });
}
