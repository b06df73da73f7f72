import { useMutation, useQueryClient } from '@tanstack/react-query';
import { personSchema } from '../../../../shared/schemas/people.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { peopleQuery } from './list-people.ts';

/** Takes back an invitation that nobody has accepted: its link stops working. */
export function useWithdrawInvitation(personId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => apiSend('DELETE', apiPath`/api/people/${personId}/invitations`, personSchema),
    onSuccess: () => client.invalidateQueries({ queryKey: peopleQuery.queryKey }),
  });
}
