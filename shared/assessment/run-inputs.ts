import { groundModel } from '../ground/ground-model.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import type { RuleSet } from '../schemas/rules.ts';
import { drivesOfDesign } from './drives-of-design.ts';
import type { RunInputs } from './outcome-of-building.ts';
import type { AssessmentRules } from './rules.ts';

/**
 * The rules of a scheme as the method takes them, without their sources and dates.
 *
 * Units: as AssessmentRules. Valid: a checked rule set. Source: [own].
 */
export function assessmentRules(rules: RuleSet): AssessmentRules {
  return {
    depth: rules.depth.value,
    focus: rules.focus.value,
    cutOff: rules.cutOff.value,
    horizontalStrain: rules.horizontalStrain.value,
    compression: rules.compression.value,
    leadingCategory: rules.leadingCategory.value,
  };
}

/**
 * What all buildings of a run share, from a designed line and the rules of its scheme.
 *
 * Units: as RunInputs. Valid: throws as `drivesOfDesign` and `groundModel`. Source: [own].
 */
export function runInputs(design: AlignmentDesign, rules: RuleSet): RunInputs {
  const ofMethod = assessmentRules(rules);
  return {
    model: groundModel(drivesOfDesign(design), ofMethod),
    rules: ofMethod,
    limits: rules.screening.value,
    holds: rules.holds,
    line: design.line,
  };
}
