import { DEFAULT_HOLDS } from '../../shared/assessment/holds.ts';
import { DEFAULT_RULES, type AssessmentRules } from '../../shared/assessment/rules.ts';
import { DEFAULT_SCREENING_LIMITS } from '../../shared/assessment/screening.ts';
import { DEFAULT_SENSITIVITY } from '../../shared/damage/sensitivity-score.ts';
import type { ReferenceKey } from '../../shared/references.ts';
import type { RuleSet } from '../../shared/schemas/rules.ts';

/** Where each default comes from. */
const SOURCES = {
  depth: 'mair-taylor-bracegirdle-1993',
  focus: 'oreilly-new-1982',
  cutOff: 'common-practice',
  horizontalStrain: 'burland-1995',
  compression: 'common-practice',
  leadingCategory: 'mair-taylor-burland-1996',
} as const satisfies Record<keyof AssessmentRules, ReferenceKey>;

/** The rules that a scheme starts with, holding from a day on. */
export function defaultRules(date: string): RuleSet {
  const { depth, focus, cutOff, horizontalStrain, compression, leadingCategory } = DEFAULT_RULES;
  return {
    screening: { value: { ...DEFAULT_SCREENING_LIMITS }, source: 'rankin-1988', date },
    holds: DEFAULT_HOLDS.map((hold) => ({ ...hold, date })),
    depth: { value: depth, source: SOURCES.depth, date },
    focus: { value: focus, source: SOURCES.focus, date },
    cutOff: { value: cutOff, source: SOURCES.cutOff, date },
    horizontalStrain: { value: horizontalStrain, source: SOURCES.horizontalStrain, date },
    compression: { value: compression, source: SOURCES.compression, date },
    leadingCategory: { value: leadingCategory, source: SOURCES.leadingCategory, date },
    sensitivity: { value: DEFAULT_SENSITIVITY, source: 'common-practice', date },
  };
}
