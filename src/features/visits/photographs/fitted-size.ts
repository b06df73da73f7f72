export type Size = { readonly width: number; readonly height: number };

/** A size made no longer than so many pixels at its longer side, its shape kept; a small one stays. */
export function fittedSize({ width, height }: Size, longest: number): Size {
  const factor = Math.min(1, longest / Math.max(width, height));
  return {
    width: Math.max(1, Math.round(width * factor)),
    height: Math.max(1, Math.round(height * factor)),
  };
}
