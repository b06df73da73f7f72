import { conclusionOf, type ConcludingRules } from '../../shared/assessment/conclusion.ts';
import { holdFactsOf } from '../../shared/assessment/prepared-building.ts';
import { assessmentRules } from '../../shared/assessment/run-inputs.ts';
import { drivesOfDesign } from '../../shared/assessment/drives-of-design.ts';
import { groundModel } from '../../shared/ground/ground-model.ts';
import type { DecisionBasis } from '../../shared/schemas/decision-answers.ts';
import type { RuleSet } from '../../shared/schemas/rules.ts';
import type { Considered } from '../models/find-considered.ts';
import type { Run } from '../models/run.ts';

/** Concludes what a decision on a building would rest on; null for one that the run does not have. */
export type Conclude = (building: Considered) => DecisionBasis | null;

/** By the figures of a run, and the rules of now. */
export function concludeBy(
  { design, rules: ofRun }: Pick<Run, 'design' | 'rules'>,
  rules: RuleSet,
): Conclude {
  const model = groundModel(drivesOfDesign(design), assessmentRules(ofRun));
  const concluding: ConcludingRules = {
    limits: rules.screening.value,
    holds: rules.holds,
    leadingCategory: rules.leadingCategory.value,
  };
  return ({ facts, result }) => {
    if (result === null) return null;
    const known = { holds: holdFactsOf(facts, model, design.groundLevel), scores: facts };
    const conclusion = conclusionOf(result, known, concluding);
    const { settlement, slope, strain, breakpoint, reserve, assumed } = result;
    return {
      ...{ ...conclusion, heldBy: [...conclusion.heldBy] },
      ...{ settlement, slope, strain, breakpoint, reserve, assumed: [...assumed] },
    };
  };
}
