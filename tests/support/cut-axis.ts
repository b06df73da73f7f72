import type { SpacePoint } from '../../shared/geometry/point.ts';

/** An axis with every part cut into so many equal ones: the same line by more vertices. */
export function cutAxis(axis: readonly SpacePoint[], parts: number): SpacePoint[] {
  return axis.flatMap((from, k) => {
    const to = axis[k + 1];
    if (to === undefined) return [from];
    return Array.from({ length: parts }, (_, part): SpacePoint => {
      const share = part / parts;
      return [
        from[0] + share * (to[0] - from[0]),
        from[1] + share * (to[1] - from[1]),
        from[2] + share * (to[2] - from[2]),
      ];
    });
  });
}
