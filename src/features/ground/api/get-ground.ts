import { queryOptions } from '@tanstack/react-query';
import { groundSchema } from '../../../../shared/schemas/ground.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** A scheme's ground, and which buildings took their level from it. */
export function groundQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'ground'],
    queryFn: ({ signal }) => apiGet(apiPath`/api/schemes/${schemeId}/ground`, groundSchema, signal),
  });
}
