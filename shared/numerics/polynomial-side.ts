import { at } from './at.ts';
import { bernsteinRows } from './bernstein-rows.ts';

/**
 * On which side of a level a polynomial stays for all t from 0 to 1: 1 above, −1 below, 0 not
 * known. A polynomial lies within the hull of its Bernstein coefficients, so the answer is certain
 * and costs no root finding.
 *
 * Units: those of c. Valid: degree 0 to 5. Source: farouki-2012.
 */
export function polynomialSide(
  c: Float64Array,
  offset: number,
  degree: number,
  level: number,
): -1 | 0 | 1 {
  const rows = bernsteinRows(degree);
  let above = true;
  let below = true;
  for (let j = 0; j <= degree; j++) {
    let b = -level;
    for (let i = 0; i <= j; i++) b += at(rows, j * (degree + 1) + i) * at(c, offset + i);
    if (b <= 0) above = false;
    if (b >= 0) below = false;
    if (!above && !below) return 0;
  }
  return above ? 1 : -1;
}
