import type { PlanPoint } from './point.ts';

/**
 * All directions from one to another, turning left.
 *
 * Units: none. Valid: less than half a turn wide. Source: [own].
 */
export type DirectionFan = { readonly right: PlanPoint; readonly left: PlanPoint };

function cross(a: PlanPoint, b: PlanPoint): number {
  return a[0] * b[1] - a[1] * b[0];
}

function dot(a: PlanPoint, b: PlanPoint): number {
  return a[0] * b[0] + a[1] * b[1];
}

/**
 * The directions within an angle of one direction, the angle given by its sine.
 *
 * Units: none. Valid: direction of length 1, 0 ≤ sine < 1. Source: [own], rotation.
 */
export function fanAround(direction: PlanPoint, sine: number): DirectionFan {
  const [x, y] = direction;
  const cosine = Math.sqrt((1 - sine) * (1 + sine));
  return {
    right: [x * cosine + y * sine, y * cosine - x * sine],
    left: [x * cosine - y * sine, y * cosine + x * sine],
  };
}

/**
 * Whether a fan holds a direction, its edges included.
 *
 * Units: none. Valid: a direction of any length; one of no length is never held. Source: [own].
 */
export function fanHolds(fan: DirectionFan, direction: PlanPoint): boolean {
  return (
    cross(fan.right, direction) >= 0 &&
    cross(direction, fan.left) >= 0 &&
    (dot(fan.right, direction) > 0 || dot(fan.left, direction) > 0)
  );
}

/**
 * The directions that two fans have in common.
 *
 * Units: none. Valid: undefined where they have none. Source: [own].
 */
export function commonFan(a: DirectionFan, b: DirectionFan): DirectionFan | undefined {
  const right = fanHolds(a, b.right) ? b.right : fanHolds(b, a.right) ? a.right : undefined;
  const left = fanHolds(a, b.left) ? b.left : fanHolds(b, a.left) ? a.left : undefined;
  return right === undefined || left === undefined ? undefined : { right, left };
}
