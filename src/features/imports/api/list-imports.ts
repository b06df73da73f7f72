import { queryOptions } from '@tanstack/react-query';
import { importListSchema } from '../../../../shared/schemas/imports.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The imports of a scheme, the newest first. Each import stands under the same key. */
export function importsQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'imports'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/imports`, importListSchema, signal),
  });
}
