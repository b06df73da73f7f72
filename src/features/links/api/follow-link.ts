import { useMutation, useQueryClient } from '@tanstack/react-query';
import { sessionSchema } from '../../../../shared/schemas/session.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { keepSession } from '../../session/api/keep-session.ts';

/** Sets the password that a link lets one choose, and signs in. */
export function useFollowLink(token: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (password: string) =>
      apiSend('POST', apiPath`/api/links/${token}`, sessionSchema, { password }),
    onSuccess: (session) => {
      keepSession(client, session);
    },
  });
}
