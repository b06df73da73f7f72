import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { sessionSchema, type signInSchema } from '../../../../shared/schemas/session.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { keepSession } from './keep-session.ts';

/** Signs in. */
export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (credentials: z.infer<typeof signInSchema>) =>
      apiSend('POST', '/api/session', sessionSchema, credentials),
    onSuccess: (session) => {
      keepSession(client, session);
    },
  });
}
