import { planDistance } from '../geometry/plan-distance.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { at } from '../numerics/at.ts';
import { findRoot } from '../numerics/find-root.ts';
import { interpolate } from '../numerics/interpolate.ts';
import type { GroundSurface } from './ground-surface.ts';
import { FIELD } from './kernel.ts';

/**
 * A point on a level of settlement, with how far a line may pass it by.
 *
 * Units: m. Valid: made by `pointOnLevel` and `tracedSegment`. Source: [own].
 */
export type PointOnLevel = { readonly point: PlanPoint; readonly slack: number };

/** Of what a line may be off its level, these shares go to a vertex, to a segment and to leaving vertices out. */
const SHARES = { vertex: 0.02, segment: 0.45, thinning: 0.4 } as const;
/** In trough widths: beyond, a line's distance no longer tells how far it is off its level. */
const MOST_SLACK = 0.03;
const MOST_STEPS = 8;
const MOST_HALVINGS = 10;
/** Of an edge of the grid. */
const ROOT_TOLERANCE = 1e-6;

/** How far settlement on a drawn line may be off its level: 2 % or 0.1 mm, whichever is more. */
function contourTolerance(level: number): number {
  return Math.max(0.02 * level, 0.0001);
}

function between(from: PlanPoint, to: PlanPoint, share: number): PlanPoint {
  return [interpolate(from[0], to[0], share), interpolate(from[1], to[1], share)];
}

/** The point, where it is on the level; else which way and how far to go at first. */
function look(surface: GroundSurface, level: number, point: PlanPoint) {
  const field = surface.at(point);
  if (field === undefined) return undefined;
  const gap = at(field, FIELD.settlement) - level;
  const [east, north] = [at(field, FIELD.slopeEast), at(field, FIELD.slopeNorth)];
  return { gap, east, north, squared: east * east + north * north };
}

/** Newton's steps along the gradient, undefined where they lead farther than `most` or nowhere. */
function pulled(
  surface: GroundSurface,
  level: number,
  start: PlanPoint,
  most: number,
): PointOnLevel | undefined {
  const tolerance = contourTolerance(level);
  let point = start;
  for (let step = 0; step < MOST_STEPS; step++) {
    const found = look(surface, level, point);
    if (found === undefined) return undefined;
    const { gap, east, north, squared } = found;
    if (Math.abs(gap) <= SHARES.vertex * tolerance) {
      const farthest = MOST_SLACK * (surface.widthAt(point) ?? 0);
      const slack = Math.min(farthest, (SHARES.thinning * tolerance) / Math.sqrt(squared));
      return { point, slack };
    }
    point = [point[0] - (gap * east) / squared, point[1] - (gap * north) / squared];
    if (!(planDistance(point, start) <= most)) return undefined;
  }
  return undefined;
}

/**
 * The point of a level near an edge of a grid, whose ends lie on either side of it.
 *
 * Units: m. Valid: undefined where the method refuses an end. Source: [own], Newton's steps along the
 * gradient and, where they lead away, the root on the edge.
 */
export function pointOnLevel(
  surface: GroundSurface,
  level: number,
  from: { readonly point: PlanPoint; readonly settlement: number },
  to: { readonly point: PlanPoint; readonly settlement: number },
): PointOnLevel | undefined {
  const share = (level - from.settlement) / (to.settlement - from.settlement);
  if (!(share >= 0 && share <= 1)) return undefined;
  const start = between(from.point, to.point, share);
  const near = pulled(surface, level, start, planDistance(from.point, to.point));
  if (near !== undefined) return near;
  const gapAt = (along: number) =>
    look(surface, level, between(from.point, to.point, along))?.gap ?? -level;
  if (gapAt(0) > 0 === gapAt(1) > 0) return undefined;
  const root = findRoot(gapAt, 0, 1, ROOT_TOLERANCE);
  const point = between(from.point, to.point, root);
  return Math.abs(gapAt(root)) > SHARES.vertex * contourTolerance(level)
    ? undefined
    : { point, slack: 0 };
}

/** Whether a straight line between two points of a level keeps to it, looked at in three places. */
function keepsTo(surface: GroundSurface, level: number, from: PlanPoint, to: PlanPoint): boolean {
  const most = SHARES.segment * contourTolerance(level);
  return [0.5, 0.25, 0.75].every((share) => {
    const found = look(surface, level, between(from, to, share));
    return found !== undefined && Math.abs(found.gap) <= most;
  });
}

/**
 * What has to be added between two points of a level so that the line keeps to it, the second point last.
 *
 * Units: m. Valid: undefined where no such line is found. Source: [own], halving.
 */
export function tracedSegment(
  surface: GroundSurface,
  level: number,
  from: PointOnLevel,
  to: PointOnLevel,
  halvings = MOST_HALVINGS,
): PointOnLevel[] | undefined {
  if (keepsTo(surface, level, from.point, to.point)) return [to];
  const length = planDistance(from.point, to.point);
  const middle = pulled(surface, level, between(from.point, to.point, 0.5), length);
  if (middle === undefined || halvings === 0) return undefined;
  const first = tracedSegment(surface, level, from, middle, halvings - 1);
  const second = tracedSegment(surface, level, middle, to, halvings - 1);
  return first === undefined || second === undefined ? undefined : [...first, ...second];
}
