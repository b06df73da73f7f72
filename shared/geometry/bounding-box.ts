import type { PlanPoint } from './point.ts';

/**
 * A box with sides along the grid.
 *
 * Units: m. Valid: west ≤ east and south ≤ north. Source: [own].
 */
export type Box = {
  readonly west: number;
  readonly south: number;
  readonly east: number;
  readonly north: number;
};

/**
 * The smallest box round some points.
 *
 * Units: m. Valid: at least one point. Source: [own].
 */
export function boundingBox(points: readonly PlanPoint[]): Box {
  let [west, south, east, north] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const [x, y] of points) {
    west = Math.min(west, x);
    east = Math.max(east, x);
    south = Math.min(south, y);
    north = Math.max(north, y);
  }
  return { west, south, east, north };
}

/**
 * The distance between two boxes, 0 where they overlap: never more than the distance between what
 * they hold.
 *
 * Units: m. Valid: any boxes. Source: [own].
 */
export function boxDistance(a: Box, b: Box): number {
  const dx = Math.max(a.west - b.east, b.west - a.east, 0);
  const dy = Math.max(a.south - b.north, b.south - a.north, 0);
  return Math.sqrt(dx * dx + dy * dy);
}
