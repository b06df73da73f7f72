import { useQuery } from '@tanstack/react-query';
import { usePerson } from '../../session/person-context.ts';
import { blankVisit, type KeptVisit } from '../draft/kept-visit.ts';
import { useVisitStore } from '../draft/visit-store-context.ts';

type Place = Pick<KeptVisit, 'schemeId' | 'buildingId' | 'title'>;

/** The visit of a building that the person left off writing on this phone, or a new one, at each arrival. */
export function useOpenedDraft(place: Place, arrival: string, isReady: boolean) {
  const store = useVisitStore();
  const { id: personId } = usePerson();
  return useQuery({
    queryKey: ['visit-draft', personId, place.schemeId, place.buildingId, arrival],
    enabled: isReady,
    queryFn: async () => {
      const left = (await store.all()).find(
        (visit) =>
          visit.state === 'draft' &&
          visit.personId === personId &&
          visit.schemeId === place.schemeId &&
          visit.buildingId === place.buildingId,
      );
      return left ?? blankVisit({ ...place, personId, id: crypto.randomUUID() });
    },
    // read once: what is written from then on is in the form
    staleTime: Infinity,
    gcTime: 0,
    retry: false,
    refetchOnReconnect: false,
  });
}
