import { at } from './at.ts';
import { bernsteinRows } from './bernstein-rows.ts';

/**
 * A number that the size of a polynomial does not pass for t from 0 to 1: its largest Bernstein
 * coefficient.
 *
 * Units: those of c. Valid: degree 0 to 5. Source: farouki-2012.
 */
export function polynomialBound(c: Float64Array, offset: number, degree: number): number {
  const rows = bernsteinRows(degree);
  let bound = 0;
  for (let j = 0; j <= degree; j++) {
    let b = 0;
    for (let i = 0; i <= j; i++) b += at(rows, j * (degree + 1) + i) * at(c, offset + i);
    bound = Math.max(bound, Math.abs(b));
  }
  return bound;
}
