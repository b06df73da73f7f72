import { planDistance } from '../geometry/plan-distance.ts';
import type { LabelBox } from './label-box.ts';
import { lineOnGround } from './line-on-ground.ts';
import type { Spot } from './marks.ts';

/** In mm: from one spot to the next, and how far a line may be from straight under a label. */
const [STEP, SAG] = [4, 0.7];

/** A direction that words can be read in: never from right to left. */
function readable([x, y]: Spot): Spot {
  const turned = x < -1e-9 || (Math.abs(x) <= 1e-9 && y > 0);
  return turned ? [-x, -y] : [x, y];
}

/** Whether a piece of a line stays beside words that stand on its middle. */
function isStraight(piece: readonly Spot[], [x, y]: Spot, [c, s]: Spot): boolean {
  return piece.every((spot) => Math.abs(c * (spot[1] - y) - s * (spot[0] - x)) <= SAG);
}

/**
 * Where words of a length may stand on a line, along it, where it is nearly straight. The line's length in
 * the middle of each spot comes with it.
 *
 * Units: mm. Valid: none on a line that is shorter than the words. Source: [own].
 */
export function spotsAlong(
  line: readonly Spot[],
  { wide, tall }: { readonly wide: number; readonly tall: number },
): { readonly box: LabelBox; readonly distance: number }[] {
  const apart = line.filter((spot, k) => k === 0 || planDistance(spot, line[k - 1] ?? spot) > 0);
  if (apart.length < 2) return [];
  const { length, pointAt, between } = lineOnGround(apart);
  const count = Math.max(0, Math.floor((length - wide) / STEP) + 1);
  const first = (length - (count - 1) * STEP) / 2;
  return Array.from({ length: count }, (_, k) => first + k * STEP).flatMap((distance) => {
    const middle = pointAt(distance);
    const piece = between(distance - wide / 2, distance + wide / 2);
    const [from, to] = [piece[0] ?? middle, piece.at(-1) ?? middle];
    const long = planDistance(from, to);
    if (long < 0.9 * wide) return [];
    const along = readable([(to[0] - from[0]) / long, (to[1] - from[1]) / long]);
    if (!isStraight(piece, middle, along)) return [];
    return [{ distance, box: { middle, halfWide: wide / 2, halfTall: tall / 2, along } }];
  });
}
