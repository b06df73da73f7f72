import type { PlanPoint, Segment } from '../../shared/geometry/point.ts';

export type Straightness = { readonly offset: number; readonly angle: number };

/** How far, at most, the ends of parts are off the line from the first to the last of them, and how far parts turn from it. */
export function straightness(parts: readonly Segment[]): Straightness {
  const [from, to] = [parts[0]?.start ?? [NaN, NaN], parts.at(-1)?.end ?? [NaN, NaN]];
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  const length = Math.hypot(dx, dy);
  function off([x, y]: PlanPoint): number {
    return Math.abs(dx * (y - from[1]) - dy * (x - from[0])) / length;
  }
  function turn({ start, end }: Segment): number {
    const [ex, ey] = [end[0] - start[0], end[1] - start[1]];
    return Math.abs(Math.atan2(dx * ey - dy * ex, dx * ex + dy * ey));
  }
  return {
    offset: Math.max(...parts.flatMap(({ start, end }) => [off(start), off(end)])),
    angle: Math.max(...parts.map(turn)),
  };
}

/** Whether parts keep to a tolerance, with a millionth to spare for rounding. */
export function keepsTo(parts: readonly Segment[], { offset, angle }: Straightness): boolean {
  const got = straightness(parts);
  return got.offset <= offset * (1 + 1e-6) && got.angle <= angle * (1 + 1e-6);
}
