import { drivesOfDesign } from '../../../../shared/assessment/drives-of-design.ts';
import { groundModel, type GroundRules } from '../../../../shared/ground/ground-model.ts';
import { groundSurface, type GroundSurface } from '../../../../shared/ground/ground-surface.ts';
import { lossFactorsAt } from '../../../../shared/ground/loss-factors-at.ts';
import {
  settlementContours,
  type SettlementContour,
} from '../../../../shared/ground/settlement-contours.ts';
import { MethodError } from '../../../../shared/method-error.ts';
import { CENTRAL } from '../../../../shared/numerics/range.ts';
import type { AlignmentDesign } from '../../../../shared/schemas/alignments.ts';

/** A design and the rules that its settlement follows. */
export type Case = { readonly design: AlignmentDesign; readonly rules: GroundRules };

/** Contours of a case, or in words why the method refuses. */
export type Worked =
  | { readonly kind: 'contours'; readonly contours: readonly SettlementContour[] }
  | { readonly kind: 'fault'; readonly message: string };

/** In metres. */
const LEVELS = [0.001, 0.002, 0.005, 0.01, 0.02, 0.03, 0.05];

/** Settlement at the surface at the central values. */
export function centralSurface({ design, rules }: Case): GroundSurface {
  const model = groundModel(drivesOfDesign(design), rules);
  const state = { position: CENTRAL, faces: [] };
  return groundSurface(model, design.groundLevel, state, lossFactorsAt(model, 'central'));
}

/** The contours that the plan shows. */
export function previewWork(asked: Case): Worked {
  try {
    return { kind: 'contours', contours: settlementContours(centralSurface(asked), LEVELS) };
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    return { kind: 'fault', message: error.message };
  }
}
