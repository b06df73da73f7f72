import type { GridPlace } from '../../map/place/grid-projection.ts';

/** How far a place is from a corner along a direction. */
function along(from: GridPlace, to: GridPlace, [east, north]: GridPlace): number {
  return (to[0] - from[0]) * east + (to[1] - from[1]) * north;
}

/**
 * The place nearest to `wanted` that makes a right angle at `last`, or goes straight on; `before` is the
 * corner before. From the first corner, along the grid.
 */
export function rightAngle(
  wanted: GridPlace,
  last: GridPlace | undefined,
  before: GridPlace | undefined,
): GridPlace {
  if (last === undefined) return wanted;
  const length = before === undefined ? 0 : Math.hypot(last[0] - before[0], last[1] - before[1]);
  const straight: GridPlace =
    before === undefined || length === 0
      ? [1, 0]
      : [(last[0] - before[0]) / length, (last[1] - before[1]) / length];
  const across: GridPlace = [-straight[1], straight[0]];
  const [on, off] = [along(last, wanted, straight), along(last, wanted, across)];
  const [way, distance] = Math.abs(on) >= Math.abs(off) ? [straight, on] : [across, off];
  return [last[0] + way[0] * distance, last[1] + way[1] * distance];
}
