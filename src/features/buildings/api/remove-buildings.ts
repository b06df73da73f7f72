import { useMutation, useQueryClient } from '@tanstack/react-query';
import { registerChangeSchema } from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshRegister } from './refresh-register.ts';

/** A building in the version that was seen. */
export type SeenBuilding = { readonly id: number; readonly version: number };

type Removed = {
  readonly changeIds: readonly string[];
  /** Why it stopped before the last of them. */
  readonly fault: Error | null;
};

/** Takes buildings out of the register, one after the other; what was done before a fault is told. */
export function useRemoveBuildings(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (buildings: readonly SeenBuilding[]): Promise<Removed> => {
      const changeIds: string[] = [];
      for (const { id, version } of buildings) {
        const path = apiPath`/api/schemes/${schemeId}/buildings/${id}`;
        try {
          const { changeId } = await apiSend('DELETE', path, registerChangeSchema, { version });
          changeIds.push(changeId);
        } catch (error) {
          if (changeIds.length === 0 || !(error instanceof Error)) throw error;
          return { changeIds, fault: error };
        }
      }
      return { changeIds, fault: null };
    },
    onSettled: () => refreshRegister(client, schemeId),
  });
}
