import { queryOptions } from '@tanstack/react-query';
import { registerIdsSchema, type RegisterFilter } from '../../../../shared/schemas/register.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The numbers of the buildings that a filter means. */
export function registerIdsQuery(schemeId: string, filter: RegisterFilter) {
  const words = new URLSearchParams({ filter: JSON.stringify(filter) }).toString();
  return queryOptions({
    queryKey: ['schemes', schemeId, 'register', 'ids', filter],
    queryFn: ({ signal }) =>
      apiGet(
        `${apiPath`/api/schemes/${schemeId}/register/ids`}?${words}`,
        registerIdsSchema,
        signal,
      ),
  });
}
