import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { Draft } from './draft.ts';

/** The buildings that a draft is made of. */
export function basesOf(draft: Draft): readonly BuildingAnswer[] {
  if (draft.tool === 'join') return draft.buildings;
  return draft.building === null ? [] : [draft.building];
}

/** The same draft on top of the buildings as they are now. */
export function rebased(draft: Draft, fresh: readonly BuildingAnswer[]): Draft {
  function now<T extends BuildingAnswer | null>(seen: T): T | BuildingAnswer {
    return fresh.find(({ id }) => id === seen?.id) ?? seen;
  }
  if (draft.tool === 'join') return { ...draft, buildings: draft.buildings.map(now) };
  return { ...draft, building: now(draft.building) };
}
