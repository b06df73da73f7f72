import { queryOptions } from '@tanstack/react-query';
import { registerPlaceSchema } from '../../../../shared/schemas/register.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { asQuery, type Which } from './which-buildings.ts';

/** Where a building stands among the rows, if it does. */
export function registerPlaceQuery(schemeId: string, which: Which, buildingId: number) {
  const words = asQuery(which, { buildingId: String(buildingId) });
  return queryOptions({
    queryKey: ['schemes', schemeId, 'register', 'place', which, buildingId],
    queryFn: ({ signal }) =>
      apiGet(
        `${apiPath`/api/schemes/${schemeId}/register/place`}?${words}`,
        registerPlaceSchema,
        signal,
      ),
  });
}
