import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { schemeSchema, type newSchemeSchema } from '../../../../shared/schemas/schemes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { waitingQuery } from '../../waiting/api/get-waiting.ts';
import { schemesQuery } from './list-schemes.ts';

/** Makes a scheme. */
export function useCreateScheme() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (scheme: z.input<typeof newSchemeSchema>) =>
      apiSend('POST', '/api/schemes', schemeSchema, scheme),
    onSuccess: () => {
      void client.invalidateQueries({ queryKey: schemesQuery.queryKey, exact: true });
      void client.invalidateQueries({ queryKey: waitingQuery.queryKey });
    },
  });
}
