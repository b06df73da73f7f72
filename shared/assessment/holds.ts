import { sensitivityTotal } from '../damage/sensitivity-score.ts';
import type { ReferenceKey } from '../references.ts';

/**
 * A stage at which a building may be let go.
 *
 * Units: none. Valid: 1 screening, 2 strain; nobody is let go at 3 by calculation.
 * Source: mair-taylor-burland-1996.
 */
export type PassOutStage = 1 | 2;

/**
 * What is known of a building that may hold it. What is unknown holds nothing, but is counted.
 *
 * Units: foundingDepth m below ground; sensitivityTotal is the sensitivity score plus the category.
 * Valid: undefined means unknown. Source: [common].
 */
export type HoldFacts = {
  readonly foundingDepth?: number;
  readonly piled?: boolean;
  readonly insideZoneOfWorks?: boolean;
  readonly listed?: boolean;
  readonly poorCondition?: boolean;
  readonly sensitivityTotal?: number;
};

/**
 * When a hold acts: a fact is true, or reaches a limit.
 *
 * Units: those of the fact. Valid: closed list of facts. Source: [common].
 */
export type HoldCondition =
  | { readonly kind: 'founded deeper than'; readonly depth: number }
  | { readonly kind: 'piled' | 'inside zone of works' | 'listed' | 'poor condition' }
  | { readonly kind: 'sensitivity total from'; readonly total: number };

/**
 * A rule that keeps a building from being let go at some stages, whatever its figures. Data of a
 * scheme, with its source.
 *
 * Units: as the condition. Valid: at least one stage. Source: [common].
 */
export type Hold = {
  readonly name: string;
  readonly condition: HoldCondition;
  readonly stages: readonly PassOutStage[];
  readonly source: ReferenceKey;
};

/**
 * The holds a scheme starts with.
 *
 * Units: m and scores. Valid: read only. Source: [common].
 */
export const DEFAULT_HOLDS: readonly Hold[] = [
  {
    name: 'founded deeper than 4 m',
    condition: { kind: 'founded deeper than', depth: 4 },
    stages: [1, 2],
    source: 'common-practice',
  },
  { name: 'piled', condition: { kind: 'piled' }, stages: [1, 2], source: 'common-practice' },
  {
    name: 'inside the zone of a shaft or box',
    condition: { kind: 'inside zone of works' },
    stages: [1, 2],
    source: 'common-practice',
  },
  { name: 'listed', condition: { kind: 'listed' }, stages: [2], source: 'common-practice' },
  {
    name: 'poor condition',
    condition: { kind: 'poor condition' },
    stages: [2],
    source: 'common-practice',
  },
  {
    name: 'sensitivity brings the total to 3 or more',
    condition: { kind: 'sensitivity total from', total: 3 },
    stages: [2],
    source: 'common-practice',
  },
];

function acts(condition: HoldCondition, facts: HoldFacts): boolean {
  switch (condition.kind) {
    case 'founded deeper than':
      return facts.foundingDepth !== undefined && facts.foundingDepth > condition.depth;
    case 'piled':
      return facts.piled === true;
    case 'inside zone of works':
      return facts.insideZoneOfWorks === true;
    case 'listed':
      return facts.listed === true;
    case 'poor condition':
      return facts.poorCondition === true;
    case 'sensitivity total from':
      return facts.sensitivityTotal !== undefined && facts.sensitivityTotal >= condition.total;
  }
}

/**
 * The holds that act on a building at a stage.
 *
 * Units: as the conditions. Valid: any facts. Source: [common].
 */
export function holdsAt(
  stage: PassOutStage,
  facts: HoldFacts,
  holds: readonly Hold[],
): readonly Hold[] {
  return holds.filter(({ stages, condition }) => stages.includes(stage) && acts(condition, facts));
}

/**
 * The same facts with the total that a category makes of a building's scores.
 *
 * Units: as HoldFacts. Valid: a category that is not known counts as 0. Source: [common].
 */
export function withSensitivity(
  facts: HoldFacts,
  scores: Parameters<typeof sensitivityTotal>[0],
  category: number,
): HoldFacts {
  const total = sensitivityTotal(scores, category);
  return total === undefined ? facts : { ...facts, sensitivityTotal: total };
}
