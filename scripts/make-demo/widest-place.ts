import { boundsOf, distanceToRing, inside } from './polygons.ts';
import type { Point, Ring } from './vector.ts';

const STEPS = 48;

/** About where the part of a ring that lies in another is widest: there its name has most room. */
export function widestPlace(ring: Ring, within: Ring): Point {
  const [west, south, east, north] = boundsOf(ring);
  let widest: Point = [(west + east) / 2, (south + north) / 2];
  let room = 0;
  for (let column = 1; column < STEPS; column += 1) {
    for (let row = 1; row < STEPS; row += 1) {
      const place: Point = [
        west + ((east - west) * column) / STEPS,
        south + ((north - south) * row) / STEPS,
      ];
      const reach = inside(place, ring) && inside(place, within) ? distanceToRing(place, ring) : 0;
      if (reach > room) [widest, room] = [place, reach];
    }
  }
  return widest;
}
