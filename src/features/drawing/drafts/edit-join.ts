import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { JoinDraft } from './draft.ts';

/** As many as are joined at once. */
export const MOST_JOINED = 50;

/** A building picked, or let go where it was picked before. */
export function togglePicked(draft: JoinDraft, building: BuildingAnswer): JoinDraft {
  const others = draft.buildings.filter(({ id }) => id !== building.id);
  if (others.length < draft.buildings.length) return { ...draft, buildings: others };
  if (others.length >= MOST_JOINED) return draft;
  return { ...draft, buildings: [...others, building] };
}
