import type { StrainRules } from '../building/zone-shape.ts';
import type { Category } from '../damage/categories.ts';
import type { GroundRules } from '../ground/ground-model.ts';

/**
 * What of a wall is ignored: settlement under a level, or what lies more than some trough widths from
 * every drive.
 *
 * Units: settlement m, widths i. Valid: settlement 0 means nothing is ignored. Source: [common] for
 * 1 mm; mair-taylor-burland-1996 for 2.5 widths.
 */
export type CutOffRule =
  | { readonly kind: 'settlement'; readonly settlement: number }
  | { readonly kind: 'widths'; readonly widths: number };

/**
 * Every rule by which a result was reached; kept with it.
 *
 * Units: see the parts. Valid: see the parts. Source: see the parts.
 */
export type AssessmentRules = GroundRules &
  StrainRules & {
    readonly cutOff: CutOffRule;
    /** The category that leads on to the next stage, for the breakpoint. */
    readonly leadingCategory: Category;
  };

/**
 * The rules a scheme starts with.
 *
 * Units: as AssessmentRules. Valid: read only. Source: [common] for the choice; each rule cites its own.
 */
export const DEFAULT_RULES: AssessmentRules = {
  depth: { kind: 'clay' },
  focus: 'axis',
  cutOff: { kind: 'settlement', settlement: 0.001 },
  horizontalStrain: 'average',
  compression: 'counted',
  leadingCategory: 3,
};
