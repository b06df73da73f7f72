import { aimAt } from '../drawing/drafts/aim.ts';
import { insertCorner } from '../drawing/drafts/edit-corners.ts';
import type { AimRequest, MapDrawing } from '../map/map-drawing.ts';
import {
  finishLine,
  handlesOfLine,
  puttingDown,
  shapesOfLine,
  type LineDraft,
} from './drafts/line-draft.ts';
import type { LineDrafting } from './hooks/use-line-draft.ts';

/** What the map has to do with a line that is drawn. A line goes under buildings: none is snapped to. */
export function mapDrawingOfLine(
  draft: LineDraft,
  { chosen, choose, edit }: Pick<LineDrafting, 'chosen' | 'choose' | 'edit'>,
): MapDrawing {
  function aim(request: AimRequest) {
    return aimAt(draft, request, []);
  }
  return {
    mode: draft.isSet ? 'outline' : 'line',
    handles: handlesOfLine(draft),
    shapes: (aimed) => shapesOfLine(draft, aimed, chosen),
    aim,
    settle: (request) => Promise.resolve(aim(request)),
    put: (aimed) => {
      edit((now) => puttingDown(now, aimed));
    },
    press: ({ kind, at, place }) => {
      if (!draft.isSet) {
        edit(finishLine);
        return;
      }
      if (kind === 'middle') edit((now) => insertCorner(now, at, place));
      choose(kind === 'middle' ? { ...at, corner: at.corner + 1 } : at);
    },
  };
}
