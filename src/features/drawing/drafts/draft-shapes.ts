import type { Aim, CornerAt, DraftShape, Handle } from '../../map/map-drawing.ts';
import type { GridPlace } from '../../map/place/grid-projection.ts';
import { areaWords, lengthWords } from '../measure-words.ts';
import {
  lineOf,
  partsOf,
  type JoinDraft,
  type Parts,
  type Ring,
  type ShapeDraft,
} from './draft.ts';
import { addCorner, insertCorner, moveCorner } from './edit-corners.ts';
import { closedParts } from './edit-rings.ts';
import { handlesOf } from './handles.ts';
import { joinPreview } from './join-preview.ts';
import { splitLine } from './split-line.ts';
import { splitPreview } from './split-preview.ts';

function middleOf(ring: Ring): GridPlace {
  const sum = ring.reduce<GridPlace>(([x, y], [east, north]) => [x + east, y + north], [0, 0]);
  return [sum[0] / ring.length, sum[1] / ring.length];
}

function areasOf(parts: Parts, look: 'outline' | 'piece', text: string): DraftShape[] {
  const [outer = []] = parts[0] ?? [];
  return [
    ...parts.map((rings): DraftShape => ({ kind: 'area', look, rings })),
    { kind: 'text', place: middleOf(outer), text },
  ];
}

/** The sides of a ring, with their lengths where they are measured. */
function sidesOf(
  ring: Ring,
  isClosed: boolean,
  look: 'outline' | 'cut',
  isMeasured = true,
): DraftShape[] {
  return ring.flatMap((from, k): DraftShape[] => {
    const to = ring[k + 1] ?? (isClosed ? ring[0] : undefined);
    if (to === undefined) return [];
    const text = isMeasured ? lengthWords(Math.hypot(to[0] - from[0], to[1] - from[1])) : '';
    return [{ kind: 'line', look, places: [from, to], text }];
  });
}

function isSameCorner(a: CornerAt, b: CornerAt | null): boolean {
  return b !== null && a.part === b.part && a.ring === b.ring && a.corner === b.corner;
}

function handleShapes(handles: readonly Handle[], chosen: CornerAt | null): DraftShape[] {
  return handles.map(({ kind, at, place }) => {
    const isChosen = kind === 'corner' && isSameCorner(at, chosen);
    return { kind: 'point', look: isChosen ? 'chosen' : kind, place };
  });
}

function targetOf(aim: Aim | null): DraftShape[] {
  if (aim === null || aim.to === 'ground') return [];
  return [{ kind: 'point', look: 'target', place: aim.place }];
}

/** The draft as it would be if the pointer did now what it is about to do. */
function aimed(draft: ShapeDraft, aim: Aim | null): ShapeDraft {
  if (aim === null) return draft;
  if (aim.held === null) return addCorner(draft, aim.place);
  const { kind, at } = aim.held;
  return kind === 'corner' ? moveCorner(draft, at, aim.place) : insertCorner(draft, at, aim.place);
}

function cornersOf(ring: Ring): DraftShape[] {
  return ring.map((place) => ({ kind: 'point', look: 'corner', place }));
}

/** What is being drawn, and what of the building is closed already. */
function openShapes(draft: ShapeDraft, aim: Aim | null): DraftShape[] {
  const ring = lineOf(aimed(draft, aim));
  const standing = closedParts(draft);
  const [first, last] = [ring[0], ring.at(-1)];
  const isArea = ring.length > 2 && first !== undefined && last !== undefined;
  return [
    ...standing.map((rings): DraftShape => ({ kind: 'area', look: 'outline', rings })),
    ...standing.flat().flatMap((closed) => sidesOf(closed, true, 'outline', false)),
    ...(isArea ? [{ kind: 'area', look: 'ghost', rings: [ring] } as const] : []),
    ...(isArea ? [{ kind: 'line', look: 'ghost', places: [last, first] } as const] : []),
    ...sidesOf(ring, false, 'outline'),
    ...(isArea
      ? [{ kind: 'text', place: middleOf(ring), text: areaWords([[ring]]) } as const]
      : []),
    ...cornersOf(lineOf(draft)),
    ...targetOf(aim),
  ];
}

function closedShapes(draft: ShapeDraft, aim: Aim | null, chosen: CornerAt | null): DraftShape[] {
  const next = aimed(draft, aim);
  return [
    ...areasOf(next.parts, 'outline', areaWords(next.parts)),
    ...next.parts.flat().flatMap((ring) => sidesOf(ring, true, 'outline')),
    ...handleShapes(handlesOf(next), aim === null ? chosen : null),
    ...targetOf(aim),
  ];
}

function cutShapes(draft: ShapeDraft, aim: Aim | null): DraftShape[] {
  const whole = partsOf(draft.building?.footprint ?? []);
  const line = lineOf(aimed(draft, aim));
  const pieces = splitPreview(whole, splitLine(line));
  const [kept = whole, ...others] = pieces;
  return [
    ...areasOf(kept, 'outline', areaWords(kept)),
    ...others.flatMap((piece) => areasOf(piece, 'piece', areaWords(piece))),
    ...sidesOf(line, false, 'cut', false),
    ...cornersOf(lineOf(draft)),
    ...targetOf(aim),
  ];
}

/** What is seen of a building, a new one or an old, or of the line that splits it. */
export function shapesOfDraft(
  draft: ShapeDraft,
  aim: Aim | null,
  chosen: CornerAt | null,
): readonly DraftShape[] {
  if (draft.tool === 'split') return cutShapes(draft, aim);
  return draft.open === null ? closedShapes(draft, aim, chosen) : openShapes(draft, aim);
}

/** What is seen of buildings that are to be joined. */
export function shapesOfJoin({ buildings }: JoinDraft): readonly DraftShape[] {
  const picked = buildings.map(({ footprint }) => partsOf(footprint));
  const joined = joinPreview(picked);
  if (joined !== null) return areasOf(joined, 'outline', areaWords(joined));
  return picked.flatMap((parts) => areasOf(parts, 'outline', areaWords(parts)));
}
