import type { QueryClient } from '@tanstack/react-query';
import type { SessionAnswer } from '../../../../shared/schemas/session.ts';
import { SESSION_KEY } from '../../../lib/query-client.ts';

/** Takes up a session as the server has just answered it, and forgets what was fetched in another. */
export function keepSession(client: QueryClient, session: SessionAnswer): void {
  client.setQueryData(SESSION_KEY, session);
  client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== SESSION_KEY[0] });
}
