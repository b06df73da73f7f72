import type { Rectangle, Spot } from './marks.ts';

/**
 * The ground that a label takes on paper: its middle, half its length along a direction and half its
 * height across it.
 *
 * Units: mm. Valid: `along` of length 1. Source: [own].
 */
export type LabelBox = {
  readonly middle: Spot;
  readonly halfWide: number;
  readonly halfTall: number;
  readonly along: Spot;
};

/**
 * A rectangle of the paper as the ground of a label.
 *
 * Units: mm. Valid: any rectangle. Source: [own].
 */
export function labelBoxOf({ left, top, right, bottom }: Rectangle): LabelBox {
  return {
    middle: [(left + right) / 2, (top + bottom) / 2],
    halfWide: (right - left) / 2,
    halfTall: (bottom - top) / 2,
    along: [1, 0],
  };
}

/**
 * The corners of a label's ground, in turn.
 *
 * Units: mm. Valid: any box. Source: [own].
 */
export function labelCorners({
  middle: [x, y],
  halfWide,
  halfTall,
  along: [c, s],
}: LabelBox): Spot[] {
  return ([[-1, -1], [1, -1], [1, 1], [-1, 1]] as const).map(([a, b]): Spot => [
    x + a * halfWide * c - b * halfTall * s,
    y + a * halfWide * s + b * halfTall * c,
  ]); // prettier-ignore
}

/** Whether all corners of one lie beyond a side of the other. */
function isBeyond(box: LabelBox, corners: readonly Spot[]): boolean {
  const [c, s] = box.along;
  const seen = corners.map(([x, y]) => [
    (x - box.middle[0]) * c + (y - box.middle[1]) * s,
    (y - box.middle[1]) * c - (x - box.middle[0]) * s,
  ] as const); // prettier-ignore
  return (
    seen.every(([a]) => a >= box.halfWide) ||
    seen.every(([a]) => a <= -box.halfWide) ||
    seen.every(([, b]) => b >= box.halfTall) ||
    seen.every(([, b]) => b <= -box.halfTall)
  );
}

/**
 * Whether two labels lie over each other. Boxes that only touch do not.
 *
 * Units: mm. Valid: any boxes. Source: [own], separating sides of two rectangles.
 */
export function labelsMeet(a: LabelBox, b: LabelBox): boolean {
  return !isBeyond(a, labelCorners(b)) && !isBeyond(b, labelCorners(a));
}
