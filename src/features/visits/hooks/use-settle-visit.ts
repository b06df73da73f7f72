import { useQuery } from '@tanstack/react-query';
import { isRefusal } from '../../../lib/api-error.ts';
import { buildingQuery } from '../../buildings/api/get-building.ts';
import type { EditedName } from '../../buildings/building-draft.ts';
import { clashOfVisit, settled } from '../draft/clash-of-visit.ts';
import { seenOf, type KeptVisit } from '../draft/kept-visit.ts';
import { useVisitStore } from '../draft/visit-store-context.ts';
import { useKeptChanged } from './use-kept-visits.ts';

/** What can be done about a visit that the server did not record as it was. */
export function useSettleVisit(visit: KeptVisit) {
  const store = useVisitStore();
  const changed = useKeptChanged();
  const isClash = visit.state === 'clash';
  const building = useQuery({
    ...buildingQuery(visit.schemeId, visit.buildingId),
    enabled: isClash,
    staleTime: 0,
  });
  const fresh = building.data === undefined ? null : seenOf(building.data);
  async function put(next: KeptVisit) {
    await store.put(next);
    await changed();
  }
  return {
    clash: isClash && fresh !== null && !building.isFetching ? clashOfVisit(visit, fresh) : null,
    /** The building was taken out of the register: nothing of it can be put right any more. */
    isGone: isClash && isRefusal(building.error, 'not-found'),
    settle: (mine: readonly EditedName[]) => put(settled(visit, fresh, mine)),
    /** Back to being written; the register is seen as it is now. */
    reopen: () => put({ ...visit, state: 'draft', visitedAt: null, seen: fresh, fault: null }),
    remove: async () => {
      await store.remove(visit);
      await changed();
    },
  };
}
