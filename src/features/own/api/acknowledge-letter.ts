import { useMutation, useQueryClient } from '@tanstack/react-query';
import { ownLetterSchema } from '../../../../shared/schemas/own.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { ownKey } from './get-own.ts';

/** Tells that a letter has been read. */
export function useAcknowledgeLetter(schemeId: string, onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (letterId: string) =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/own/letters/${letterId}/acknowledge`,
        ownLetterSchema,
      ),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: ownKey(schemeId) });
      onDone();
    },
  });
}
