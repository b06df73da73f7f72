/**
 * Writes the four coefficients, in t from 0 to 1, of the polynomial that has given values and
 * slopes at both ends of an interval.
 *
 * Units: f and f per x in; f out. Valid: width > 0; the error is under
 * width⁴ · max|f⁗| / 384. Source: [own], Hermite interpolation.
 */
export function cubicHermite(
  into: Float64Array,
  offset: number,
  width: number,
  start: { value: number; slope: number },
  end: { value: number; slope: number },
): void {
  const rise = end.value - start.value;
  const [d0, d1] = [start.slope * width, end.slope * width];
  into[offset] = start.value;
  into[offset + 1] = d0;
  into[offset + 2] = 3 * rise - 2 * d0 - d1;
  into[offset + 3] = d0 + d1 - 2 * rise;
}
