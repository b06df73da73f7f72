import type { PlanPoint } from '../geometry/point.ts';
import { groundModel, type GroundRules } from '../ground/ground-model.ts';
import { groundSurface, type GroundSurface } from '../ground/ground-surface.ts';
import { FIELD } from '../ground/kernel.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import { troughWidthMatters } from '../ground/trough-width-matters.ts';
import { at } from '../numerics/at.ts';
import { CENTRAL, FIVE_POSITIONS, type Range } from '../numerics/range.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import { drivesOfDesign } from './drives-of-design.ts';

/**
 * Settlement of the surface over the bracket of a designed line, at any point: the least, the central and
 * the most over volume losses and K; and the narrowest trough width there.
 *
 * Units: m. Valid: made by `settlementBracket`; null where the method refuses, a width of Infinity where
 * nothing reaches or the method refuses. Source: attewell-woodman-1982.
 */
export type SettlementBracket = {
  readonly at: (point: PlanPoint) => Range | null;
  readonly narrowestAt: (point: PlanPoint) => number;
};

function settlementOf(surface: GroundSurface, point: PlanPoint): number | undefined {
  const field = surface.at(point);
  return field === undefined ? undefined : at(field, FIELD.settlement);
}

/**
 * Prepares the bracket of a designed line. Settlement grows with volume loss, so that the least and the
 * most are among its ends, at one of the five positions of K.
 *
 * Units: m. Valid: throws as `drivesOfDesign`. Source: as SettlementBracket; the bracket is [own].
 */
export function settlementBracket(design: AlignmentDesign, rules: GroundRules): SettlementBracket {
  const model = groundModel(drivesOfDesign(design), rules);
  const positions = troughWidthMatters(model) ? FIVE_POSITIONS : [CENTRAL];
  const surfaceOf = (position: (typeof positions)[number], end: keyof Range) =>
    groundSurface(model, design.groundLevel, { position, faces: [] }, lossFactorsAt(model, end));
  const central = surfaceOf(CENTRAL, 'central');
  const ends = positions.flatMap((position) => [
    surfaceOf(position, 'low'),
    surfaceOf(position, 'high'),
  ]);
  return {
    at: (point) => {
      const middle = settlementOf(central, point);
      const all = ends.map((surface) => settlementOf(surface, point));
      const known = all.filter((settlement) => settlement !== undefined);
      if (middle === undefined || known.length < all.length) return null;
      return { low: Math.min(middle, ...known), central: middle, high: Math.max(middle, ...known) };
    },
    narrowestAt: (point) => Math.min(...ends.map((surface) => surface.widthAt(point) ?? Infinity)),
  };
}
