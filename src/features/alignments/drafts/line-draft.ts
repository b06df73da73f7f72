import type { AlignmentDesign } from '../../../../shared/schemas/alignments.ts';
import { FIRST_RING, lineOf, type CornerDraft, type Ring } from '../../drawing/drafts/draft.ts';
import {
  addCorner,
  insertCorner,
  middleAfter,
  moveCorner,
} from '../../drawing/drafts/edit-corners.ts';
import { lengthWords } from '../../drawing/measure-words.ts';
import type { Aim, CornerAt, DraftShape, Handle } from '../../map/map-drawing.ts';

/** A line while its points are set, one after another, or once they are set and are moved. */
export type LineDraft = CornerDraft & { readonly tool: 'line'; readonly isSet: boolean };

/** A line has two ends. */
export const LEAST_POINTS = 2;

export function newLine(): LineDraft {
  return { tool: 'line', parts: [[[]]], open: FIRST_RING, isSet: false };
}

export function lineDraftOf(line: AlignmentDesign['line']): LineDraft {
  return { tool: 'line', parts: [[line]], open: FIRST_RING, isSet: true };
}

/** The points as they are sent. */
export function pointsOf(draft: CornerDraft): AlignmentDesign['line'] {
  return lineOf(draft).map(([east, north]) => [east, north]);
}

export function finishLine(draft: LineDraft): LineDraft {
  return draft.isSet || lineOf(draft).length < LEAST_POINTS ? draft : { ...draft, isSet: true };
}

export function goOnWithLine(draft: LineDraft): LineDraft {
  return draft.isSet ? { ...draft, isSet: false } : draft;
}

/** What the pointer can take hold of: while points are set, the last one, which ends the line. */
export function handlesOfLine(draft: LineDraft): readonly Handle[] {
  const points = lineOf(draft);
  const handles = points.flatMap((place, corner): Handle[] => {
    const at = { part: 0, ring: 0, corner };
    const middle = middleAfter(draft, at);
    const handle: Handle = { kind: 'corner', at, place };
    return middle === null ? [handle] : [handle, { kind: 'middle', at, place: middle }];
  });
  if (draft.isSet) return handles;
  return points.length < LEAST_POINTS ? [] : handles.slice(-1);
}

/** A place set, or a point let go. */
export function puttingDown(draft: LineDraft, { place, held }: Aim): LineDraft {
  if (held === null) return addCorner(draft, place);
  const { kind, at } = held;
  return kind === 'corner' ? moveCorner(draft, at, place) : insertCorner(draft, at, place);
}

function sides(points: Ring, isMeasured: boolean): DraftShape[] {
  return points.slice(1).map((to, k): DraftShape => {
    const from = points[k] ?? to;
    const isLast = k === points.length - LEAST_POINTS;
    const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
    const text = isMeasured && isLast ? lengthWords(length) : '';
    return { kind: 'line', look: 'outline', places: [from, to], text };
  });
}

/** What is seen of a line while it is drawn. */
export function shapesOfLine(
  draft: LineDraft,
  aim: Aim | null,
  chosen: CornerAt | null,
): readonly DraftShape[] {
  const next = aim === null ? draft : puttingDown(draft, aim);
  const handles = handlesOfLine({ ...next, isSet: true });
  const seen = draft.isSet ? handles : handles.filter(({ kind }) => kind === 'corner');
  return [
    ...sides(lineOf(next), aim !== null),
    ...seen.map(({ kind, at, place }): DraftShape => {
      const isChosen = kind === 'corner' && chosen?.corner === at.corner;
      return { kind: 'point', look: isChosen ? 'chosen' : kind, place };
    }),
  ];
}
