import { useMutation, useQueryClient } from '@tanstack/react-query';
import { personSchema } from '../../../../shared/schemas/people.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { peopleQuery } from './list-people.ts';

/** Keeps a person from signing in, or lets them in again. */
export function useShutOutPerson(personId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (shutOut: boolean) =>
      apiSend('PUT', apiPath`/api/people/${personId}/shut-out`, personSchema, { shutOut }),
    onSuccess: () => client.invalidateQueries({ queryKey: peopleQuery.queryKey }),
  });
}
