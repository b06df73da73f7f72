import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { isRefusal } from '../../../lib/api-error.ts';
import { SESSION_KEY } from '../../../lib/query-client.ts';
import { refreshRegister } from '../../buildings/api/refresh-register.ts';
import { usePerson } from '../../session/person-context.ts';
import { visitedQuery } from '../api/list-visited.ts';
import { postVisits } from '../api/post-visit.ts';
import type { KeptVisit } from '../draft/kept-visit.ts';
import { sendKept } from '../draft/send-kept.ts';
import { useVisitStore } from '../draft/visit-store-context.ts';
import type { VisitStore } from '../draft/visit-store.ts';

const KEPT = 'kept-visits';

function keptQuery(store: VisitStore, personId: string) {
  return queryOptions({
    queryKey: [KEPT, personId],
    queryFn: async () => (await store.all()).filter((visit) => visit.personId === personId),
    staleTime: 0,
    retry: false,
  });
}

/** The visits that the person keeps on this phone, being written or not sent yet. */
export function useKeptVisits() {
  return useQuery(keptQuery(useVisitStore(), usePerson().id));
}

/** Tells whoever lists kept visits that they changed. */
export function useKeptChanged(): () => Promise<void> {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: [KEPT] });
}

/** Sends what is kept; what went changes what the scheme shows. */
function useSendKept(schemeId: string) {
  const client = useQueryClient();
  const store = useVisitStore();
  const { id } = usePerson();
  const changed = useKeptChanged();
  return useMutation({
    // one after the other: what is under way is not begun again
    scope: { id: 'send-kept-visits' },
    mutationFn: () => sendKept(store, postVisits, id),
    onSettled: changed,
    onSuccess: async ({ sent, stopped }) => {
      // what is kept stays here while they sign in again
      if (isRefusal(stopped, 'not-signed-in', 'csrf-failed')) {
        void client.invalidateQueries({ queryKey: SESSION_KEY });
      }
      if (sent === 0) return;
      await Promise.all([
        client.invalidateQueries({ queryKey: visitedQuery(schemeId).queryKey }),
        refreshRegister(client, schemeId),
      ]);
    },
  });
}

/** What waits to be sent: goes when the network is back and when the page is looked at again. */
export function useSending(schemeId: string, waiting: readonly KeptVisit[]) {
  const send = useSendKept(schemeId);
  const { mutate } = send;
  const hasSome = waiting.some(({ state }) => state === 'kept');
  useEffect(() => {
    if (!hasSome) return;
    function sendNow() {
      if (navigator.onLine && document.visibilityState === 'visible') mutate();
    }
    sendNow();
    window.addEventListener('online', sendNow);
    document.addEventListener('visibilitychange', sendNow);
    return () => {
      window.removeEventListener('online', sendNow);
      document.removeEventListener('visibilitychange', sendNow);
    };
  }, [hasSome, mutate]);
  return send;
}
