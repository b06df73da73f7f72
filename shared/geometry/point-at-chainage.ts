import { MethodError } from '../method-error.ts';
import { at } from '../numerics/at.ts';
import { interpolate } from '../numerics/interpolate.ts';
import { intervalIndex } from '../numerics/interval-index.ts';
import type { SpacePoint } from './point.ts';

/**
 * The point of a polyline at a chainage; before its start and past its end, the point there.
 *
 * Units: m. Valid: `chainages` as `chainages` gives them for this axis; throws `outside-range` for
 * an axis of fewer than two points. Source: [own], linear between vertices.
 */
export function pointAtChainage(
  axis: readonly SpacePoint[],
  chainages: Float64Array,
  chainage: number,
): SpacePoint {
  const index = intervalIndex(chainages, chainage);
  const [before, after] = axis.slice(index, index + 2);
  if (before === undefined || after === undefined) {
    throw new MethodError('outside-range', 'An axis needs at least two points.');
  }
  const from = at(chainages, index);
  const along = (chainage - from) / (at(chainages, index + 1) - from);
  const share = Math.min(1, Math.max(0, along));
  return [
    interpolate(before[0], after[0], share),
    interpolate(before[1], after[1], share),
    interpolate(before[2], after[2], share),
  ];
}
