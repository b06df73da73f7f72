import { CATEGORIES } from '../damage/categories.ts';
import type { RunAnswer, RunCounts } from '../schemas/runs.ts';
import { formatCount } from './format-number.ts';

/**
 * How a run is called: by its number.
 *
 * Units: none. Valid: any run. Source: [own].
 */
export function runName({ number }: Pick<RunAnswer, 'number'>): string {
  return `Run ${number}`;
}

/**
 * How far a run is, in whole per cent; all of it only once it is complete.
 *
 * Units: buildings. Valid: nothing to do is nothing done. Source: [own].
 */
export function percentDone({ done, buildings }: Pick<RunAnswer, 'done' | 'buildings'>): number {
  return buildings === 0 ? 0 : Math.floor((done / buildings) * 100);
}

/**
 * A run that ended early, which one stands, and why it ended.
 *
 * Units: none. Valid: a run that has ended early. Source: [own].
 */
export function stoppedWords(run: RunAnswer, standing: RunAnswer | undefined): string {
  const stopped = `${runName(run)} stopped at ${percentDone(run)} %`;
  const because = run.fault === null ? '.' : `: ${run.fault}`;
  return `${stopped}${because}${standing === undefined ? '' : ` ${runName(standing)} still stands.`}`;
}

const CHANGED: readonly (readonly [keyof RunAnswer['since'], string])[] = [
  ['register', 'register'],
  ['option', 'option'],
  ['rules', 'rules'],
];

function listed(words: readonly string[]): string {
  const last = words.at(-1) ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} and ${last}`;
}

/**
 * What has changed since a run; null where nothing has.
 *
 * Units: none. Valid: any run. Source: [own].
 */
export function staleWords(
  run: Pick<RunAnswer, 'number'>,
  since: RunAnswer['since'],
): string | null {
  const changed = CHANGED.filter(([name]) => since[name]).map(([, word]) => word);
  if (changed.length === 0) return null;
  const subject = `The ${listed(changed)}`;
  // rules are many
  const have = changed.length > 1 || changed[0] === 'rules' ? 'have' : 'has';
  return `Worked out on run ${run.number}. ${subject} ${have} changed since.`;
}

/**
 * How many buildings a run found in which category at the central value.
 *
 * Units: buildings. Valid: a complete run. Source: [own].
 */
export function countsWords({ central, stages, faults }: RunCounts): string {
  const parts = CATEGORIES.map(
    ({ category, label }) => `${formatCount(central[category])} in category ${label}`,
  ).filter((_, k) => (central[k] ?? 0) > 0);
  const letGo = `${formatCount(stages[0])} let go at stage 1`;
  const notWorkedOut = faults === 0 ? [] : [`${formatCount(faults)} not worked out`];
  return [...parts, letGo, ...notWorkedOut].join(', ');
}

const [MINUTE, ROUND_TO] = [60, 5];

/**
 * How long something still takes, roughly.
 *
 * Units: s. Valid: 0 or more. Source: [own].
 */
export function timeLeftWords(seconds: number): string {
  if (seconds < ROUND_TO) return 'a few seconds left';
  if (seconds < MINUTE) return `about ${Math.round(seconds / ROUND_TO) * ROUND_TO} s left`;
  return `about ${Math.ceil(seconds / MINUTE)} min left`;
}
