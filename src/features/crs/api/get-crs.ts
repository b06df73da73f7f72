import { queryOptions } from '@tanstack/react-query';
import { crsSchema } from '../../../../shared/schemas/crs.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** One projected system with its definition. It never changes. */
export function crsQuery(code: number) {
  return queryOptions({
    queryKey: ['crs', code],
    queryFn: ({ signal }) => apiGet(apiPath`/api/crs/${code}`, crsSchema, signal),
    staleTime: Infinity,
  });
}
