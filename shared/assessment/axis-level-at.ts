import { interpolate } from '../numerics/interpolate.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';

/**
 * The level of a designed axis at a chainage of the drawn line.
 *
 * Units: m. Valid: levels in order of chainage, at least one; straight between them and level beyond.
 * Source: [own].
 */
export function axisLevelAt(levels: AlignmentDesign['levels'], chainage: number): number {
  const after = levels.findIndex((one) => one.chainage > chainage);
  const [before, next] = [levels.at(after === -1 ? -1 : Math.max(0, after - 1)), levels[after]];
  if (before === undefined) return 0;
  if (next === undefined || before.chainage >= chainage) return before.level;
  const share = (chainage - before.chainage) / (next.chainage - before.chainage);
  return interpolate(before.level, next.level, share);
}
