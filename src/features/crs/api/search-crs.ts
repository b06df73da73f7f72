import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { crsListSchema, type CrsPurpose } from '../../../../shared/schemas/crs.ts';
import { apiGet } from '../../../lib/api-client.ts';

/** Systems by number, name or place, for a scheme or for a file; nothing finds nothing. */
export function crsSearchQuery(search: string, purpose: CrsPurpose = 'scheme') {
  const words = purpose === 'scheme' ? { search } : { search, for: purpose };
  const asked = new URLSearchParams(words).toString();
  return queryOptions({
    queryKey: ['crs', 'search', purpose, search],
    queryFn: ({ signal }) => apiGet(`/api/crs?${asked}`, crsListSchema, signal),
    enabled: search !== '',
    staleTime: Infinity,
    placeholderData: keepPreviousData,
  });
}
