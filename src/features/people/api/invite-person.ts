import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { personSchema, type newPersonSchema } from '../../../../shared/schemas/people.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { membersQuery } from '../../members/api/list-members.ts';
import { waitingQuery } from '../../waiting/api/get-waiting.ts';
import { peopleQuery } from './list-people.ts';

/** Adds a person and sends them an invitation. */
export function useInvitePerson() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (person: z.input<typeof newPersonSchema>) =>
      apiSend('POST', '/api/people', personSchema, person),
    onSuccess: async (_, { memberships = [] }) => {
      for (const { schemeId } of memberships) {
        void client.invalidateQueries({ queryKey: membersQuery(schemeId).queryKey });
      }
      void client.invalidateQueries({ queryKey: waitingQuery.queryKey });
      await client.invalidateQueries({ queryKey: peopleQuery.queryKey });
    },
  });
}
