/**
 * How much a building suffers from movement for other reasons than its strain: by its structure and by the
 * features in it.
 *
 * Units: none. Valid: closed list. Source: [common].
 */
export type SensitivityKind = 'structure' | 'features';

/**
 * A score with the reason that it stands for.
 *
 * Units: none. Valid: score 0, 1 or 2. Source: [common].
 */
export type SensitivityReason = { readonly score: 0 | 1 | 2; readonly reason: string };

/**
 * The reasons that a scheme starts with; data of a scheme, which may have others.
 *
 * Units: scores. Valid: read only. Source: [common].
 */
export const DEFAULT_SENSITIVITY: Readonly<Record<SensitivityKind, readonly SensitivityReason[]>> =
  {
    structure: [
      { score: 0, reason: 'Ordinary building in fair order' },
      { score: 1, reason: 'Irregular plan, large openings or parts founded at different depths' },
      { score: 1, reason: 'Moved or repaired before' },
      { score: 2, reason: 'Slender or delicate: spire, tower, vault, long arcade' },
      { score: 2, reason: 'Distorted or cracked already' },
    ],
    features: [
      { score: 0, reason: 'Nothing that could not be put right in redecoration' },
      { score: 1, reason: 'Decorated plaster, tiling, panelling or brittle cladding' },
      { score: 1, reason: 'Equipment that has to stay level' },
      { score: 2, reason: 'Irreplaceable finishes: stained glass, wall painting, mosaic' },
    ],
  };

/**
 * The sensitivity total of a building: both scores and its damage category together; a score that nobody
 * gave counts nothing.
 *
 * Units: none. Valid: undefined where neither score is given: what is unknown holds nothing.
 * Source: [common].
 */
export function sensitivityTotal(
  scores: { readonly structureScore: number | null; readonly featuresScore: number | null },
  category: number,
): number | undefined {
  const { structureScore, featuresScore } = scores;
  if (structureScore === null && featuresScore === null) return undefined;
  return (structureScore ?? 0) + (featuresScore ?? 0) + category;
}
