import type { CornerAt, MapDrawing } from '../map/map-drawing.ts';
import type { Draft, ShapeDraft } from './drafts/draft.ts';
import { shapesOfDraft, shapesOfJoin } from './drafts/draft-shapes.ts';
import { addCorner, insertCorner, moveCorner } from './drafts/edit-corners.ts';
import { closeRing } from './drafts/edit-rings.ts';
import { handlesOf } from './drafts/handles.ts';
import type { useAim } from './hooks/use-aim.ts';

type Hands = ReturnType<typeof useAim> & {
  readonly chosen: CornerAt | null;
  readonly isSquare: boolean;
  readonly edit: (edit: (draft: ShapeDraft) => ShapeDraft) => void;
  readonly choose: (at: CornerAt | null) => void;
};

function drawingOfShape(draft: ShapeDraft, hands: Hands): MapDrawing {
  const { chosen, isSquare, edit, choose } = hands;
  return {
    mode: draft.open === null ? 'outline' : 'line',
    handles: handlesOf(draft),
    shapes: (aim) => shapesOfDraft(draft, aim, chosen),
    aim: (request) => hands.aim(draft, { ...request, isSquare: isSquare || request.isSquare }),
    settle: (request) =>
      hands.settle(draft, { ...request, isSquare: isSquare || request.isSquare }),
    put: ({ place, held }) => {
      edit((now) => {
        if (held === null) return addCorner(now, place);
        const { kind, at } = held;
        return kind === 'corner' ? moveCorner(now, at, place) : insertCorner(now, at, place);
      });
    },
    press: ({ kind, at, place }) => {
      if (draft.open !== null) {
        edit(closeRing);
        return;
      }
      if (kind === 'middle') edit((now) => insertCorner(now, at, place));
      choose(kind === 'middle' ? { ...at, corner: at.corner + 1 } : at);
    },
  };
}

function drawNothing(): void {
  // only looked at
}

/** What the map has to do with a draft. */
export function mapDrawingOf(draft: Draft, hands: Hands): MapDrawing {
  if (draft.tool !== 'join') return drawingOfShape(draft, hands);
  return {
    mode: 'none',
    handles: [],
    shapes: () => shapesOfJoin(draft),
    aim: ({ place, held }) => ({ place, to: 'ground', held }),
    settle: ({ place, held }) => Promise.resolve({ place, to: 'ground', held }),
    put: drawNothing,
    press: drawNothing,
  };
}
