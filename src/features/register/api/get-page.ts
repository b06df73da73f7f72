import { queryOptions } from '@tanstack/react-query';
import { registerPageSchema } from '../../../../shared/schemas/register.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { asQuery, type Which } from './which-buildings.ts';

/** How many rows are fetched at once. */
export const ROWS_AT_ONCE = 100;

/** Some rows of the register, and how many there are. */
export function registerPageQuery(
  schemeId: string,
  which: Which,
  offset: number,
  limit = ROWS_AT_ONCE,
) {
  const words = asQuery(which, { offset: String(offset), limit: String(limit) });
  return queryOptions({
    queryKey: ['schemes', schemeId, 'register', 'rows', which, offset, limit],
    queryFn: ({ signal }) =>
      apiGet(`${apiPath`/api/schemes/${schemeId}/register`}?${words}`, registerPageSchema, signal),
  });
}
