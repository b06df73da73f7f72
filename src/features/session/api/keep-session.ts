import type { QueryClient } from '@tanstack/react-query';
import type { SessionAnswer } from '../../../../shared/schemas/session.ts';
import { SESSION_KEY } from '../../../lib/query-client.ts';

/** The session itself, and what a link says: asked again once it is used, the link is spent. */
const KEPT: readonly unknown[] = [SESSION_KEY[0], 'links'];

/** Takes up a session as the server has just answered it, and forgets what was fetched in another. */
export function keepSession(client: QueryClient, session: SessionAnswer): void {
  client.setQueryData(SESSION_KEY, session);
  client.removeQueries({ predicate: ({ queryKey }) => !KEPT.includes(queryKey[0]) });
}
