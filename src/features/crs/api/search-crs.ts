import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { crsListSchema } from '../../../../shared/schemas/crs.ts';
import { apiGet } from '../../../lib/api-client.ts';

/** Projected systems by number, name or place; nothing finds nothing. */
export function crsSearchQuery(search: string) {
  return queryOptions({
    queryKey: ['crs', 'search', search],
    queryFn: ({ signal }) =>
      apiGet(`/api/crs?${new URLSearchParams({ search }).toString()}`, crsListSchema, signal),
    enabled: search !== '',
    staleTime: Infinity,
    placeholderData: keepPreviousData,
  });
}
