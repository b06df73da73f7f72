import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiError, isRefusal } from './api-error.ts';

/** Where the session stands among what has been fetched. */
export const SESSION_KEY = ['session'] as const;

const ONE_MINUTE = 60_000;

function retryOnce(failures: number, error: Error): boolean {
  const passing = error instanceof ApiError && (error.status === 0 || error.status >= 502);
  return passing && failures < 1;
}

/** A refusal for want of a session: ask who is signed in, and the screens follow. */
function askWhoIsSignedIn(error: Error): void {
  if (isRefusal(error, 'not-signed-in', 'csrf-failed')) {
    void queryClient.invalidateQueries({ queryKey: SESSION_KEY });
  }
}

/** What has been fetched, for the whole page. */
export const queryClient = new QueryClient({
  queryCache: new QueryCache({ onError: askWhoIsSignedIn }),
  mutationCache: new MutationCache({ onError: askWhoIsSignedIn }),
  defaultOptions: {
    // without a network, say so at once instead of waiting for one
    queries: { staleTime: ONE_MINUTE, retry: retryOnce, networkMode: 'always' },
    mutations: { retry: false, networkMode: 'always' },
  },
});
