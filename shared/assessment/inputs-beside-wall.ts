import type { PlanPoint } from '../geometry/point.ts';
import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import type { Wall } from '../building/wall.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import type { Piece } from '../ground/piece.ts';
import type { Range } from '../numerics/range.ts';

/**
 * The volume loss and K of the piece of drive that is nearest to the middle of a wall: those that stand
 * beside its bracket.
 *
 * Units: volumeLoss m/m. Valid: undefined for a model without drives. Source: [own].
 */
export function inputsBesideWall(
  { pieces }: GroundModel,
  { segment }: Pick<Wall, 'segment'>,
): { readonly volumeLoss: Range; readonly troughWidth: Range } | undefined {
  const { start, end } = segment;
  const middle: PlanPoint = [(start[0] + end[0]) / 2, (start[1] + end[1]) / 2];
  let nearest: { readonly piece: Piece; readonly distance: number } | undefined;
  for (const piece of pieces.flat()) {
    const { distance } = nearestOnSegment(middle, piece.plan);
    if (nearest === undefined || distance < nearest.distance) nearest = { piece, distance };
  }
  return nearest?.piece;
}
