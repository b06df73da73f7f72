import type { CornerAt } from '../../map/map-drawing.ts';
import type { GridPlace } from '../../map/place/grid-projection.ts';
import { lineOf, type CornerDraft, type Parts, type Ring, type RingAt } from './draft.ts';

/** A ring has three corners at least. */
export const LEAST_CORNERS = 3;
/** A line has two ends. */
const LEAST_POINTS = 2;

function isSamePlace(a: GridPlace | undefined, b: GridPlace): boolean {
  return a?.[0] === b[0] && a[1] === b[1];
}

function withRing<T extends CornerDraft>(draft: T, at: RingAt, change: (ring: Ring) => Ring): T {
  const parts: Parts = draft.parts.map((part, p) =>
    p === at.part ? part.map((ring, r) => (r === at.ring ? change(ring) : ring)) : part,
  );
  return { ...draft, parts };
}

export function ringAt({ parts }: Pick<CornerDraft, 'parts'>, { part, ring }: RingAt): Ring {
  return parts[part]?.[ring] ?? [];
}

function isOpenAt({ open }: Pick<CornerDraft, 'open'>, { part, ring }: RingAt): boolean {
  return open?.part === part && open.ring === ring;
}

/** One more corner at the end of what is drawn; none where the last one stands already. */
export function addCorner<T extends CornerDraft>(draft: T, place: GridPlace): T {
  if (draft.open === null || isSamePlace(lineOf(draft).at(-1), place)) return draft;
  return withRing(draft, draft.open, (ring) => [...ring, place]);
}

/** The last corner taken back. */
export function takeLastBack<T extends CornerDraft>(draft: T): T {
  if (draft.open === null || lineOf(draft).length === 0) return draft;
  return withRing(draft, draft.open, (ring) => ring.slice(0, -1));
}

/** A corner at another place; every other corner stays to the last digit. */
export function moveCorner<T extends CornerDraft>(draft: T, at: CornerAt, place: GridPlace): T {
  if (isSamePlace(ringAt(draft, at)[at.corner], place)) return draft;
  return withRing(draft, at, (ring) => ring.with(at.corner, place));
}

/** A new corner on the side that begins at one. */
export function insertCorner<T extends CornerDraft>(
  draft: T,
  after: CornerAt,
  place: GridPlace,
): T {
  return withRing(draft, after, (ring) => ring.toSpliced(after.corner + 1, 0, place));
}

/** The middle of the side that begins at a corner, to the millimetre; null where there is no side. */
export function middleAfter(draft: CornerDraft, { corner, ...of }: CornerAt): GridPlace | null {
  const ring = ringAt(draft, of);
  const from = ring[corner];
  const to = ring[corner + 1] ?? (isOpenAt(draft, of) ? undefined : ring[0]);
  if (from === undefined || to === undefined) return null;
  const [east, north] = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
  return [Math.round(east * 1000) / 1000, Math.round(north * 1000) / 1000];
}

/** Why a corner has to stay, or null. */
export function reasonToKeepCorner(draft: CornerDraft, at: CornerAt): string | null {
  const isEnd = draft.tool === 'line' && ringAt(draft, at).length <= LEAST_POINTS;
  if (isEnd) return 'A line has two points at least.';
  const isTooFew = !isOpenAt(draft, at) && ringAt(draft, at).length <= LEAST_CORNERS;
  return isTooFew ? 'An outline has three corners at least.' : null;
}

export function removeCorner<T extends CornerDraft>(draft: T, at: CornerAt): T {
  if (reasonToKeepCorner(draft, at) !== null) return draft;
  return withRing(draft, at, (ring) => ring.toSpliced(at.corner, 1));
}
