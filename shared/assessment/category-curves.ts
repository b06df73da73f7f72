import type { Mode } from '../building/curvature-runs.ts';
import type { DeepBeam } from '../building/deep-beam.ts';
import { deflectionAtStrain } from '../building/deflection-at-strain.ts';
import { CATEGORIES, type Category } from '../damage/categories.ts';

/**
 * A place on a category curve: a deflection ratio and a horizontal strain that together reach the
 * category.
 *
 * Units: m/m. Valid: deflectionRatio ≥ 0. Source: as `categoryCurves`.
 */
type CurvePoint = { readonly horizontalStrain: number; readonly deflectionRatio: number };

/**
 * Where a category begins on the chart of deflection ratio against horizontal strain.
 *
 * Units: m/m. Valid: points in order of horizontal strain. Source: as `categoryCurves`.
 */
export type CategoryCurve = {
  readonly category: Category;
  readonly limitingStrain: number;
  readonly points: readonly CurvePoint[];
};

const INTERVALS = 64;

/** Compression reaches a limit of its own across the wall at the limiting strain over Poisson's ratio. */
function reach(limit: number, poisson: number): readonly [number, number] {
  return [poisson > 0 ? -limit / poisson : -Infinity, limit];
}

/**
 * The curves of categories 1 to 4 for a zone of given length, height and stiffness between two
 * horizontal strains: on each, the tensile strain of the deep beam is the category's limiting strain.
 *
 * Units: m/m. Valid: from < to; a curve that lies wholly outside has no points. Source: burland-1995,
 * boscardin-cording-1989.
 */
export function categoryCurves(
  mode: Mode,
  beam: DeepBeam,
  from: number,
  to: number,
): CategoryCurve[] {
  return CATEGORIES.filter(({ category }) => category > 0).map(({ category, limitingStrain }) => {
    const [least, most] = reach(limitingStrain, beam.poisson);
    const [first, last] = [Math.max(from, least), Math.min(to, most)];
    const count = first < last ? INTERVALS + 1 : 0;
    const points = Array.from({ length: count }, (_, k) => {
      const horizontalStrain = k === INTERVALS ? last : first + (k * (last - first)) / INTERVALS;
      const deflectionRatio = deflectionAtStrain(mode, beam, horizontalStrain, limitingStrain);
      return { horizontalStrain, deflectionRatio };
    });
    return { category, limitingStrain, points };
  });
}
