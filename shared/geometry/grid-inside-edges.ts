import { interpolate } from '../numerics/interpolate.ts';
import { boundingBox } from './bounding-box.ts';
import { nearestOnSegment } from './nearest-on-segment.ts';
import type { PlanPoint, Segment } from './point.ts';
import { stepsOf } from './steps-of.ts';

/** Grid points nearer to an edge than this share of the spacing stand for points that edge has. */
const ON_EDGE = 1e-6;

/** Where a row passes edges, in order: inside is from the first to the second, and so on. */
function crossingsOfRow(edges: readonly Segment[], y: number): number[] {
  const crossings: number[] = [];
  for (const { start, end } of edges) {
    if (start[1] > y === end[1] > y) continue;
    const share = (y - start[1]) / (end[1] - start[1]);
    crossings.push(start[0] + share * (end[0] - start[0]));
  }
  return crossings.sort((a, b) => a - b);
}

/**
 * The points inside closed rings, and not on their edges, of a square grid that fills the box round
 * them evenly.
 *
 * Units: m. Valid: the edges of closed rings, holes by the even-odd rule; spacing > 0.
 * Source: [own].
 */
export function* gridInsideEdges(
  edges: readonly Segment[],
  spacing: number,
): Generator<PlanPoint, void> {
  const { west, east, south, north } = boundingBox(edges.map(({ start }) => start));
  const columns = stepsOf(east - west, spacing);
  const rows = stepsOf(north - south, spacing);
  for (let row = 1; row < rows; row++) {
    const y = interpolate(south, north, row / rows);
    let from: number | undefined;
    for (const crossing of crossingsOfRow(edges, y)) {
      const column = ((crossing - west) * columns) / (east - west);
      if (from === undefined) {
        from = Math.max(1, Math.ceil(column));
        continue;
      }
      for (; from < columns && from <= column; from++) {
        const point: PlanPoint = [interpolate(west, east, from / columns), y];
        const clear = edges.every((e) => nearestOnSegment(point, e).distance > spacing * ON_EDGE);
        if (clear) yield point;
      }
      from = undefined;
    }
  }
}
