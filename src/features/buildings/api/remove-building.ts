import { useMutation, useQueryClient } from '@tanstack/react-query';
import { registerChangeSchema } from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshRegister } from './refresh-register.ts';

type SeenBuilding = { readonly id: number; readonly version: number };

/** Takes a building out of the register, in the version that was seen. */
export function useRemoveBuilding(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, version }: SeenBuilding) =>
      apiSend('DELETE', apiPath`/api/schemes/${schemeId}/buildings/${id}`, registerChangeSchema, {
        version,
      }),
    onSettled: () => refreshRegister(client, schemeId),
  });
}
