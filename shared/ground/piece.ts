import type { Range } from '../numerics/range.ts';
import type { Segment } from '../geometry/point.ts';

/**
 * A straight part of a drive with one set of inputs, as the kernel takes it.
 *
 * Units: lengths and levels m; `unitLoss` m³/m for the weight of its group; `cosEast` and `cosNorth`
 * are its direction. Valid: length > 0. Source: [own].
 */
export type Piece = {
  readonly drive: number;
  readonly group: number;
  readonly from: number;
  readonly length: number;
  readonly plan: Segment;
  readonly cosEast: number;
  readonly cosNorth: number;
  readonly startLevel: number;
  readonly endLevel: number;
  readonly diameter: number;
  readonly unitLoss: number;
  readonly volumeLoss: Range;
  readonly troughWidth: Range;
};

/**
 * The level of a piece's axis some way along it.
 *
 * Units: m. Valid: 0 ≤ along ≤ length. Source: [own].
 */
export function levelAlong(piece: Piece, along: number): number {
  return piece.startLevel + ((piece.endLevel - piece.startLevel) * along) / piece.length;
}

/**
 * The plan of a piece up to a length from its start, which is all of it that a face has driven.
 *
 * Units: m. Valid: 0 < length ≤ the piece's. Source: [own].
 */
export function drivenPlan(piece: Piece, length: number): Segment {
  const { start, end } = piece.plan;
  if (length >= piece.length) return { start, end };
  return {
    start,
    end: [start[0] + length * piece.cosEast, start[1] + length * piece.cosNorth],
  };
}
