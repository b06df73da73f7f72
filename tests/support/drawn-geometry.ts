import fc from 'fast-check';
import type { PlanPoint, Segment, SpacePoint } from '../../shared/geometry/point.ts';
import { numbers } from './property.ts';

/** A point within a hundred metres of the origin. */
export const planPoints: fc.Arbitrary<PlanPoint> = fc.tuple(numbers(-100, 100), numbers(-100, 100));

/** A segment within a hundred metres of the origin. */
export const segments: fc.Arbitrary<Segment> = fc.record({ start: planPoints, end: planPoints });

/** A polyline of three to ten vertices, parts of 5 to 40 m that turn by under 1.2 radians. */
export const axes: fc.Arbitrary<SpacePoint[]> = fc
  .array(fc.tuple(numbers(-1.2, 1.2), numbers(5, 40), numbers(-30, 5)), {
    minLength: 2,
    maxLength: 9,
  })
  .map((parts) => {
    let [x, y, heading] = [0, 0, 0];
    const vertices: SpacePoint[] = [[0, 0, -20]];
    for (const [turn, length, level] of parts) {
      heading += turn;
      x += length * Math.cos(heading);
      y += length * Math.sin(heading);
      vertices.push([x, y, level]);
    }
    return vertices;
  });

/** A ring without crossings, seen round from the origin: three to twelve vertices, anticlockwise. */
export const rings: fc.Arbitrary<PlanPoint[]> = fc
  .array(fc.tuple(numbers(0.2, 1), numbers(5, 30)), { minLength: 3, maxLength: 12 })
  .map((corners) => {
    const round = corners.reduce((sum, [share]) => sum + share, 0);
    let angle = 0;
    return corners.map(([share, radius]): PlanPoint => {
      angle += (share / round) * 2 * Math.PI;
      return [radius * Math.cos(angle), radius * Math.sin(angle)];
    });
  });

/** A regular ring. */
export function regularRing(corners: number, radius: number): PlanPoint[] {
  return Array.from({ length: corners }, (_, k): PlanPoint => {
    const angle = (2 * Math.PI * k) / corners;
    return [radius * Math.cos(angle), radius * Math.sin(angle)];
  });
}
