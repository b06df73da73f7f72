import type { Mode } from './curvature-runs.ts';
import { deflectionPerStrain, type DeepBeam } from './deep-beam.ts';

/**
 * The deflection ratio at which a deep beam that is stretched by a horizontal strain reaches a tensile
 * strain, by bending or by diagonal shear, whichever comes first: the inverse of `beamStrains`.
 *
 * Units: m/m. Valid: strain > 0; 0 where the horizontal strain alone reaches it, in tension or, across
 * it, in compression. Source: burland-1995, solved for Δ/L [own].
 */
export function deflectionAtStrain(
  mode: Mode,
  beam: DeepBeam,
  horizontalStrain: number,
  strain: number,
): number {
  const per = deflectionPerStrain(mode, beam);
  const left = strain - horizontalStrain;
  const across = strain + beam.poisson * horizontalStrain;
  if (left <= 0 || across <= 0) return 0;
  return Math.min(per.bending * left, per.diagonal * Math.sqrt(left * across));
}
