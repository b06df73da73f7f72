import { MethodError } from '../method-error.ts';
import { interpolate } from '../numerics/interpolate.ts';
import { gridInsideEdges } from './grid-inside-edges.ts';
import type { PlanPoint } from './point.ts';
import { polygonEdges } from './polygon-edges.ts';
import { polylineParts, type PolylinePart } from './polyline-parts.ts';
import { stepsOf } from './steps-of.ts';

/** Edges whose lengths differ by less than this share are equally long. */
const SAME_LENGTH = 1e-9;

function longestEdge(edges: readonly PolylinePart[]): PolylinePart {
  const longest = edges.reduce((most, { length }) => Math.max(most, length), 0);
  const first = edges.find(({ length }) => length >= longest * (1 - SAME_LENGTH));
  if (first === undefined) {
    throw new MethodError('zero-length', 'A polygon needs at least two different points.');
  }
  return first;
}

function* alongEdge(edge: PolylinePart, spacing: number): Generator<PlanPoint, void> {
  const { start, end, length } = edge;
  const steps = stepsOf(length, spacing);
  for (let k = 0; k < steps; k++) {
    yield [interpolate(start[0], end[0], k / steps), interpolate(start[1], end[1], k / steps)];
  }
}

/** A point in the axes that start with an edge and run along it and to its left. */
function intoAxesOf({ start, direction: [ux, uy] }: PolylinePart, [x, y]: PlanPoint): PlanPoint {
  const [dx, dy] = [x - start[0], y - start[1]];
  return [dx * ux + dy * uy, dy * ux - dx * uy];
}

function outOfAxesOf({ start, direction: [ux, uy] }: PolylinePart, [x, y]: PlanPoint): PlanPoint {
  return [start[0] + x * ux - y * uy, start[1] + x * uy + y * ux];
}

function* gridPoints(edges: readonly PolylinePart[], spacing: number): Generator<PlanPoint, void> {
  for (const edge of edges) yield* alongEdge(edge, spacing);
  const axes = longestEdge(edges);
  const turned = edges.map(({ start, end }) => ({
    start: intoAxesOf(axes, start),
    end: intoAxesOf(axes, end),
  }));
  for (const point of gridInsideEdges(turned, spacing)) yield outOfAxesOf(axes, point);
}

/**
 * Points by which to sample a polygon: its corners, points along its edges and a grid inside, all at
 * most `spacing` apart. The grid is turned along the longest edge (of edges equally long, the first)
 * and fills the box round the polygon in that direction evenly, so that the points move and turn with
 * the polygon. Easting and northing by turns.
 *
 * Units: m. Valid: rings closed or not, holes by the even-odd rule; throws `outside-range` for a
 * spacing of 0 or less and where there would be more than `limit` points, `zero-length` where all
 * vertices are one. Source: [own].
 */
export function gridInPolygon(
  rings: readonly (readonly PlanPoint[])[],
  spacing: number,
  limit: number,
): Float64Array {
  if (!(spacing > 0)) throw new MethodError('outside-range', 'The spacing must be positive.');
  const edges = rings
    .flatMap(polygonEdges)
    .flatMap(({ start, end }) => polylineParts([start, end]));
  const points: number[] = [];
  for (const [x, y] of gridPoints(edges, spacing)) {
    if (points.length >= 2 * limit) {
      const message = `A grid of ${spacing} m would have more than ${limit} points.`;
      throw new MethodError('outside-range', message);
    }
    points.push(x, y);
  }
  return Float64Array.from(points);
}
