/**
 * The power of ten at or under a number, as `power` and as its `exponent`.
 *
 * Units: those of the number. Valid: value > 0 and finite. Source: [own].
 */
export function decade(value: number): { readonly power: number; readonly exponent: number } {
  // the text of a number is cut the same way by every engine, which its logarithm is not
  const exponent = Number(value.toExponential().split('e')[1] ?? '0');
  return { power: Number(`1e${exponent}`), exponent };
}
