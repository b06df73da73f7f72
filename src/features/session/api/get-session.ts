import { queryOptions } from '@tanstack/react-query';
import { SESSION_KEY } from '../../../lib/query-client.ts';
import { fetchSession } from '../../../lib/with-csrf-token.ts';

/** Who is signed in, if anybody. */
export const sessionQuery = queryOptions({
  queryKey: SESSION_KEY,
  queryFn: fetchSession,
  staleTime: 5 * 60_000,
});
