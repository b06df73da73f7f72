/** On paper, and as browsers count, a metre has so many pixels. */
const PIXELS_PER_METRE = 96 / 0.0254;
/** What scales of drawings begin with, before powers of ten. */
const SCALES = [1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6, 7.5, 10];

/** A scale of a drawing, 1 : `denominator`, and how many pixels a metre of the ground then has. */
export type TrueScale = { readonly denominator: number; readonly pixelsPerMetre: number };

/** The largest usual scale at which a metre takes no more pixels than there are. */
export function trueScale(mostPixelsPerMetre: number): TrueScale {
  const least = PIXELS_PER_METRE / mostPixelsPerMetre;
  const power = 10 ** Math.floor(Math.log10(least));
  const share = least / power - 1e-9;
  const denominator = (SCALES.find((scale) => scale >= share) ?? 10) * power;
  return { denominator, pixelsPerMetre: PIXELS_PER_METRE / denominator };
}

/** The largest of 1, 2, 3 and 5 times a power of ten, and at least 1, that is not over a factor. */
export function exaggeration(most: number): number {
  if (!(most > 1) || !Number.isFinite(most)) return 1;
  const power = 10 ** Math.floor(Math.log10(most) + 1e-9);
  return power * ([5, 3, 2].find((step) => step * power <= most * (1 + 1e-9)) ?? 1);
}
