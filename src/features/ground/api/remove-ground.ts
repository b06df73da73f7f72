import { useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshRegister } from '../../buildings/api/refresh-register.ts';
import { groundQuery } from './get-ground.ts';

/** Takes a scheme's ground away; buildings that took their level from it have none then. */
export function useRemoveGround(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => apiSend('DELETE', apiPath`/api/schemes/${schemeId}/ground`, z.unknown()),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: groundQuery(schemeId).queryKey });
      await refreshRegister(client, schemeId);
    },
  });
}
