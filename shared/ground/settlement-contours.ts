import { contours } from 'd3-contour';
import type { PlanPoint } from '../geometry/point.ts';
import type { GroundSurface } from './ground-surface.ts';
import { nodeAt, settlementGrid, type SettlementGrid } from './settlement-grid.ts';
import { thinnedLine } from './thinned-line.ts';
import { pointOnLevel, tracedSegment, type PointOnLevel } from './trace-level.ts';

/**
 * A line of equal settlement; a closed one ends where it starts.
 *
 * Units: m. Valid: every point of it is within 2 % or 0.1 mm of its level. Source: [own].
 */
export type SettlementContour = {
  readonly level: number;
  readonly line: readonly PlanPoint[];
  readonly isClosed: boolean;
};

/**
 * The settlements that plans and runs draw lines for.
 *
 * Units: m. Valid: ascending. Source: [common].
 */
export const CONTOUR_LEVELS: readonly number[] = [0.001, 0.002, 0.005, 0.01, 0.02, 0.03, 0.05];

type Ring = readonly (readonly number[])[];

/** A corner of a ring lies half-way along an edge of the grid: x or y is whole, and names the farther node. */
function edgeOf(grid: SettlementGrid, [x = 0, y = 0]: readonly number[]) {
  const isAcross = Number.isInteger(x);
  const [column, row] = [Math.floor(x), Math.floor(y)];
  const before = isAcross ? ([column - 1, row] as const) : ([column, row - 1] as const);
  return ([before, [column, row]] as const).map(([i, j]) => ({
    point: nodeAt(grid, i, j),
    settlement: grid.values[j * grid.columns + i] ?? 0,
  }));
}

/** Ground that passes its level by less has no line: on a grid it would be a string of beads. */
const LEAST_RISE = 0.015;

/** Whether the nodes beside a ring pass its level by enough, above it inside a ring and below it inside a hole. */
function isWorthALine(grid: SettlementGrid, level: number, ring: Ring, isHole: boolean): boolean {
  return ring.some((corner) =>
    edgeOf(grid, corner).some(({ settlement }) =>
      isHole ? settlement <= (1 - LEAST_RISE) * level : settlement >= (1 + LEAST_RISE) * level,
    ),
  );
}

function vertexOf(
  surface: GroundSurface,
  grid: SettlementGrid,
  level: number,
  corner: readonly number[],
): PointOnLevel | undefined {
  const [from, to] = edgeOf(grid, corner);
  return from === undefined || to === undefined
    ? undefined
    : pointOnLevel(surface, level, from, to);
}

/**
 * The stretches of a ring that could be put on its level, in one where the ring starts and ends: the whole
 * of it, but where the method refuses.
 */
function stretchesOf(
  surface: GroundSurface,
  level: number,
  vertices: readonly (PointOnLevel | undefined)[],
): PointOnLevel[][] {
  const stretches: PointOnLevel[][] = [];
  let stretch: PointOnLevel[] = [];
  for (const vertex of vertices) {
    const last = stretch.at(-1);
    const traced =
      vertex === undefined || last === undefined
        ? undefined
        : tracedSegment(surface, level, last, vertex);
    if (traced !== undefined) {
      stretch.push(...traced);
      continue;
    }
    stretches.push(stretch);
    stretch = vertex === undefined ? [] : [vertex];
  }
  const first = stretches[0];
  if (first === undefined || vertices[0] === undefined) stretches.push(stretch);
  else stretches[0] = [...stretch, ...first.slice(1)];
  return stretches.filter(({ length }) => length > 1);
}

/** None where a closed line is so thin that nothing of it is left. */
function contourOf(level: number, stretch: readonly PointOnLevel[]): SettlementContour[] {
  const line = thinnedLine(stretch);
  const [first, last] = [line[0], line.at(-1)];
  const isClosed = first?.[0] === last?.[0] && first?.[1] === last?.[1];
  return isClosed && line.length < 4 ? [] : [{ level, line, isClosed }];
}

/**
 * Lines of equal settlement at the surface: found on a grid, put on their level by Newton's steps, halved
 * until each segment keeps to it, and thinned. They close, except where the method refuses, as where a
 * drive comes out of the ground.
 *
 * Units: m. Valid: levels > 0; levels that are not reached, or passed by less than 1.5 %, have no line.
 * Source: [own]; marching squares
 * by d3-contour.
 */
export function settlementContours(
  surface: GroundSurface,
  levels: readonly number[],
): SettlementContour[] {
  const grid = settlementGrid(surface, Math.min(...levels));
  if (grid === undefined) return [];
  const generator = contours().size([grid.columns, grid.rows]).smooth(false);
  return levels.flatMap((level) => {
    const rings = generator
      .contour(grid.values, level)
      .coordinates.flatMap((polygon) =>
        polygon.filter((ring, k) => isWorthALine(grid, level, ring, k > 0)),
      );
    return rings.flatMap((ring) => {
      const vertices = ring.map((corner) => vertexOf(surface, grid, level, corner));
      const stretches = stretchesOf(surface, level, vertices);
      return stretches.flatMap((stretch) => contourOf(level, stretch));
    });
  });
}
