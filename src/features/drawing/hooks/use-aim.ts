import { useQueryClient } from '@tanstack/react-query';
import { buildingQuery } from '../../buildings/api/get-building.ts';
import type { Aim, AimRequest } from '../../map/map-drawing.ts';
import { aimAt } from '../drafts/aim.ts';
import { partsOf, type Parts, type ShapeDraft } from '../drafts/draft.ts';

/** Where the pointer means, by the exact corners of the neighbours that are near. */
export function useAim(schemeId: string) {
  const client = useQueryClient();

  function neighboursOf({ tool, building }: ShapeDraft, { near }: AimRequest): readonly number[] {
    // a line may begin at a corner of what it splits
    return near.filter((id) => tool === 'split' || id !== building?.id);
  }
  function known(ids: readonly number[]): Parts[] {
    return ids.flatMap((id) => {
      const answer = client.getQueryData(buildingQuery(schemeId, id).queryKey);
      return answer === undefined ? [] : [partsOf(answer.footprint)];
    });
  }
  function fetchMissing(ids: readonly number[]): Promise<unknown> {
    const missing = ids.filter((id) => {
      return client.getQueryData(buildingQuery(schemeId, id).queryKey) === undefined;
    });
    // one that does not come is not snapped to
    return Promise.allSettled(missing.map((id) => client.query(buildingQuery(schemeId, id))));
  }
  return {
    aim: (draft: ShapeDraft, request: AimRequest): Aim => {
      const ids = neighboursOf(draft, request);
      void fetchMissing(ids);
      return aimAt(draft, request, known(ids));
    },
    settle: async (draft: ShapeDraft, request: AimRequest): Promise<Aim> => {
      const ids = neighboursOf(draft, request);
      await fetchMissing(ids);
      return aimAt(draft, request, known(ids));
    },
  };
}
