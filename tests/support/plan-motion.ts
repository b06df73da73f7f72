import fc from 'fast-check';
import type { PlanPoint, Segment, SpacePoint } from '../../shared/geometry/point.ts';
import { numbers } from './property.ts';

/** A turn about the origin, then a shift: what must not change what lies where. */
export type Motion = { readonly turn: number; readonly east: number; readonly north: number };

/** Turns of any size, with a shift to where national grids are. */
export const motions: fc.Arbitrary<Motion> = fc.record({
  turn: numbers(-Math.PI, Math.PI),
  east: fc.constantFrom(0, 500_000, -1234.5, 532_123.25),
  north: fc.constantFrom(0, 6_000_000, 77.75, 5_712_345.5),
});

/**
 * What a coordinate of six million metres may be off after a turn and a few sums: ten units in its last
 * place of 9.3e-10 m.
 */
export const FAR_FROM_ORIGIN = 1e-8;

export function movePoint({ turn, east, north }: Motion, [x, y]: PlanPoint): PlanPoint {
  const [c, s] = [Math.cos(turn), Math.sin(turn)];
  return [x * c - y * s + east, x * s + y * c + north];
}

export function moveSpacePoint(motion: Motion, [x, y, level]: SpacePoint): SpacePoint {
  return [...movePoint(motion, [x, y]), level];
}

export function moveSegment(motion: Motion, { start, end }: Segment): Segment {
  return { start: movePoint(motion, start), end: movePoint(motion, end) };
}

export function turnDirection({ turn }: Motion, direction: PlanPoint): PlanPoint {
  return movePoint({ turn, east: 0, north: 0 }, direction);
}
