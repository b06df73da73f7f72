import type { RegisterChange } from '../../../shared/schemas/register-changes.ts';
import { changeBuilding } from '../buildings/api/change-building.ts';
import { drawBuilding } from '../buildings/api/draw-building.ts';
import { joinBuildings } from '../buildings/api/join-buildings.ts';
import { splitBuilding } from '../buildings/api/split-building.ts';
import { formatFigure } from '../../../shared/presentation/field-words.ts';
import { footprintOf, lineOf, type Draft } from './drafts/draft.ts';
import { splitLine } from './drafts/split-line.ts';

/** Sends what was drawn; a new building is called by `reference`. */
export function sendDraft(
  schemeId: string,
  draft: Draft,
  reference: string,
): Promise<RegisterChange> {
  if (draft.tool === 'join') {
    const buildings = draft.buildings.map(({ id, version }) => ({ id, version }));
    return joinBuildings(schemeId, { buildings });
  }
  const { tool, building, parts } = draft;
  if (building === null) {
    return drawBuilding(schemeId, { reference, footprint: footprintOf(parts) });
  }
  const { id, version } = building;
  if (tool === 'split') {
    const line = splitLine(lineOf(draft)).map(([east, north]): [number, number] => [east, north]);
    return splitBuilding(schemeId, id, { version, line });
  }
  return changeBuilding(schemeId, id, { version, footprint: footprintOf(parts) });
}

/** What was done, in the words of the note that follows. */
export function sentWords(draft: Draft, reference: string): string {
  switch (draft.tool) {
    case 'draw':
      return `${reference} is in the register.`;
    case 'edit':
      return `The outline of ${draft.building?.reference ?? ''} is changed.`;
    case 'split':
      return `${draft.building?.reference ?? ''} is split.`;
    case 'join': {
      const [first, ...others] = draft.buildings.map((one) => one.reference);
      return `${others.join(', ')} joined to ${first ?? ''}.`;
    }
  }
}

const NAMED = 3;

/** Which others a new outline lies over: it is kept all the same, since galleries lie over lanes. */
export function overlapWords({ overlaps = [] }: RegisterChange): string {
  if (overlaps.length === 0) return '';
  const named = overlaps.slice(0, NAMED).map(({ reference, area }) => {
    return `${reference} by ${formatFigure('area', Number(area.toFixed(1)))} m²`;
  });
  const others = overlaps.length - named.length;
  const more = others === 0 ? '' : ` and ${others} ${others === 1 ? 'other' : 'others'}`;
  return ` It lies over ${named.join(', ')}${more}.`;
}
