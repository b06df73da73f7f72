import { at } from '../numerics/at.ts';
import { FIELD_SIZE, sumPieces } from './kernel.ts';
import type { LevelField } from './level-field.ts';

/**
 * The movement of the ground at many points of one place: FIELD_SIZE numbers per point, in the order
 * of FIELD, with each group of volume loss multiplied by its factor.
 *
 * Units: points as easting, northing by turns in m; answers as FIELD. Valid: points of the place for
 * which the field was packed; one factor per group. Source: attewell-woodman-1982; the sum over
 * drives is new-oreilly-1991.
 */
export function fieldAtPoints(
  field: LevelField,
  points: Float64Array,
  factors: readonly number[],
): Float64Array {
  const count = points.length / 2;
  const values = new Float64Array(count * FIELD_SIZE);
  const one = new Float64Array(FIELD_SIZE);
  for (const [group, { pack, count: pieces }] of field.packs.entries()) {
    const factor = factors[group] ?? 0;
    if (pieces === 0 || factor === 0) continue;
    for (let p = 0; p < count; p++) {
      sumPieces(pack, pieces, at(points, 2 * p), at(points, 2 * p + 1), one);
      const offset = p * FIELD_SIZE;
      for (let n = 0; n < FIELD_SIZE; n++) {
        values[offset + n] = at(values, offset + n) + factor * at(one, n);
      }
    }
  }
  return values;
}
