import { useMutation, useQueryClient } from '@tanstack/react-query';
import { personSchema } from '../../../../shared/schemas/people.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { peopleQuery } from './list-people.ts';

/** Sends a person a fresh invitation; the link of the one before stops working. */
export function useInviteAgain() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (personId: string) =>
      apiSend('POST', apiPath`/api/people/${personId}/invitations`, personSchema),
    onSuccess: () => client.invalidateQueries({ queryKey: peopleQuery.queryKey }),
  });
}
