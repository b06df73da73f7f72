import { MethodError } from '../method-error.ts';
import { interpolate } from '../numerics/interpolate.ts';
import { planDistance } from './plan-distance.ts';
import type { PlanPoint, SpacePoint } from './point.ts';

/**
 * A circular arc in plan from one point to another, turning left (anticlockwise) or right (clockwise)
 * round a centre, its level changing evenly along it.
 *
 * Units: m. Valid: both ends equally far from the centre, to 0.05 m; less than a full circle.
 * Source: [own].
 */
export type Arc = {
  readonly start: SpacePoint;
  readonly end: SpacePoint;
  readonly centre: PlanPoint;
  readonly direction: 'left' | 'right';
};

/** How far the two radii of an arc may differ: what rounded coordinates cause, not a wrong centre. */
const RADIUS_TOLERANCE = 0.05;
const MOST_HALVINGS = 16;

function unit(x: number, y: number): PlanPoint {
  const length = Math.sqrt(x * x + y * y);
  return [x / length, y / length];
}

/** The direction half-way round from a to b; from the sum or the difference, whichever is longer. */
function halfWay(a: PlanPoint, b: PlanPoint, turn: 1 | -1): PlanPoint {
  if (a[0] * b[0] + a[1] * b[1] < 0) return unit(turn * (b[1] - a[1]), turn * (a[0] - b[0]));
  const sign = turn * (a[0] * b[1] - a[1] * b[0]) < 0 ? -1 : 1;
  return unit(sign * (a[0] + b[0]), sign * (a[1] + b[1]));
}

/** How many times to halve: sagitta/radius v = 1 − cos(half the angle), and v′ = 1 − √(1 − v/2). */
function halvingsFor(a: PlanPoint, b: PlanPoint, turn: 1 | -1, sagitta: number): number {
  const half = planDistance(a, b) / 2;
  const cosine = Math.sqrt(Math.max(0, 1 - half * half));
  const major = turn * (a[0] * b[1] - a[1] * b[0]) < 0;
  let versine = major ? 1 + cosine : (half * half) / (1 + cosine);
  let halvings = 0;
  for (; versine > sagitta && halvings <= MOST_HALVINGS; halvings++) {
    versine = versine / 2 / (1 + Math.sqrt(1 - versine / 2));
  }
  return halvings;
}

/**
 * An arc as equal chords that leave it by no more than a tolerance: their number is the smallest
 * power of two that does. The ends are kept as they are.
 *
 * Units: m. Valid: see Arc; tolerance > 0. Throws `zero-length` where an end is at the centre or at
 * the other end, `outside-range` where the radii differ, for a tolerance of 0 or less, or where more
 * than 65,536 chords would be needed. Source: [own], by halving.
 */
export function chordArc(arc: Arc, tolerance: number): SpacePoint[] {
  const { start, end, centre } = arc;
  const turn = arc.direction === 'left' ? 1 : -1;
  const [fromX, fromY] = [start[0] - centre[0], start[1] - centre[1]];
  const [toX, toY] = [end[0] - centre[0], end[1] - centre[1]];
  const radii = [planDistance([fromX, fromY], [0, 0]), planDistance([toX, toY], [0, 0])] as const;
  const [radius, endRadius] = radii;
  if (!(radius > 0 && endRadius > 0 && planDistance([fromX, fromY], [toX, toY]) > 0)) {
    throw new MethodError('zero-length', 'The ends and the centre of an arc must differ.');
  }
  if (!(Math.abs(radius - endRadius) <= RADIUS_TOLERANCE)) {
    const message = `The ends of the arc are ${radius} and ${endRadius} m from its centre.`;
    throw new MethodError('outside-range', message, 'centre');
  }
  const [first, last] = [unit(fromX, fromY), unit(toX, toY)];
  const largest = Math.max(radius, endRadius);
  const halvings = halvingsFor(first, last, turn, tolerance / largest);
  if (!(tolerance > 0) || halvings > MOST_HALVINGS) {
    throw new MethodError('outside-range', `An arc cannot be held to ${tolerance} m.`, 'tolerance');
  }
  let directions = [first, last];
  for (let k = 0; k < halvings; k++) directions = withMiddles(directions, turn);
  const chords = directions.length - 1;
  return directions.map(([x, y], k): SpacePoint => {
    if (k === 0) return start;
    if (k === chords) return end;
    const share = k / chords;
    const r = interpolate(radius, endRadius, share);
    return [centre[0] + r * x, centre[1] + r * y, interpolate(start[2], end[2], share)];
  });
}

function withMiddles(directions: readonly PlanPoint[], turn: 1 | -1): PlanPoint[] {
  return directions.flatMap((direction, k) => {
    const next = directions[k + 1];
    return next === undefined ? [direction] : [direction, halfWay(direction, next, turn)];
  });
}
