import { footprint } from './footprints.ts';
import type { Footprint } from './footprints.ts';
import { tidy } from './ground-plan.ts';
import { distanceToRing, inside } from './polygons.ts';
import { slab } from './templates.ts';
import { along, cyclic, direction, distance, left, place, scale } from './vector.ts';
import type { Ring } from './vector.ts';
import type { Water } from './water.ts';

/** Small huts for nets and tackle along the quay edge, clear of every street. */
export function buildQuayHuts(water: Water, isFree: (ring: Ring) => boolean): Footprint[] {
  const huts: Footprint[] = [];
  for (let index = 0; index < water.quayLine.length; index += 1) {
    const [a, b] = [cyclic(water.quayLine, index), cyclic(water.quayLine, index + 1)];
    if (distance(a, b) < 7 || index % 2 === 1 || a[1] < 96) continue;
    const way = direction(a, b);
    const outward = inside(along(along(a, way, 3.5), left(way), 4), water.quayLine)
      ? scale(left(way), -1)
      : left(way);
    const centre = along(along(a, way, distance(a, b) / 2), outward, 4.6);
    const ring = tidy(place(slab(5.4, 4.2), centre, way));
    const isDry = ring.every(
      (point) =>
        distanceToRing(point, water.quayLine) > 1.4 &&
        water.land.some((bank) => inside(point, bank) && distanceToRing(point, bank) > 1.4),
    );
    if (isDry && isFree(ring)) huts.push(footprint(ring, 'net loft', along(centre, outward, 6)));
  }
  return huts;
}
