import { useMutation, useQueryClient } from '@tanstack/react-query';
import { registerChangeSchema } from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshRegister } from './refresh-register.ts';

/** Takes changes of the register back, the last one first. */
export function useUndoChanges(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (changeIds: readonly string[]) => {
      for (const changeId of changeIds.toReversed()) {
        await apiSend(
          'POST',
          apiPath`/api/schemes/${schemeId}/register-changes/${changeId}/undo`,
          registerChangeSchema,
        );
      }
    },
    onSettled: () => refreshRegister(client, schemeId),
  });
}
