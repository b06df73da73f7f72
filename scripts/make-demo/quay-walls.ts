import type { Feature } from './features.ts';
import { distanceToRing } from './polygons.ts';
import { between } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** How far a quay may stand from the land's edge to be one with it. */
const NEAR = 0.4;

/** The stretches of a line of which each piece runs along the land. */
function stretchesAlong(line: readonly Point[], land: readonly Ring[]): Point[][] {
  const stretches: Point[][] = [];
  let open: Point[] = [];
  for (const [index, end] of line.entries()) {
    const start = line[index - 1];
    if (start === undefined) continue;
    const middle = between(start, end, 0.5);
    if (land.some((ring) => distanceToRing(middle, ring) < NEAR)) {
      if (open.length === 0) {
        open = [start];
        stretches.push(open);
      }
      open.push(end);
    } else open = [];
  }
  return stretches;
}

/** Quays and jetties without the line across the harbour's mouth, where there is no wall. */
export function standingQuays(
  quays: readonly Feature[],
  land: readonly Feature[],
): readonly Feature[] {
  const edges = land.flatMap(({ geometry }) =>
    geometry.type === 'Polygon' ? geometry.coordinates : [],
  );
  return quays.flatMap((quay) => {
    const { geometry } = quay;
    if (geometry.type !== 'LineString') return [quay];
    return stretchesAlong(geometry.coordinates, edges).map((coordinates): Feature => ({
      ...quay,
      geometry: { type: 'LineString', coordinates },
    }));
  });
}
