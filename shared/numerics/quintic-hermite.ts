/**
 * Writes the six coefficients, in t from 0 to 1, of the polynomial that has given values, slopes
 * and curvatures at both ends of an interval.
 *
 * Units: f, f per x, f per x² in; f out. Valid: width > 0; the error is under
 * width⁶ · max|f⁽⁶⁾| / 46080. Source: [own], Hermite interpolation.
 */
export function quinticHermite(
  into: Float64Array,
  offset: number,
  width: number,
  start: { value: number; slope: number; curvature: number },
  end: { value: number; slope: number; curvature: number },
): void {
  const rise = end.value - start.value;
  const [d0, d1] = [start.slope * width, end.slope * width];
  const [c0, c1] = [start.curvature * width * width, end.curvature * width * width];
  into[offset] = start.value;
  into[offset + 1] = d0;
  into[offset + 2] = c0 / 2;
  into[offset + 3] = 10 * rise - 6 * d0 - 4 * d1 - 1.5 * c0 + 0.5 * c1;
  into[offset + 4] = -15 * rise + 8 * d0 + 7 * d1 + 1.5 * c0 - c1;
  into[offset + 5] = 6 * rise - 3 * (d0 + d1) - 0.5 * (c0 - c1);
}
