import { derivativeOfPolynomial } from './derivative-of-polynomial.ts';
import { evaluatePolynomial } from './evaluate-polynomial.ts';
import { monotoneRoot } from './monotone-root.ts';

/**
 * All roots at which a polynomial changes sign in an interval, in order: between two neighbouring
 * roots of the derivative a polynomial is monotone, so each holds one root at most and none is
 * missed.
 *
 * Units: t. Valid: degree 0 to 5, from < to; a root at an end of the interval is found if the
 * polynomial is exactly zero there. Source: [own], by Rolle's theorem.
 */
export function polynomialRoots(
  c: Float64Array,
  degree: number,
  from: number,
  to: number,
): number[] {
  if (degree === 0) return [];
  const slope = derivativeOfPolynomial(c, 0, degree);
  const bounds = [from, ...polynomialRoots(slope, degree - 1, from, to), to];
  const roots: number[] = [];
  let a = from;
  let fa = evaluatePolynomial(c, 0, degree, a);
  if (fa === 0) roots.push(a);
  for (const b of bounds.slice(1)) {
    const fb = evaluatePolynomial(c, 0, degree, b);
    if (fb === 0) {
      if (b !== roots.at(-1)) roots.push(b);
    } else if (fa !== 0 && fa > 0 !== fb > 0) {
      roots.push(monotoneRoot(c, 0, degree, 0, a, b));
    }
    a = b;
    fa = fb;
  }
  return roots;
}
