import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  registerChangeSchema,
  type RegisterChange,
} from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshRegister } from './refresh-register.ts';

/**
 * Takes changes of the register back, the last one first. That makes changes of its own: to take them back
 * is to do again what was undone.
 */
export function useUndoChanges(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (changeIds: readonly string[]) => {
      const made: RegisterChange[] = [];
      for (const changeId of changeIds.toReversed()) {
        made.push(
          await apiSend(
            'POST',
            apiPath`/api/schemes/${schemeId}/register-changes/${changeId}/undo`,
            registerChangeSchema,
          ),
        );
      }
      return made;
    },
    onSettled: () => refreshRegister(client, schemeId),
  });
}
