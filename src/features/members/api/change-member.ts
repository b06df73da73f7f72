import { useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import type { Role } from '../../../../shared/schemas/roles.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { peopleQuery } from '../../people/api/list-people.ts';
import { waitingQuery } from '../../waiting/api/get-waiting.ts';
import { membersQuery } from './list-members.ts';

/** Sets all roles of a person in a scheme; none takes them out of it. */
export function useChangeMember(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ personId, roles }: { personId: string; roles: readonly Role[] }) =>
      apiSend('PUT', apiPath`/api/schemes/${schemeId}/members/${personId}`, z.unknown(), { roles }),
    onSuccess: async () => {
      void client.invalidateQueries({ queryKey: peopleQuery.queryKey });
      void client.invalidateQueries({ queryKey: waitingQuery.queryKey });
      await client.invalidateQueries({ queryKey: membersQuery(schemeId).queryKey });
    },
  });
}
