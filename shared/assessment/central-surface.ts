import { groundModel, type GroundRules } from '../ground/ground-model.ts';
import { groundSurface, type GroundSurface } from '../ground/ground-surface.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import { CENTRAL } from '../numerics/range.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import { drivesOfDesign } from './drives-of-design.ts';

/**
 * The movement of the ground beside a designed line at the central values, drives complete: what contours
 * are drawn from.
 *
 * Units: as GroundSurface. Valid: throws as `drivesOfDesign` and `groundModel`. Source: [own].
 */
export function centralSurface(design: AlignmentDesign, rules: GroundRules): GroundSurface {
  const model = groundModel(drivesOfDesign(design), rules);
  const state = { position: CENTRAL, faces: [] };
  return groundSurface(model, design.groundLevel, state, lossFactorsAt(model, 'central'));
}
