import { queryOptions } from '@tanstack/react-query';
import { extentSchema } from '../../../../shared/schemas/buildings.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** Where a scheme is. */
export function extentQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'extent'],
    queryFn: ({ signal }) => apiGet(apiPath`/api/schemes/${schemeId}/extent`, extentSchema, signal),
  });
}
