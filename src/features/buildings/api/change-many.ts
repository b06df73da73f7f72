import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  registerChangeSchema,
  type editManySchema,
} from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshRegister } from './refresh-register.ts';

/** Sets the same values for many buildings. */
export function useChangeMany(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: z.input<typeof editManySchema>) =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/buildings/edits`,
        registerChangeSchema,
        change,
      ),
    onSuccess: () => refreshRegister(client, schemeId),
  });
}
