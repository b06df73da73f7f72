import { decade } from '../numerics/decade.ts';

/** On paper, and as browsers count, a metre has so many pixels. */
const PIXELS_PER_METRE = 96 / 0.0254;
/** What scales of drawings begin with, before powers of ten. */
const SCALES = [1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6, 7.5, 10];

/**
 * What scales of drawings on paper begin with, before powers of ten: those that a ruler has.
 *
 * Units: none. Valid: ascending, from 1 to 10. Source: [common].
 */
export const RULER_SCALES = [1, 1.25, 2, 2.5, 5, 10];

/**
 * A scale of a drawing, 1 : `denominator`, and how many pixels a metre of the ground then has.
 *
 * Units: pixels per metre of the ground. Valid: made by `trueScale`. Source: [own].
 */
export type TrueScale = { readonly denominator: number; readonly pixelsPerMetre: number };

/**
 * The largest usual scale at which a metre takes no more pixels than there are.
 *
 * Units: pixels per metre of the ground. Valid: more than 0. Source: [own].
 */
export function trueScale(
  mostPixelsPerMetre: number,
  scales: readonly number[] = SCALES,
): TrueScale {
  const least = PIXELS_PER_METRE / mostPixelsPerMetre;
  const { power } = decade(least);
  const share = least / power - 1e-9;
  const denominator = (scales.find((scale) => scale >= share) ?? 10) * power;
  return { denominator, pixelsPerMetre: PIXELS_PER_METRE / denominator };
}

/**
 * The largest of 1, 2, 3 and 5 times a power of ten, and at least 1, that is not over a factor.
 *
 * Units: none. Valid: any number. Source: [own].
 */
export function exaggeration(most: number): number {
  if (!(most > 1) || !Number.isFinite(most)) return 1;
  const { power } = decade(most * (1 + 1e-9));
  return power * ([5, 3, 2].find((step) => step * power <= most * (1 + 1e-9)) ?? 1);
}
