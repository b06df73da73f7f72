/**
 * 2 to a whole power, by squaring, exact in every engine.
 *
 * Units: none. Valid: whole exponent; 0 below −1074, Infinity above 1023. Source: [own].
 */
export function powerOfTwo(exponent: number): number {
  let result = 1;
  let base = exponent < 0 ? 0.5 : 2;
  for (let left = Math.abs(exponent); left > 0; left = Math.floor(left / 2)) {
    if (left % 2 === 1) result *= base;
    base *= base;
  }
  return result;
}
