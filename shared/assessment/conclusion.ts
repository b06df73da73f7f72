import type { Category } from '../damage/categories.ts';
import { sensitivityTotal } from '../damage/sensitivity-score.ts';
import type { RunResult } from '../schemas/runs.ts';
import { holdsAt, withSensitivity, type Hold, type HoldFacts } from './holds.ts';
import type { SensitivityScores } from './prepared-building.ts';
import type { ScreeningLimits } from './screening.ts';

/**
 * What a decision on a building rests on: where the figures and the rules leave it, the category over the
 * bracket, what holds it, and the total of its sensitivity.
 *
 * Units: none. Valid: stage is null where only a newer run can tell it; categories are null where
 * screening let the building go; `isWorkedOut` is false where the run found a fault. Source: [own].
 */
export type Conclusion = {
  readonly stage: 1 | 2 | 3 | null;
  readonly categoryLow: Category | null;
  readonly category: Category | null;
  readonly categoryHigh: Category | null;
  readonly isSettled: boolean | null;
  readonly heldBy: readonly string[];
  readonly sensitivityTotal: number | null;
  readonly isWorkedOut: boolean;
};

/**
 * The rules that act on figures that are worked out already.
 *
 * Units: as the parts. Valid: data of a scheme. Source: mair-taylor-burland-1996, [common].
 */
export type ConcludingRules = {
  readonly limits: ScreeningLimits;
  readonly holds: readonly Hold[];
  readonly leadingCategory: Category;
};

type Figures = Pick<
  RunResult,
  'settlement' | 'slope' | 'categoryLow' | 'category' | 'categoryHigh' | 'isSettled' | 'fault'
>;

function namesOf(holds: readonly Hold[]): string[] {
  return holds.map(({ name }) => name);
}

/**
 * Where the figures of a run leave a building by what is known of it now and by the rules of now. With
 * the facts and rules of the run it is what the run found.
 *
 * Units: as RunResult. Valid: rules that change the figures themselves need a new run; where screening
 * let the building go and no longer would, its strain is not known and stage is null.
 * Source: mair-taylor-burland-1996; holds are [common].
 */
export function conclusionOf(
  figures: Figures,
  known: { readonly holds: HoldFacts; readonly scores: SensitivityScores },
  { limits, holds, leadingCategory }: ConcludingRules,
): Conclusion {
  const { settlement, slope, categoryLow, category, categoryHigh, isSettled, fault } = figures;
  const total = sensitivityTotal(known.scores, category ?? 0) ?? null;
  const strain = { categoryLow, category, categoryHigh, isSettled };
  const common = { ...strain, sensitivityTotal: total, isWorkedOut: fault === null };
  if (fault !== null) return { ...common, stage: 3, heldBy: [] };
  const heldAtOne = namesOf(holdsAt(1, known.holds, holds));
  const isScreened = settlement < limits.settlement && slope < limits.slope;
  if (isScreened && heldAtOne.length === 0) return { ...common, stage: 1, heldBy: [] };
  if (category === null) return { ...common, stage: null, heldBy: heldAtOne };
  const facts = withSensitivity(known.holds, known.scores, category);
  const heldBy = namesOf(holdsAt(2, facts, holds));
  const passes = category < leadingCategory && heldBy.length === 0;
  return { ...common, stage: passes ? 2 : 3, heldBy };
}

/**
 * One thing on which a decision rests that has changed.
 *
 * Units: none. Valid: `was` and `is` in words of the record, null for none. Source: [own].
 */
export type BasisChange = {
  readonly what: 'stage' | 'category' | 'settled' | 'held' | 'sensitivity' | 'fault' | 'run';
  readonly was: string | null;
  readonly is: string | null;
};

function bracketWords({ categoryLow, category, categoryHigh }: Conclusion): string | null {
  return category === null
    ? null
    : `${categoryLow ?? category}, ${category}, ${categoryHigh ?? category}`;
}

function stageWords({ stage }: Conclusion): string | null {
  return stage === null ? null : String(stage);
}

function listed(names: readonly string[]): string | null {
  return names.length === 0 ? null : [...names].sort().join(', ');
}

/**
 * What of the basis of a decision is no longer so. Figures may move as long as stage, categories, holds,
 * sensitivity and whether the category is settled stay.
 *
 * Units: none. Valid: null for a building that the newer run does not have. Source: [own].
 */
export function basisChanges(was: Conclusion, is: Conclusion | null): BasisChange[] {
  if (is === null) return [{ what: 'run', was: 'in the run', is: null }];
  const settled = ({ isSettled }: Conclusion) =>
    isSettled === null ? null : isSettled ? 'settled' : 'sensitive';
  const total = ({ sensitivityTotal }: Conclusion) =>
    sensitivityTotal === null ? null : String(sensitivityTotal);
  const worked = ({ isWorkedOut }: Conclusion) => (isWorkedOut ? 'worked out' : 'not worked out');
  const all: readonly BasisChange[] = [
    { what: 'fault', was: worked(was), is: worked(is) },
    { what: 'stage', was: stageWords(was), is: stageWords(is) },
    { what: 'category', was: bracketWords(was), is: bracketWords(is) },
    { what: 'settled', was: settled(was), is: settled(is) },
    { what: 'held', was: listed(was.heldBy), is: listed(is.heldBy) },
    { what: 'sensitivity', was: total(was), is: total(is) },
  ];
  return all.filter((change) => change.was !== change.is);
}
