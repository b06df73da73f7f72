import { sine } from './sine.ts';

const HALF_PI = Math.PI / 2;

/**
 * The Chebyshev points of the second kind between −1 and 1, growing: a polynomial through a smooth
 * function's values there, ends included, hardly strays from it between them.
 *
 * Units: none. Valid: at least 2; the ends and the middle come out exactly. Source: trefethen-2013.
 */
export function lobattoPoints(count: number): number[] {
  return Array.from({ length: count }, (_, k) => {
    const turn = (2 * k) / (count - 1) - 1;
    return turn === 0 || Math.abs(turn) === 1 ? turn : sine(HALF_PI * turn);
  });
}
