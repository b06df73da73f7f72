import { chainages } from '../geometry/chainages.ts';
import { pointAtChainage } from '../geometry/point-at-chainage.ts';
import type { PlanPoint, SpacePoint } from '../geometry/point.ts';
import { polylineParts } from '../geometry/polyline-parts.ts';
import { at } from '../numerics/at.ts';
import { intervalIndex } from '../numerics/interval-index.ts';

/**
 * A drawn line by its chainage: its length, its points, and which way it runs.
 *
 * Units: m; directions of length 1. Valid: chainages past an end are taken at it. Source: [own].
 */
export type LineOnGround = {
  readonly length: number;
  readonly pointAt: (chainage: number) => PlanPoint;
  readonly directionAt: (chainage: number) => PlanPoint;
  /** The points from one chainage to a larger one, its vertices with them. */
  readonly between: (from: number, to: number) => PlanPoint[];
};

/**
 * A drawn line by its chainage.
 *
 * Units: m. Valid: throws `zero-length` where two neighbours coincide. Source: [own].
 */
export function lineOnGround(line: readonly PlanPoint[]): LineOnGround {
  const flat = line.map(([e, n]): SpacePoint => [e, n, 0]);
  const [stations, parts] = [chainages(flat), polylineParts(flat)];
  const pointAt = (chainage: number): PlanPoint => {
    const [e, n] = pointAtChainage(flat, stations, chainage);
    return [e, n];
  };
  return {
    length: at(stations, stations.length - 1),
    pointAt,
    directionAt: (chainage) => parts[intervalIndex(stations, chainage)]?.direction ?? [1, 0],
    between: (from, to) => {
      const inside = line.filter((_, k) => at(stations, k) > from && at(stations, k) < to);
      return [pointAt(from), ...inside, pointAt(to)];
    },
  };
}
