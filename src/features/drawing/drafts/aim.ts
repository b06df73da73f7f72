import type { Aim, AimRequest, Handle } from '../../map/map-drawing.ts';
import type { GridPlace } from '../../map/place/grid-projection.ts';
import { lineOf, type CornerDraft, type Parts } from './draft.ts';
import { ringAt } from './edit-corners.ts';
import { rightAngle } from './right-angle.ts';
import { snap } from './snap.ts';

/** A pointer is no more exact than a centimetre. */
function rounded([east, north]: GridPlace): GridPlace {
  return [Math.round(east * 100) / 100, Math.round(north * 100) / 100];
}

type Anchors = { readonly last: GridPlace | undefined; readonly before: GridPlace | undefined };

/** The corners that a right angle is measured from. */
function anchorsOf(draft: CornerDraft, held: Handle | null): Anchors {
  if (held === null) return { last: lineOf(draft).at(-1), before: lineOf(draft).at(-2) };
  const ring = ringAt(draft, held.at);
  const back = held.kind === 'middle' ? held.at.corner : held.at.corner - 1;
  return { last: ring.at(back), before: ring.at(back - 1) };
}

/** Where the pointer means: at a right angle when asked for, else at a neighbour within reach. */
export function aimAt(draft: CornerDraft, request: AimRequest, neighbours: readonly Parts[]): Aim {
  const { place, reach, isSquare, held } = request;
  if (isSquare) {
    const { last, before } = anchorsOf(draft, held);
    return { place: rightAngle(place, last, before), to: 'ground', held };
  }
  const found = snap(place, neighbours, reach);
  return found === null ? { place: rounded(place), to: 'ground', held } : { ...found, held };
}
