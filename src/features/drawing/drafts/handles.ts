import type { Handle } from '../../map/map-drawing.ts';
import { lineOf, type ShapeDraft } from './draft.ts';
import { LEAST_CORNERS, middleAfter } from './edit-corners.ts';

/** What the pointer can take hold of: of an open outline the corner that closes it. */
export function handlesOf(draft: ShapeDraft): readonly Handle[] {
  const line = lineOf(draft);
  const [first] = line;
  if (draft.open !== null) {
    const closes = draft.tool !== 'split' && line.length >= LEAST_CORNERS && first !== undefined;
    if (!closes) return [];
    return [{ kind: 'corner', at: { ...draft.open, corner: 0 }, place: first }];
  }
  return draft.parts.flatMap((rings, part) =>
    rings.flatMap((corners, ring) =>
      corners.flatMap((place, corner): Handle[] => {
        const at = { part, ring, corner };
        const middle = middleAfter(draft, at);
        const handle: Handle = { kind: 'corner', at, place };
        return middle === null ? [handle] : [handle, { kind: 'middle', at, place: middle }];
      }),
    ),
  );
}
