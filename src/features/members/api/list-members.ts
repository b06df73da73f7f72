import { queryOptions } from '@tanstack/react-query';
import { membersSchema } from '../../../../shared/schemas/members.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** Everybody in a scheme, with their roles. */
export function membersQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'members'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/members`, membersSchema, signal),
  });
}
