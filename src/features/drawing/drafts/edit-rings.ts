import { nearestOnSegment } from '../../../../shared/geometry/nearest-on-segment.ts';
import { pointInPolygon } from '../../../../shared/geometry/point-in-polygon.ts';
import { polygonEdges } from '../../../../shared/geometry/polygon-edges.ts';
import type { GridPlace } from '../../map/place/grid-projection.ts';
import {
  lineOf,
  type CornerDraft,
  type Parts,
  type Ring,
  type RingAt,
  type ShapeDraft,
} from './draft.ts';
import { LEAST_CORNERS } from './edit-corners.ts';

/** What stands no farther from a wall stands on it, in metres. */
const ON_WALL = 0.01;

/** What of a building is drawn beside its first outline. */
export type RingKind = 'courtyard' | 'part';

/** What is being added to a building; null while its first outline is drawn, or nothing. */
export function addingOf({ tool, open }: ShapeDraft): RingKind | null {
  if (open === null || tool === 'split') return null;
  if (open.ring > 0) return 'courtyard';
  return open.part > 0 ? 'part' : null;
}

/** A courtyard or a part begun; where it belongs is told by where it is drawn. */
export function beginRing(draft: ShapeDraft, kind: RingKind): ShapeDraft {
  const { parts, open, tool } = draft;
  const [first = []] = parts;
  if (open !== null || tool === 'split') return draft;
  if (kind === 'part') {
    return { ...draft, parts: [...parts, [[]]], open: { part: parts.length, ring: 0 } };
  }
  return {
    ...draft,
    parts: parts.with(0, [...first, []]),
    open: { part: 0, ring: first.length },
  };
}

function without(parts: Parts, { part, ring }: RingAt): Parts {
  if (ring === 0) return parts.toSpliced(part, 1);
  return parts.map((rings, p) => (p === part ? rings.toSpliced(ring, 1) : rings));
}

/** What is closed by now. */
export function closedParts({ parts, open }: Pick<CornerDraft, 'parts' | 'open'>): Parts {
  return open === null ? parts : without(parts, open);
}

/** Without what was being added. */
export function leaveRing(draft: ShapeDraft): ShapeDraft {
  return addingOf(draft) === null ? draft : { ...draft, parts: closedParts(draft), open: null };
}

/** Whether a ring can go: the outline of the only part stays. */
export function isRemovable({ parts }: Pick<CornerDraft, 'parts'>, { ring }: RingAt): boolean {
  return ring > 0 || parts.length > 1;
}

/** Without a courtyard, or without a part and its courtyards. */
export function removeRing<T extends CornerDraft>(draft: T, at: RingAt): T {
  if (!isRemovable(draft, at)) return draft;
  return { ...draft, parts: without(draft.parts, at) };
}

function isOnWall(place: GridPlace, rings: readonly Ring[]): boolean {
  return rings
    .flatMap(polygonEdges)
    .some((edge) => nearestOnSegment(place, edge).distance <= ON_WALL);
}

function isInside(place: GridPlace, rings: readonly Ring[]): boolean {
  return pointInPolygon(place, rings) && !isOnWall(place, rings);
}

function isOutside(place: GridPlace, rings: readonly Ring[]): boolean {
  return !pointInPolygon(place, rings) && !isOnWall(place, rings);
}

/** The part that all corners of a courtyard lie in; −1 where there is none. */
function partAround(parts: Parts, courtyard: Ring): number {
  return parts.findIndex((rings) => !courtyard.some((corner) => isOutside(corner, rings)));
}

/** Why what is added cannot be closed yet, or null; the server looks at how walls cross. */
export function reasonToStayOpen(draft: ShapeDraft): string | null {
  const line = lineOf(draft);
  const others = closedParts(draft);
  switch (addingOf(draft)) {
    case 'courtyard':
      return partAround(others, line) === -1
        ? 'A courtyard lies inside the building: one of its corners is outside.'
        : null;
    case 'part':
      return others.some((rings) => line.some((corner) => isInside(corner, rings)))
        ? 'A part lies beside the others: one of its corners is inside another.'
        : null;
    case null:
      return null;
  }
}

/** The ring that is drawn closed, a courtyard in the part that it lies in. */
export function closeRing(draft: ShapeDraft): ShapeDraft {
  const line = lineOf(draft);
  if (draft.open === null || draft.tool === 'split' || line.length < LEAST_CORNERS) return draft;
  if (reasonToStayOpen(draft) !== null) return draft;
  if (addingOf(draft) !== 'courtyard') return { ...draft, open: null };
  const parts = closedParts(draft);
  const around = partAround(parts, line);
  return {
    ...draft,
    parts: parts.map((rings, p) => (p === around ? [...rings, line] : rings)),
    open: null,
  };
}
