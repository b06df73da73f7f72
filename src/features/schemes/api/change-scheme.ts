import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { schemeSchema, type changeSchemeSchema } from '../../../../shared/schemas/schemes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { isRefusal } from '../../../lib/api-error.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { schemeQuery } from './get-scheme.ts';
import { keepScheme } from './keep-scheme.ts';

/** Changes the name or the description of a scheme. */
export function useChangeScheme(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: z.infer<typeof changeSchemeSchema>) =>
      apiSend('PATCH', apiPath`/api/schemes/${schemeId}`, schemeSchema, change),
    onSuccess: (scheme) => {
      keepScheme(client, scheme);
    },
    // somebody else was faster: what they saved is asked for
    onError: (error) => {
      if (isRefusal(error, 'conflict')) {
        void client.invalidateQueries({ queryKey: schemeQuery(schemeId).queryKey, exact: true });
      }
    },
  });
}
