import type { PlanPoint } from '../geometry/point.ts';
import { steps } from '../numerics/steps.ts';
import { chainageWords } from '../presentation/chainage-words.ts';
import type { GroundFrame } from './ground-frame.ts';
import { lineOnGround } from './line-on-ground.ts';
import { isInside, type Measure, type Spot } from './marks.ts';
import type { Wanted } from './place-labels.ts';

/**
 * A chainage of a line on paper: where it is, which way the line runs there, and how it is written.
 *
 * Units: mm. Valid: `along` of length 1. Source: [own].
 */
export type ChainageTick = { readonly words: string; readonly at: Spot; readonly along: Spot };

/**
 * The size of chainages.
 *
 * Units: points of print. Valid: a constant. Source: [own].
 */
export const CHAINAGE_SIZE = 8;

const STEPS = [10, 20, 50, 100, 200, 500, 1000];
const APART = 35;
/** From the line to the near end of a label, in mm. */
const ASIDE = [7, 10, 14, 19, 25, 32];

/**
 * The round chainages of a line that lie in a frame.
 *
 * Units: m and mm. Valid: a line of two points or more. Source: [own].
 */
export function chainageTicks(frame: GroundFrame, line: readonly PlanPoint[]): ChainageTick[] {
  const { length, pointAt, directionAt } = lineOnGround(line);
  const step = STEPS.find((one) => (one * 1000) / frame.denominator >= APART) ?? 1000;
  return steps(0, length, step).flatMap((chainage) => {
    const at = frame.place(pointAt(chainage));
    if (!isInside(frame.window, at)) return [];
    return [{ words: chainageWords(chainage), at, along: frame.turned(directionAt(chainage)) }];
  });
}

/**
 * The labels that chainages want: upright, at the end of a fine line across, on either side.
 *
 * Units: mm. Valid: any ticks. Source: [own].
 */
export function chainageLabels(
  ticks: readonly ChainageTick[],
  measure: Measure,
): Wanted<ChainageTick>[] {
  return ticks.map((tick) => {
    const halfWide = measure(tick.words, CHAINAGE_SIZE, true) / 2 + 0.8;
    const halfTall = 1.9;
    const [c, s] = tick.along;
    const spots = ASIDE.flatMap((aside) =>
      [1, -1].map((side) => {
        // far enough for the whole box to lie beyond the end of the fine line
        const far = side * (aside + Math.abs(s) * halfWide + Math.abs(c) * halfTall);
        const middle: Spot = [tick.at[0] - s * far, tick.at[1] + c * far];
        return { middle, halfWide, halfTall, along: [1, 0] as const };
      }),
    );
    return { what: tick, spots };
  });
}
