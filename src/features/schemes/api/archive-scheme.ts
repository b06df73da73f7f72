import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { schemeSchema, type archiveSchemeSchema } from '../../../../shared/schemas/schemes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { keepScheme } from './keep-scheme.ts';

/** Archives a scheme, or brings it back. */
export function useArchiveScheme(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: z.infer<typeof archiveSchemeSchema>) =>
      apiSend('PUT', apiPath`/api/schemes/${schemeId}/archived`, schemeSchema, change),
    onSuccess: (scheme) => {
      keepScheme(client, scheme);
    },
  });
}
