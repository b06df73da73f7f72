import { labelCorners, labelsMeet, type LabelBox } from './label-box.ts';
import { isInside, type Rectangle } from './marks.ts';

/**
 * Something that wants a label, with the places where it may stand, the best first.
 *
 * Units: mm. Valid: an empty list is never placed. Source: [own].
 */
export type Wanted<T> = { readonly what: T; readonly spots: readonly LabelBox[] };

/**
 * Labels that have a place, and what has none, in the order in which they were asked for.
 *
 * Units: mm. Valid: placed and listed together are all. Source: [own].
 */
export type Placement<T> = {
  readonly placed: readonly { readonly what: T; readonly box: LabelBox }[];
  readonly listed: readonly T[];
};

/** Cells of an even net over the paper that hold what lies in them, in mm. */
const CELL = 12;

function cellsOf(box: LabelBox): string[] {
  const corners = labelCorners(box);
  const [xs, ys] = [corners.map(([x]) => x), corners.map(([, y]) => y)];
  const from = (values: number[]) => Math.floor(Math.min(...values) / CELL);
  const to = (values: number[]) => Math.floor(Math.max(...values) / CELL);
  const cells: string[] = [];
  for (let i = from(xs); i <= to(xs); i++) {
    for (let j = from(ys); j <= to(ys); j++) cells.push(`${i} ${j}`);
  }
  return cells;
}

/** What is taken on a sheet, found by cell. */
function takenOn(boxes: readonly LabelBox[]) {
  const net = new Map<string, LabelBox[]>();
  const take = (box: LabelBox) => {
    for (const cell of cellsOf(box)) {
      const held = net.get(cell);
      if (held === undefined) net.set(cell, [box]);
      else held.push(box);
    }
  };
  for (const box of boxes) take(box);
  const isFree = (box: LabelBox) =>
    cellsOf(box).every((cell) => (net.get(cell) ?? []).every((other) => !labelsMeet(box, other)));
  return { take, isFree };
}

/**
 * Places labels so that none lies over another or over what is taken already, nor outside of the window;
 * what comes first chooses first.
 *
 * Units: mm. Valid: placed and listed together are all. Source: [own].
 */
export function placeLabels<T>(
  window: Rectangle,
  taken: readonly LabelBox[],
  wanted: readonly Wanted<T>[],
): Placement<T> {
  const sheet = takenOn(taken);
  const isWithin = (box: LabelBox) => labelCorners(box).every((spot) => isInside(window, spot));
  const placed: { what: T; box: LabelBox }[] = [];
  const listed: T[] = [];
  for (const { what, spots } of wanted) {
    const box = spots.find((spot) => isWithin(spot) && sheet.isFree(spot));
    if (box === undefined) {
      listed.push(what);
      continue;
    }
    sheet.take(box);
    placed.push({ what, box });
  }
  return { placed, listed };
}
