import { boxDistance } from '../geometry/bounding-box.ts';
import type { Block } from './block.ts';
import { BESIDE_IN_WIDTHS } from './crown-rule.ts';
import type { Place } from './place.ts';
import { troughWidth } from './trough-width.ts';
import { ruleAt, type TroughWidthRule } from './trough-width-rule.ts';

/**
 * The settlement that all culled blocks together may be short of.
 *
 * Units: m. Valid: a constant. Source: [own].
 */
export const CULLED_SETTLEMENT = 1e-9;

/**
 * The curvature that all culled blocks together may be short of.
 *
 * Units: 1/m. Valid: a constant. Source: [own].
 */
export const CULLED_CURVATURE = 1e-10;

/** (1 + x/2ⁿ)^(2ⁿ) is never more than eˣ and costs n products. */
const SQUARINGS = 10;

/** A bound that e⁻ˣ never passes, for x ≥ 0, at a tenth of the cost of the exponential. */
function boundOfDecay(x: number): number {
  let power = 1 + x / (1 << SQUARINGS);
  for (let n = 0; n < SQUARINGS; n++) power *= power;
  return 1 / power;
}

/** Within it the curvature of a point sink may still grow with distance, so nothing is culled. */
const NEVER_CULLED_WITHIN = 2;

/**
 * Whether a block moves the ground at a place too little to be summed. A drive is a row of point
 * sinks V/(2πi²)·exp(−r²/2i²) whose second derivatives are at most (1 + r²/i²)/i² times that; with
 * the block's whole volume at its least distance and its extreme widths, over the whole range of K,
 * this bounds both sums, and each of `blocks` blocks may use an equal share of what may be missing.
 *
 * Units: m. Valid: false, never a guess, where the widths of the block are not positive or its crown
 * comes near the founding level, which the crown rule must see.
 * Source: [own].
 */
export function blockIsNegligible(
  block: Block,
  place: Place,
  rule: TroughWidthRule,
  blocks: number,
): boolean {
  const { groundLevel: ground, foundingLevel: founding } = place;
  const crown = block.highestAxis + block.largestDiameter / 2;
  if (crown >= founding) return false;
  const widest = troughWidth(ruleAt(rule, 4), block.largestK, {
    ground,
    founding,
    axis: block.lowestAxis,
  });
  const distance = boxDistance(block.box, place.box);
  if (founding - crown < block.largestDiameter) {
    const levels = { ground, founding: ground, axis: block.lowestAxis };
    const reach = BESIDE_IN_WIDTHS * troughWidth(ruleAt(rule, 4), block.largestK, levels);
    if (distance < reach + block.largestDiameter / 2) return false;
  }
  if (!(widest > 0) || distance < NEVER_CULLED_WITHIN * widest) return false;
  const narrowest = troughWidth(ruleAt(rule, 0), block.smallestK, {
    ground,
    founding,
    axis: block.highestAxis,
  });
  if (!(narrowest > 0)) return false;
  const t = distance / widest;
  const settlement =
    (block.volume * boundOfDecay((t * t) / 2)) / (2 * Math.PI * narrowest * narrowest);
  const curvature = (settlement * (1 + t * t)) / (narrowest * narrowest);
  return settlement * blocks < CULLED_SETTLEMENT && curvature * blocks < CULLED_CURVATURE;
}
