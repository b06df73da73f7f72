import { signedArea } from './polygons.ts';
import { cyclic, direction, dot, left, along } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** The smallest rectangle round a ring: its centre, the direction of its long side, and its sides. */
export type Frame = {
  readonly centre: Point;
  readonly axis: Point;
  readonly long: number;
  readonly short: number;
};

function frameAlong(ring: Ring, axis: Point): Frame {
  const side = left(axis);
  const [u, v] = [ring.map((point) => dot(point, axis)), ring.map((point) => dot(point, side))];
  const [west, east, south, north] = [
    Math.min(...u),
    Math.max(...u),
    Math.min(...v),
    Math.max(...v),
  ];
  const centre = along(along([0, 0], axis, (west + east) / 2), side, (south + north) / 2);
  return { centre, axis, long: east - west, short: north - south };
}

function lying(frame: Frame): Frame {
  return frame.long >= frame.short
    ? frame
    : { centre: frame.centre, axis: left(frame.axis), long: frame.short, short: frame.long };
}

export function frameOf(ring: Ring): Frame {
  let best = frameAlong(ring, [1, 0]);
  for (let index = 0; index < ring.length; index += 1) {
    const frame = frameAlong(ring, direction(cyclic(ring, index), cyclic(ring, index + 1)));
    if (frame.long * frame.short < best.long * best.short) best = frame;
  }
  return lying(best);
}

/** How much of its frame a ring fills, from 0 to 1. */
export function fullness(ring: Ring): number {
  const frame = frameOf(ring);
  return signedArea(ring) / Math.max(1, frame.long * frame.short);
}
