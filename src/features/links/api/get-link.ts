import { queryOptions } from '@tanstack/react-query';
import { linkSchema } from '../../../../shared/schemas/links.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** Whose link this is. */
export function linkQuery(token: string) {
  return queryOptions({
    queryKey: ['links', token],
    queryFn: ({ signal }) => apiGet(apiPath`/api/links/${token}`, linkSchema, signal),
    staleTime: Infinity,
  });
}
