import { useMutation, useQueryClient } from '@tanstack/react-query';
import { sessionSchema } from '../../../../shared/schemas/session.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { keepSession } from './keep-session.ts';

/** Signs out here, or everywhere. */
export function useSignOut(where: 'here' | 'everywhere' = 'here') {
  const client = useQueryClient();
  const path = where === 'here' ? '/api/session' : '/api/sessions';
  return useMutation({
    mutationFn: () => apiSend('DELETE', path, sessionSchema),
    onSuccess: (session) => {
      keepSession(client, session);
    },
  });
}
