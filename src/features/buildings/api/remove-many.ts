import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  registerChangeSchema,
  type RegisterChange,
  type removeManySchema,
} from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshRegister } from './refresh-register.ts';

/** Takes all buildings that a filter means out of the register. */
export function useRemoveMany(schemeId: string, onDone: (change: RegisterChange) => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (meant: z.input<typeof removeManySchema>) =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/buildings/removals`,
        registerChangeSchema,
        meant,
      ),
    // told before the rows are fetched anew, which may take away what asked
    onSuccess: onDone,
    onSettled: () => refreshRegister(client, schemeId),
  });
}
