import { at } from '../numerics/at.ts';
import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import { pointInPolygon } from '../geometry/point-in-polygon.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { stepsOf } from '../geometry/steps-of.ts';
import { PACK_STRIDE } from './kernel.ts';
import type { LevelField } from './level-field.ts';
import type { Place } from './place.ts';

type Part = { start: PlanPoint; direction: PlanPoint; length: number };

function* partsOf(field: LevelField): Generator<Part, void> {
  for (const { pack, count } of field.packs) {
    for (let o = 0; o < count * PACK_STRIDE; o += PACK_STRIDE) {
      yield {
        start: [at(pack, o), at(pack, o + 1)],
        direction: [at(pack, o + 2), at(pack, o + 3)],
        length: at(pack, o + 5) / at(pack, o + 4),
      };
    }
  }
}

function along({ start, direction }: Part, distance: number): PlanPoint {
  return [start[0] + distance * direction[0], start[1] + distance * direction[1]];
}

/** The part of a drive's part that can lie over the box of a place, as distances along it. */
function overBox(part: Part, { west, south, east, north }: Place['box']): [number, number] {
  const corners = [
    [west, south],
    [east, south],
    [west, north],
    [east, north],
  ] as const;
  const distances = corners.map(
    ([x, y]) => (x - part.start[0]) * part.direction[0] + (y - part.start[1]) * part.direction[1],
  );
  return [Math.max(0, Math.min(...distances)), Math.min(part.length, Math.max(...distances))];
}

/**
 * The points of a footprint nearest to the drives: those over a drive that passes beneath it, at most
 * `spacing` apart, and those on its edges nearest to the ends of each part of a drive. Its corners are
 * not repeated.
 *
 * Units: m, easting and northing by turns. Valid: `field` packed for the place, which has rings.
 * Source: [own].
 */
export function pointsNearDrives(field: LevelField, place: Place, spacing: number): Float64Array {
  const points: number[] = [];
  for (const part of partsOf(field)) {
    const [from, to] = overBox(part, place.box);
    const steps = from < to ? stepsOf(to - from, spacing) : -1;
    for (let k = 0; k <= steps; k++) {
      const point = along(part, from + ((to - from) * k) / steps);
      if (pointInPolygon(point, place.rings)) points.push(...point);
    }
    for (const end of [part.start, along(part, part.length)]) {
      for (const { start, end: finish } of place.lines) {
        const { share } = nearestOnSegment(end, { start, end: finish });
        if (share === 0 || share === 1) continue;
        points.push(
          start[0] + share * (finish[0] - start[0]),
          start[1] + share * (finish[1] - start[1]),
        );
      }
    }
  }
  return Float64Array.from(points);
}
