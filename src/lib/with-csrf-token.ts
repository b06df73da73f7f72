import { sessionSchema, type SessionAnswer } from '../../shared/schemas/session.ts';
import { apiCall } from './api-call.ts';
import { isRefusal } from './api-error.ts';
import { queryClient, SESSION_KEY } from './query-client.ts';

/** The session as the server knows it. Nothing cancels it: what is being sent may wait for it too. */
export function fetchSession(): Promise<SessionAnswer> {
  return apiCall('/api/session', sessionSchema);
}

function sessionNow(staleTime: 'static' | 0): Promise<SessionAnswer> {
  return queryClient.query({ queryKey: SESSION_KEY, queryFn: fetchSession, staleTime });
}

/** The header that whatever changes something carries. */
type CsrfHeader = { readonly 'X-CSRF-Token': string };

/**
 * Sends something with the token of the session, which is waited for. Where another window has renewed the
 * session it is sent once more with the new token, but never in the name of somebody else.
 */
export async function withCsrfToken<T>(send: (header: CsrfHeader) => Promise<T>): Promise<T> {
  const session = await sessionNow('static');
  try {
    return await send({ 'X-CSRF-Token': session.csrfToken });
  } catch (error) {
    if (!isRefusal(error, 'csrf-failed')) throw error;
    const renewed = await sessionNow(0);
    if (renewed.person?.id !== session.person?.id) throw error;
    return send({ 'X-CSRF-Token': renewed.csrfToken });
  }
}
