import type { Category } from '../../../shared/damage/categories.ts';
import { steps } from '../../../shared/numerics/steps.ts';
import { DAMAGE } from '../../../shared/presentation/damage-style.ts';
import type { Paper } from './paper.ts';

/** A piece of a drawing that holds what is hatched. */
export type Bounds = {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
};

/** Level, upright or at 45°, fixed to the drawing and not to the shape, so that what touches reads as one tone. */
type Lean = 'rising' | 'falling' | 'level' | 'upright';

function strokes({ doc }: Paper, lean: Lean, pitch: number, bounds: Bounds): void {
  const { left, top, right, bottom } = bounds;
  if (lean === 'level') {
    for (const y of steps(top, bottom, pitch)) doc.moveTo(left, y).lineTo(right, y);
  } else if (lean === 'upright') {
    for (const x of steps(left, right, pitch)) doc.moveTo(x, top).lineTo(x, bottom);
  } else if (lean === 'rising') {
    for (const c of steps(left + top, right + bottom, pitch))
      doc.moveTo(c - top, top).lineTo(c - bottom, bottom);
  } else {
    for (const c of steps(top - right, bottom - left, pitch))
      doc.moveTo(top - c, top).lineTo(bottom - c, bottom);
  }
}

type Hatch = {
  readonly strokes: readonly { readonly lean: Lean; readonly pitch: number }[];
  readonly colour: string;
  readonly width: number;
};

/** Strokes inside the shape that `shape` puts into the document's path. */
export function hatchStrokes(paper: Paper, shape: () => void, bounds: Bounds, hatch: Hatch): void {
  const { doc } = paper;
  doc.save();
  shape();
  doc.clip('even-odd').lineWidth(hatch.width).strokeColor(hatch.colour);
  for (const { lean, pitch } of hatch.strokes) strokes(paper, lean, pitch, bounds);
  doc.stroke().restore();
}

/**
 * Fills the shape that `shape` puts into the document's path as a category is drawn everywhere; `pixel` is
 * how long a pixel of its hatch is.
 */
export function fillCategory(
  paper: Paper,
  category: Category,
  shape: () => void,
  bounds: Bounds,
  pixel = 1,
): void {
  const { fill, hatch } = DAMAGE[category];
  shape();
  paper.doc.fill(fill, 'even-odd');
  if (hatch === null) return;
  hatchStrokes(paper, shape, bounds, {
    colour: hatch.colour,
    width: hatch.width * pixel,
    strokes: hatch.strokes.map(({ lean, pitch }) => ({ lean, pitch: pitch * pixel })),
  });
}
