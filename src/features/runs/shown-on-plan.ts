import type { AlignmentAnswer } from '../../../shared/schemas/alignments.ts';
import type { RunAnswer } from '../../../shared/schemas/runs.ts';
import { completeOf } from './run-states.ts';

/** In the address where no option is to be seen. */
export const NO_OPTION = 'none';

/** What the address names. */
type Named = { readonly option: string | null; readonly run: string | null };

/** An option of the line with the run that goes with it; `isNamed` tells that the run was asked for. */
export type ShownOnPlan = {
  readonly option: AlignmentAnswer | null;
  readonly run: RunAnswer | null;
  readonly isNamed: boolean;
};

/**
 * What the plan shows: the run that is named, or the option that is named with its newest complete run, or
 * the newest complete run of all with its option, or the first option.
 */
export function shownOnPlan(
  named: Named,
  options: readonly AlignmentAnswer[],
  runs: readonly RunAnswer[],
): ShownOnPlan {
  const complete = completeOf(runs);
  const optionOf = (run: RunAnswer) => options.find(({ id }) => id === run.option.id) ?? null;
  const asked = complete.find(({ id }) => id === named.run);
  if (asked !== undefined) return { option: optionOf(asked), run: asked, isNamed: true };
  if (named.option === NO_OPTION) return { option: null, run: null, isNamed: false };
  const chosen = options.find(({ id }) => id === named.option);
  if (chosen !== undefined) {
    const run = complete.find(({ option }) => option.id === chosen.id) ?? null;
    return { option: chosen, run, isNamed: false };
  }
  const newest = complete.find(({ isShown }) => isShown) ?? null;
  const option = newest === null ? (options[0] ?? null) : optionOf(newest);
  return { option, run: newest, isNamed: false };
}
