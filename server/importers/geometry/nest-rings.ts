import { boundingBox, type Box } from '../../../shared/geometry/bounding-box.ts';

type Point = readonly [number, number];
type Ring = readonly Point[];
type Nested = { readonly ring: Ring; readonly box: Box; readonly size: number; depth: number };

/** Edges of a ring whose middles are asked whether they lie inside another. */
const ASKED = 5;

function twiceArea(ring: Ring): number {
  const [x0, y0] = ring[0] ?? [0, 0];
  let sum = 0;
  let [x, y] = [0, 0];
  for (const [nextX, nextY] of ring) {
    sum += x * (nextY - y0) - y * (nextX - x0);
    [x, y] = [nextX - x0, nextY - y0];
  }
  return Math.abs(sum);
}

function isInside(x: number, y: number, ring: Ring): boolean {
  let inside = false;
  let [x0, y0] = ring.at(-1) ?? [0, 0];
  for (const [x1, y1] of ring) {
    const crosses = y0 > y !== y1 > y && x < x0 + ((x1 - x0) * (y - y0)) / (y1 - y0);
    if (crosses) inside = !inside;
    [x0, y0] = [x1, y1];
  }
  return inside;
}

function boxHolds(outer: Box, inner: Box): boolean {
  return (
    outer.west <= inner.west &&
    outer.south <= inner.south &&
    outer.east >= inner.east &&
    outer.north >= inner.north
  );
}

/** Most of a few middles decide: rings may touch at corners and along edges. */
function holds(outer: Nested, inner: Nested): boolean {
  if (!boxHolds(outer.box, inner.box)) return false;
  const step = Math.max(1, Math.floor((inner.ring.length - 1) / ASKED));
  let votes = 0;
  for (let k = 0; k + 1 < inner.ring.length; k += step) {
    const [from, to] = [inner.ring[k], inner.ring[k + 1]];
    if (from === undefined || to === undefined) continue;
    const inside = isInside((from[0] + to[0]) / 2, (from[1] + to[1]) / 2, outer.ring);
    votes += inside ? 1 : -1;
  }
  return votes > 0;
}

/**
 * Sorts the rings of one shape into parts with their holes, by which lies in which and not by their
 * direction, which programs disagree on.
 */
export function nestRings(rings: readonly Ring[]): Ring[][] {
  if (rings.length < 2) return rings.map((ring) => [ring]);
  const sorted = rings
    .filter((ring) => ring.length > 0)
    .map((ring): Nested => ({ ring, box: boundingBox(ring), size: twiceArea(ring), depth: 0 }))
    .sort((a, b) => b.size - a.size);
  const parts = new Map<Nested, Ring[]>();
  for (const [k, one] of sorted.entries()) {
    const around = sorted.slice(0, k).findLast((other) => holds(other, one));
    one.depth = around === undefined ? 0 : around.depth + 1;
    const part = around === undefined ? undefined : parts.get(around);
    if (one.depth % 2 === 0 || part === undefined) parts.set(one, [one.ring]);
    else part.push(one.ring);
  }
  return [...parts.values()];
}
