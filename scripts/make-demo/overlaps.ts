import { boundsOf, boxesMeet, crossing, distanceToRing, inside } from './polygons.ts';
import { cyclic, distance, length, subtract } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** Whether two segments cross well inside both, not merely touch. */
function cutsThrough(a: Point, b: Point, c: Point, d: Point): boolean {
  const hit = crossing(a, b, c, d);
  if (hit === null) return false;
  const [ab, cd] = [length(subtract(b, a)), length(subtract(d, c))];
  const touch = 0.004;
  return (
    hit.first * ab > touch &&
    (1 - hit.first) * ab > touch &&
    hit.second * cd > touch &&
    (1 - hit.second) * cd > touch
  );
}

function isWellInside(point: Point, ring: Ring): boolean {
  return inside(point, ring) && distanceToRing(point, ring) > 0.004;
}

/** Points that lie in the ring however bent it is: just inside the middle of each side. */
function innerPoints(ring: Ring): Point[] {
  return ring.map((a, index) => {
    const b = cyclic(ring, index + 1);
    const size = Math.max(distance(a, b), 1e-9);
    return [
      (a[0] + b[0]) / 2 - ((b[1] - a[1]) / size) * 0.02,
      (a[1] + b[1]) / 2 + ((b[0] - a[0]) / size) * 0.02,
    ];
  });
}

/** Whether two counter-clockwise rings share ground; a shared wall is not shared ground. */
export function overlaps(a: Ring, b: Ring): boolean {
  if (!boxesMeet(boundsOf(a), boundsOf(b))) return false;
  const crosses = a.some((p, i) =>
    b.some((q, j) => cutsThrough(p, cyclic(a, i + 1), q, cyclic(b, j + 1))),
  );
  return (
    crosses ||
    [...a, ...innerPoints(a)].some((point) => isWellInside(point, b)) ||
    [...b, ...innerPoints(b)].some((point) => isWellInside(point, a))
  );
}
