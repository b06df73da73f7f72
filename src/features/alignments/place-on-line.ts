import { nearestOnSegment } from '../../../shared/geometry/nearest-on-segment.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import type { AlignmentDesign } from '../../../shared/schemas/alignments.ts';
import type { GridPlace } from '../map/place/grid-projection.ts';

/** Where a place is beside a line: its chainage, and how far to the left. */
export type PlaceOnLine = { readonly chainage: number; readonly offset: number };

/** By the nearest point of the line; null for a line that has no part. */
export function placeOnLine(line: AlignmentDesign['line'], place: GridPlace): PlaceOnLine | null {
  let [found, least, before]: [PlaceOnLine | null, number, number] = [null, Infinity, 0];
  for (const [k, end] of line.slice(1).entries()) {
    const start = line[k] ?? end;
    const length = planDistance(start, end);
    const { share, distance } = nearestOnSegment(place, { start, end });
    const [dx, dy] = [end[0] - start[0], end[1] - start[1]];
    const isLeft = dx * (place[1] - start[1]) - dy * (place[0] - start[0]) >= 0;
    if (distance < least) {
      least = distance;
      found = { chainage: before + share * length, offset: isLeft ? distance : -distance };
    }
    before += length;
  }
  return found;
}
