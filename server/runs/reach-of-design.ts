import type { AlignmentDesign } from '../../shared/schemas/alignments.ts';

/** In trough widths: farther off screening lets a building go at once. */
const WIDTHS = 4;

/** How far from the line buildings take time to work out, about, in metres. */
export function reachOfDesign(design: AlignmentDesign): number {
  const { levels, groundLevel, diameter, troughWidth, intervals, bores } = design;
  const depth = Math.max(...levels.map(({ level }) => groundLevel - level));
  const widest = Math.max(troughWidth.high, ...intervals.map((one) => one.troughWidth.high));
  const beside = bores.kind === 'twin' ? bores.spacing / 2 : 0;
  return WIDTHS * widest * Math.max(depth, diameter) + beside;
}
