import { cross, cyclic, distance, subtract } from './vector.ts';
import type { Point, Ring } from './vector.ts';

export type Box = readonly [west: number, south: number, east: number, north: number];

export function boundsOf(points: readonly Point[]): Box {
  let [west, south, east, north] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const [x, y] of points) {
    west = Math.min(west, x);
    south = Math.min(south, y);
    east = Math.max(east, x);
    north = Math.max(north, y);
  }
  return [west, south, east, north];
}

export function boxesMeet(a: Box, b: Box, gap = 0): boolean {
  return a[0] - gap <= b[2] && b[0] - gap <= a[2] && a[1] - gap <= b[3] && b[1] - gap <= a[3];
}

/** Positive for a counter-clockwise ring. */
export function signedArea(ring: Ring): number {
  let twice = 0;
  const [ox, oy] = ring[0] ?? [0, 0];
  for (let index = 0; index < ring.length; index += 1) {
    const [a, b] = [cyclic(ring, index), cyclic(ring, index + 1)];
    twice += (a[0] - ox) * (b[1] - oy) - (b[0] - ox) * (a[1] - oy);
  }
  return twice / 2;
}

export function centroid(ring: Ring): Point {
  const [ox, oy] = ring[0] ?? [0, 0];
  let [twice, x, y] = [0, 0, 0];
  for (let index = 0; index < ring.length; index += 1) {
    const [a, b] = [
      subtract(cyclic(ring, index), [ox, oy]),
      subtract(cyclic(ring, index + 1), [ox, oy]),
    ];
    const part = cross(a, b);
    twice += part;
    x += (a[0] + b[0]) * part;
    y += (a[1] + b[1]) * part;
  }
  return twice === 0 ? [ox, oy] : [ox + x / (3 * twice), oy + y / (3 * twice)];
}

export function inside(point: Point, ring: Ring): boolean {
  const [x, y] = point;
  let odd = false;
  let previous = ring[ring.length - 1];
  for (const current of ring) {
    if (previous !== undefined && current[1] > y !== previous[1] > y) {
      const at =
        ((previous[0] - current[0]) * (y - current[1])) / (previous[1] - current[1]) + current[0];
      if (x < at) odd = !odd;
    }
    previous = current;
  }
  return odd;
}

/** The point of a segment that is nearest to `point`. */
export function nearestOn(point: Point, a: Point, b: Point): Point {
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  const squared = dx * dx + dy * dy;
  const share = squared === 0 ? 0 : ((point[0] - a[0]) * dx + (point[1] - a[1]) * dy) / squared;
  const held = share < 0 ? 0 : share > 1 ? 1 : share;
  return [a[0] + held * dx, a[1] + held * dy];
}

/** The nearest point of a ring's outline, and how far off it is. */
export function nearestOnRing(point: Point, ring: Ring): { point: Point; distance: number } {
  let best = { point, distance: Infinity };
  for (let index = 0; index < ring.length; index += 1) {
    const found = nearestOn(point, cyclic(ring, index), cyclic(ring, index + 1));
    const off = distance(found, point);
    if (off < best.distance) best = { point: found, distance: off };
  }
  return best;
}

export function distanceToRing(point: Point, ring: Ring): number {
  return nearestOnRing(point, ring).distance;
}

/** Where two segments properly cross, as shares of each; null where they do not. */
export function crossing(
  a: Point,
  b: Point,
  c: Point,
  d: Point,
): { first: number; second: number } | null {
  const [r, s] = [subtract(b, a), subtract(d, c)];
  const sine = cross(r, s);
  if (Math.abs(sine) < 1e-12) return null;
  const offset = subtract(c, a);
  const [first, second] = [cross(offset, s) / sine, cross(offset, r) / sine];
  return first >= 0 && first <= 1 && second >= 0 && second <= 1 ? { first, second } : null;
}

/** Whether a ring neither crosses nor touches itself. */
export function isSimple(ring: Ring): boolean {
  if (ring.length < 3) return false;
  return ring.every((a, i) => {
    const b = cyclic(ring, i + 1);
    return ring.every((c, j) => {
      const apart = Math.min(Math.abs(i - j), ring.length - Math.abs(i - j));
      return apart < 2 || crossing(a, b, c, cyclic(ring, j + 1)) === null;
    });
  });
}
