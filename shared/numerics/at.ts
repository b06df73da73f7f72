/**
 * The element of an array whose index is known to be inside it. The one place where the compiler
 * is told so: a fallback value would cost time in the innermost loops and hide a wrong index.
 *
 * Units: those of the array. Valid: 0 ≤ index < length. Source: [own].
 */
export function at(values: Float64Array, index: number): number {
  return values[index] as number;
}
