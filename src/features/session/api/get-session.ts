import { queryOptions } from '@tanstack/react-query';
import { sessionSchema } from '../../../../shared/schemas/session.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { SESSION_KEY } from '../../../lib/query-client.ts';

/** Who is signed in, if anybody. */
export const sessionQuery = queryOptions({
  queryKey: SESSION_KEY,
  queryFn: ({ signal }) => apiGet('/api/session', sessionSchema, signal),
  staleTime: 5 * 60_000,
});
