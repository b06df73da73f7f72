import { MethodError } from '../method-error.ts';

const HIGHEST_DEGREE = 5;
const ROWS = Array.from({ length: HIGHEST_DEGREE + 1 }, (_, degree) => rowsOfDegree(degree));

function rowsOfDegree(degree: number): Float64Array {
  const rows = new Float64Array((degree + 1) * (degree + 1));
  for (let j = 0; j <= degree; j++) {
    let weight = 1;
    for (let i = 0; i <= j; i++) {
      rows[j * (degree + 1) + i] = weight;
      weight *= (j - i) / (degree - i);
    }
  }
  return rows;
}

/**
 * The matrix that turns power coefficients into Bernstein ones, row by row: C(j,i)/C(n,i).
 *
 * Units: none. Valid: degree 0 to 5, else throws `outside-range`. Source: farouki-2012.
 */
export function bernsteinRows(degree: number): Float64Array {
  const rows = ROWS[degree];
  if (rows === undefined) {
    throw new MethodError('outside-range', `No Bernstein rows for degree ${degree}.`);
  }
  return rows;
}
