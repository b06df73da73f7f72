import { boundsOf, nearestOn } from './polygons.ts';
import type { Box } from './polygons.ts';
import { cyclic, distance } from './vector.ts';
import type { Point, Ring } from './vector.ts';

type Nearest = { readonly point: Point; readonly distance: number };
/** Finds the nearest point of a long outline without looking at all of it. */
export type OutlineFinder = (from: Point) => Nearest;

type Stretch = { readonly points: readonly Point[]; readonly box: Box };

const perStretch = 14;

function toBox([x, y]: Point, box: Box): number {
  const dx = Math.max(box[0] - x, 0, x - box[2]);
  const dy = Math.max(box[1] - y, 0, y - box[3]);
  return Math.sqrt(dx * dx + dy * dy);
}

function nearestOnStretch(from: Point, { points }: Stretch, best: Nearest): Nearest {
  let found = best;
  let previous = points[0];
  for (const point of points) {
    if (previous === undefined || previous === point) continue;
    const near = nearestOn(from, previous, point);
    const off = distance(near, from);
    if (off < found.distance) found = { point: near, distance: off };
    previous = point;
  }
  return found;
}

export function makeOutlineFinder(ring: Ring): OutlineFinder {
  const stretches: Stretch[] = [];
  for (let start = 0; start < ring.length; start += perStretch) {
    const size = Math.min(perStretch, ring.length - start);
    const points = Array.from({ length: size + 1 }, (_, step) => cyclic(ring, start + step));
    stretches.push({ points, box: boundsOf(points) });
  }
  // Questions come from places near one another, so the last answer's stretch is the best first guess.
  let [guess] = stretches;
  return (from) => {
    let best: Nearest = { point: from, distance: Infinity };
    if (guess !== undefined) best = nearestOnStretch(from, guess, best);
    for (const stretch of stretches) {
      if (stretch === guess || toBox(from, stretch.box) >= best.distance) continue;
      const found = nearestOnStretch(from, stretch, best);
      if (found === best) continue;
      best = found;
      guess = stretch;
    }
    return best;
  };
}
