import { at } from '../numerics/at.ts';
import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { PACK_STRIDE } from './kernel.ts';
import type { LevelField } from './level-field.ts';
import { levelAlong, type Piece } from './piece.ts';

/**
 * One packed part of a drive: its group of volume loss, the eight numbers that the kernel takes, the
 * piece that it is cut from and the level of its axis.
 *
 * Units: see PACK_STRIDE; axis m above datum. Valid: made by `nearestPart`. Source: [own].
 */
export type PackedPart = {
  readonly group: number;
  readonly numbers: Float64Array;
  readonly piece: Piece;
  readonly axis: number;
};

function planOf(numbers: Float64Array): { start: PlanPoint; end: PlanPoint; middle: PlanPoint } {
  const length = at(numbers, 5) / at(numbers, 4);
  const along = (distance: number): PlanPoint => [
    at(numbers, 0) + distance * at(numbers, 2),
    at(numbers, 1) + distance * at(numbers, 3),
  ];
  return { start: along(0), end: along(length), middle: along(length / 2) };
}

/**
 * The packed part of a drive that lies nearest to a point, for workings.
 *
 * Units: m. Valid: `field` packed for this drive alone; undefined where nothing is packed.
 * Source: [own].
 */
export function nearestPart(
  field: LevelField,
  pieces: readonly Piece[],
  point: PlanPoint,
): PackedPart | undefined {
  let [least, found]: [number, { group: number; numbers: Float64Array } | undefined] = [
    Infinity,
    undefined,
  ];
  for (const [group, { pack, count }] of field.packs.entries()) {
    for (let part = 0; part < count; part++) {
      const numbers = pack.subarray(part * PACK_STRIDE, (part + 1) * PACK_STRIDE);
      const { distance } = nearestOnSegment(point, planOf(numbers));
      if (distance < least) [least, found] = [distance, { group, numbers }];
    }
  }
  if (found === undefined) return undefined;
  const { middle } = planOf(found.numbers);
  let [gap, owner, share]: [number, Piece | undefined, number] = [Infinity, undefined, 0];
  for (const piece of pieces) {
    const nearest = nearestOnSegment(middle, piece.plan);
    if (nearest.distance < gap) [gap, owner, share] = [nearest.distance, piece, nearest.share];
  }
  if (owner === undefined) return undefined;
  return { ...found, piece: owner, axis: levelAlong(owner, share * owner.length) };
}
