import { stretchWithin } from '../geometry/stretch-within.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { at } from '../numerics/at.ts';
import { PACK_STRIDE } from './kernel.ts';
import type { LevelField } from './level-field.ts';

/**
 * The parts of a straight line that lie within some trough widths, at the level considered, of any
 * part of a drive in plan.
 *
 * Units: m along the line from its start. Valid: `field` packed for the place of the line; parts may
 * overlap and are in no order. Source: mair-taylor-burland-1996, for 2.5 widths.
 */
export function stretchesWithinReach(
  field: LevelField,
  line: { start: PlanPoint; direction: PlanPoint; length: number },
  widths: number,
): [from: number, to: number][] {
  const stretches: [number, number][] = [];
  for (const { pack, count } of field.packs) {
    for (let o = 0; o < count * PACK_STRIDE; o += PACK_STRIDE) {
      const width = 1 / at(pack, o + 4);
      const length = at(pack, o + 5) * width;
      const start: PlanPoint = [at(pack, o), at(pack, o + 1)];
      const end: PlanPoint = [
        start[0] + length * at(pack, o + 2),
        start[1] + length * at(pack, o + 3),
      ];
      const stretch = stretchWithin(line, { start, end }, widths * width);
      if (stretch !== undefined) stretches.push(stretch);
    }
  }
  return stretches;
}
