import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { personSchema, type changePersonSchema } from '../../../../shared/schemas/people.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { SESSION_KEY } from '../../../lib/query-client.ts';
import { peopleQuery } from './list-people.ts';

/** Changes a person's name, or whether they are an administrator. It may be oneself. */
export function useChangePerson(personId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: z.infer<typeof changePersonSchema>) =>
      apiSend('PATCH', apiPath`/api/people/${personId}`, personSchema, change),
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: peopleQuery.queryKey }),
        client.invalidateQueries({ queryKey: SESSION_KEY }),
      ]);
    },
  });
}
