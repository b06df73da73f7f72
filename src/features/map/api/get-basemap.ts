import { queryOptions } from '@tanstack/react-query';
import { basemapSchema } from '../../../../shared/schemas/basemap.ts';
import { apiGet } from '../../../lib/api-client.ts';

/** Where the demo's own map is; only the demo has one. */
export const basemapQuery = queryOptions({
  queryKey: ['basemap'],
  queryFn: ({ signal }) => apiGet('/tiles/tiles.json', basemapSchema, signal),
  staleTime: Infinity,
});
