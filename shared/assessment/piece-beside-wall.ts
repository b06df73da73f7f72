import type { PlanPoint } from '../geometry/point.ts';
import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import type { Wall } from '../building/wall.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { levelAlong, type Piece } from '../ground/piece.ts';

/**
 * The piece of drive that is nearest to the middle of a wall, and the level of its axis there: its volume
 * loss and K are those that stand beside the wall's bracket.
 *
 * Units: axis m above datum. Valid: undefined for a model without drives. Source: [own].
 */
export function pieceBesideWall(
  { pieces }: Pick<GroundModel, 'pieces'>,
  { segment }: Pick<Wall, 'segment'>,
): { readonly piece: Piece; readonly axis: number } | undefined {
  const { start, end } = segment;
  const middle: PlanPoint = [(start[0] + end[0]) / 2, (start[1] + end[1]) / 2];
  let nearest: { piece: Piece; share: number; distance: number } | undefined;
  for (const piece of pieces.flat()) {
    const { share, distance } = nearestOnSegment(middle, piece.plan);
    if (nearest === undefined || distance < nearest.distance) nearest = { piece, share, distance };
  }
  if (nearest === undefined) return undefined;
  const { piece, share } = nearest;
  return { piece, axis: levelAlong(piece, share * piece.length) };
}
