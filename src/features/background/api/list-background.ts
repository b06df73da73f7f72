import { queryOptions } from '@tanstack/react-query';
import { backgroundLayersSchema } from '../../../../shared/schemas/background.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** Every layer of a scheme's background with how much it holds. */
export function backgroundQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'background'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/background`, backgroundLayersSchema, signal),
  });
}
