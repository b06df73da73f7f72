import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { sessionSchema, type changePasswordSchema } from '../../../../shared/schemas/session.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { SESSION_KEY } from '../../../lib/query-client.ts';

/** Changes one's own password; other sessions end, and this one goes on under a new token. */
export function useChangePassword() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (passwords: z.infer<typeof changePasswordSchema>) =>
      apiSend('PUT', '/api/session/password', sessionSchema, passwords),
    onSuccess: (session) => {
      client.setQueryData(SESSION_KEY, session);
    },
  });
}
