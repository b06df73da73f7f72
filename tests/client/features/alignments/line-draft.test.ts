import { describe, expect, it } from 'vitest';
import {
  finishLine,
  goOnWithLine,
  handlesOfLine,
  lineDraftOf,
  newLine,
  pointsOf,
  puttingDown,
  shapesOfLine,
  type LineDraft,
} from '../../../../src/features/alignments/drafts/line-draft.ts';
import { mapDrawingOfLine } from '../../../../src/features/alignments/map-drawing-of-line.ts';
import {
  removeCorner,
  takeLastBack,
} from '../../../../src/features/drawing/drafts/edit-corners.ts';
import type { GridPlace } from '../../../../src/features/map/place/grid-projection.ts';

function ground(place: GridPlace) {
  return { place, to: 'ground', held: null } as const;
}

function drawn(...places: readonly GridPlace[]): LineDraft {
  return places.reduce((line, place) => puttingDown(line, ground(place)), newLine());
}

describe('a line', () => {
  it('is set point by point, and ended at its last point', () => {
    const line = drawn([0, 0], [10, 0], [20, 5]);
    expect(pointsOf(line)).toEqual([[0, 0], [10, 0], [20, 5]]); // prettier-ignore
    expect(handlesOfLine(line)).toMatchObject([{ kind: 'corner', at: { corner: 2 } }]);
    expect(pointsOf(takeLastBack(line))).toHaveLength(2);
    const ended = finishLine(line);
    expect(ended.isSet).toBe(true);
    expect(goOnWithLine(ended).isSet).toBe(false);
  });

  it('has two points before it can be ended, and keeps two', () => {
    expect(finishLine(drawn([0, 0])).isSet).toBe(false);
    const two = lineDraftOf([[0, 0], [10, 0]]); // prettier-ignore
    expect(removeCorner(two, { part: 0, ring: 0, corner: 0 })).toBe(two);
  });

  it('has handles on its points and parts, and none that would close it', () => {
    const line = lineDraftOf([[0, 0], [10, 0], [20, 0]]); // prettier-ignore
    expect(handlesOfLine(line).map(({ kind }) => kind)).toEqual([
      'corner',
      'middle',
      'corner',
      'middle',
      'corner',
    ]);
  });

  it('is drawn with the point that is about to be set, and how long that part is', () => {
    const shapes = shapesOfLine(drawn([0, 0]), ground([3, 4]), null);
    expect(shapes).toContainEqual({
      kind: 'line',
      look: 'outline',
      places: [[0, 0], [3, 4]],
      text: '5.00 m',
    }); // prettier-ignore
  });
});

describe('the pointer on a line', () => {
  function handOn(line: LineDraft) {
    const told = { line, chosen: -1 };
    const drawing = mapDrawingOfLine(line, {
      chosen: null,
      choose: (at) => {
        told.chosen = at?.corner ?? -1;
      },
      edit: (edit) => {
        told.line = edit(told.line);
      },
    });
    return { told, drawing };
  }

  it('makes a point of the middle of a part, moves points and chooses them', () => {
    const { told, drawing } = handOn(lineDraftOf([[0, 0], [10, 0]])); // prettier-ignore
    const [start, middle] = drawing.handles;
    if (start === undefined || middle === undefined) throw new Error('no handles');
    drawing.put({ place: [0, 7], to: 'ground', held: start });
    expect(pointsOf(told.line)[0]).toEqual([0, 7]);
    drawing.press(middle);
    expect(pointsOf(told.line)).toHaveLength(3);
    expect(told.chosen).toBe(1);
    drawing.press(start);
    expect(told.chosen).toBe(0);
  });

  it('ends a line at its last point', () => {
    const { told, drawing } = handOn(drawn([0, 0], [10, 0]));
    const [last] = drawing.handles;
    if (last !== undefined) drawing.press(last);
    expect(told.line.isSet).toBe(true);
  });
});
