import { at } from './at.ts';
import { bernsteinRows } from './bernstein-rows.ts';

/**
 * Writes two numbers, the lesser first, between which a polynomial surely stays for t from 0 to 1: its
 * least and largest Bernstein coefficient.
 *
 * Units: those of c. Valid: degree 0 to 5. Source: farouki-2012.
 */
export function writePolynomialHull(
  c: Float64Array,
  offset: number,
  degree: number,
  into: Float64Array,
  position: number,
): void {
  const rows = bernsteinRows(degree);
  let low = Infinity;
  let high = -Infinity;
  for (let j = 0; j <= degree; j++) {
    let b = 0;
    for (let i = 0; i <= j; i++) b += at(rows, j * (degree + 1) + i) * at(c, offset + i);
    if (b < low) low = b;
    if (b > high) high = b;
  }
  into[position] = low;
  into[position + 1] = high;
}
