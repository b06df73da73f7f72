import { queryOptions } from '@tanstack/react-query';
import { schemeSchema } from '../../../../shared/schemas/schemes.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** One scheme. Everything fetched about it stands under the same key. */
export function schemeQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId],
    queryFn: ({ signal }) => apiGet(apiPath`/api/schemes/${schemeId}`, schemeSchema, signal),
  });
}
