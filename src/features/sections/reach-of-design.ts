import type { AlignmentDesign } from '../../../shared/schemas/alignments.ts';
import { boresOfDesign } from '../../../shared/assessment/bores-of-design.ts';
import { longSection } from '../../../shared/assessment/long-section.ts';

/** In trough widths: beyond so many beside a drive hardly anything moves. */
const WIDTHS = 2.5;
const STEP = 10;
const LEAST = 20;

/**
 * How far to either side of a line there is something to be seen, in metres and the same along all of it.
 * It only says what is drawn; nothing is worked out from it.
 */
export function reachOfDesign(design: AlignmentDesign): number {
  const { groundLevel, troughWidth, intervals } = design;
  const widest = Math.max(troughWidth.high, ...intervals.map((one) => one.troughWidth.high));
  const depth = groundLevel - Math.min(...longSection(design).map(({ axis }) => axis));
  const outermost = Math.max(...boresOfDesign(design).map(({ offset }) => Math.abs(offset)));
  const reach = outermost + WIDTHS * widest * Math.max(0, depth);
  return Math.max(LEAST, Math.ceil(reach / STEP) * STEP);
}
