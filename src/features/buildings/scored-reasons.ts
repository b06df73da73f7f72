import type { SensitivityKind } from '../../../shared/damage/sensitivity-score.ts';
import type { BuildingField } from '../../../shared/schemas/building-fields.ts';
import type { RuleSet } from '../../../shared/schemas/rules.ts';

type Reasons = RuleSet['sensitivity']['value'];

/** The score that each reason is for. */
const SCORED: Readonly<
  Partial<Record<BuildingField, { readonly kind: SensitivityKind; readonly score: BuildingField }>>
> = {
  structureReason: { kind: 'structure', score: 'structureScore' },
  featuresReason: { kind: 'features', score: 'featuresScore' },
};

/** The scheme's reasons that a field can hold; undefined for a field that holds none. */
export function reasonsFor(
  field: BuildingField,
  reasons: Reasons | undefined,
): readonly string[] | undefined {
  const scored = SCORED[field];
  if (scored === undefined) return undefined;
  return reasons?.[scored.kind].map(({ reason }) => reason);
}

/** The score that goes with what was written as its reason; undefined for words of one's own. */
export function scoreOfReason(
  field: BuildingField,
  written: string,
  reasons: Reasons | undefined,
): { readonly field: BuildingField; readonly score: string } | undefined {
  const scored = SCORED[field];
  if (scored === undefined) return undefined;
  const found = reasons?.[scored.kind].find(({ reason }) => reason === written.trim());
  return found && { field: scored.score, score: String(found.score) };
}
