import type { GroundModel } from '../ground/ground-model.ts';
import { METHOD_VERSION } from '../method-version.ts';
import type { AssessmentRules } from './rules.ts';

/**
 * What a result rests on, kept with it: method version, every rule, and per drive the share of
 * settlement above the face and the factor of a later drive.
 *
 * Units: none. Valid: made by `basisOf`. Source: [own].
 */
export type Basis = {
  readonly methodVersion: string;
  readonly rules: AssessmentRules;
  readonly drives: readonly {
    readonly name: string;
    readonly faceShare: number;
    readonly laterFactor: number;
  }[];
};

/**
 * The basis of results computed with a model and rules.
 *
 * Units: none. Valid: the rules of the ground are the model's. Source: [own].
 */
export function basisOf(model: GroundModel, rules: AssessmentRules): Basis {
  return {
    methodVersion: METHOD_VERSION,
    rules: { ...rules, ...model.rules },
    drives: model.drives.map(({ name, faceShare, laterFactor }) => ({
      name,
      faceShare,
      laterFactor,
    })),
  };
}
