import { at } from './at.ts';
import { bernsteinRows } from './bernstein-rows.ts';

/**
 * Whether a polynomial surely only rises or only falls for t from 0 to 1: so it does where its
 * Bernstein coefficients do. False may mean either.
 *
 * Units: none. Valid: degree 0 to 5. Source: farouki-2012.
 */
export function polynomialIsMonotone(c: Float64Array, offset: number, degree: number): boolean {
  const rows = bernsteinRows(degree);
  let rising = true;
  let falling = true;
  let before = at(c, offset);
  for (let j = 1; j <= degree; j++) {
    let b = 0;
    for (let i = 0; i <= j; i++) b += at(rows, j * (degree + 1) + i) * at(c, offset + i);
    if (b < before) rising = false;
    if (b > before) falling = false;
    if (!rising && !falling) return false;
    before = b;
  }
  return true;
}
