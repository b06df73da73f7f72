import { queryOptions } from '@tanstack/react-query';
import { buildingsFoundSchema } from '../../../../shared/schemas/buildings.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** Buildings by reference, name or address; nothing finds nothing. */
export function buildingSearchQuery(schemeId: string, search: string) {
  const words = new URLSearchParams({ search }).toString();
  return queryOptions({
    queryKey: ['schemes', schemeId, 'buildings', 'search', search],
    queryFn: ({ signal }) =>
      apiGet(
        `${apiPath`/api/schemes/${schemeId}/buildings`}?${words}`,
        buildingsFoundSchema,
        signal,
      ),
    enabled: search !== '',
  });
}
