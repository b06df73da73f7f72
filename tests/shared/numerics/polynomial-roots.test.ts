import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluatePolynomial } from '../../../shared/numerics/evaluate-polynomial.ts';
import { polynomialRoots } from '../../../shared/numerics/polynomial-roots.ts';
import { coefficients, fromRoots } from '../../support/polynomial.ts';
import { holds, numbers } from '../../support/property.ts';

function expectRoots(got: readonly number[], wanted: readonly number[], tolerance: number): void {
  expect(got).toHaveLength(wanted.length);
  for (const [k, root] of wanted.entries()) {
    expect(Math.abs((got[k] ?? NaN) - root)).toBeLessThan(tolerance);
  }
}

describe('polynomialRoots', () => {
  it('of a constant are none', () => {
    expect(polynomialRoots(Float64Array.of(0), 0, 0, 1)).toEqual([]);
    expect(polynomialRoots(Float64Array.of(3), 0, 0, 1)).toEqual([]);
  });

  it('of a straight line is where it passes zero', () => {
    expect(polynomialRoots(Float64Array.of(-1, 4), 1, 0, 1)).toEqual([0.25]);
    expect(polynomialRoots(Float64Array.of(-1, 4), 1, 0.5, 1)).toEqual([]);
  });

  it('finds five known roots', () => {
    const roots = [0.1, 0.25, 0.5, 0.75, 0.9];
    // coefficients up to 3.5 round to 4e-16, over slopes of 0.02 at least
    expectRoots(polynomialRoots(fromRoots(1, roots), 5, 0, 1), roots, 1e-12);
  });

  it('leaves out roots outside the interval', () => {
    const c = fromRoots(-2, [-3, 0.4, 0.6, 7]);
    expectRoots(polynomialRoots(c, 4, 0, 1), [0.4, 0.6], 1e-12);
  });

  it('finds a root at either end where the polynomial is exactly zero', () => {
    expect(polynomialRoots(fromRoots(1, [0, 1]), 2, 0, 1)).toEqual([0, 1]);
  });

  it('has no root where a polynomial keeps off zero', () => {
    expect(polynomialRoots(Float64Array.of(1, -1, 1), 2, 0, 1)).toEqual([]);
  });

  it('passes a double root once at most, as no sign changes there', () => {
    const c = fromRoots(1, [0.3, 0.3, 0.8]);
    const roots = polynomialRoots(c, 3, 0, 1);
    expect(roots.at(-1)).toBeCloseTo(0.8, 12);
    for (const root of roots.slice(0, -1)) {
      // the value is under one rounding within 1e-8 of a double root
      expect(Math.abs(root - 0.3)).toBeLessThan(1e-7);
    }
  });

  it('names a double root that is exactly zero once', () => {
    expect(polynomialRoots(Float64Array.of(0.25, -1, 1), 2, 0, 1)).toEqual([0.5]);
  });

  it('finds a triple root, where the sign does change', () => {
    const roots = polynomialRoots(fromRoots(1, [0.5, 0.5, 0.5]), 3, 0, 1);
    expectRoots(roots, [0.5], 1e-5);
  });

  it('takes a degree that its coefficients do not fill', () => {
    expect(polynomialRoots(Float64Array.of(-1, 2, 0, 0, 0, 0), 5, 0, 1)).toEqual([0.5]);
  });

  it('works on other intervals', () => {
    expectRoots(polynomialRoots(fromRoots(1, [-40, 3, 70]), 3, -100, 100), [-40, 3, 70], 1e-11);
  });

  it('misses none and invents none of up to five roots at least 0.02 apart', () => {
    const gaps = fc.array(numbers(0.02, 0.4), { minLength: 1, maxLength: 5 });
    holds(fc.tuple(gaps, numbers(-0.2, 0.5), numbers(0.1, 100)), ([steps, first, scale]) => {
      let root = first;
      const roots = steps.map((step) => (root += step));
      fc.pre(roots.every((r) => Math.abs(r) > 1e-6 && Math.abs(r - 1) > 1e-6));
      const inside = roots.filter((r) => r > 0 && r < 1);
      const got = polynomialRoots(fromRoots(scale, roots), roots.length, 0, 1);
      // coefficients up to 60 round to 1e-14; slopes at a root are at least 0.02 · 0.04 · 0.02 · 0.04
      expectRoots(got, inside, 1e-7);
    });
  });

  it('are in order, and the polynomial has one sign between them', () => {
    holds(coefficients(5), (terms) => {
      const c = Float64Array.from(terms);
      const roots = polynomialRoots(c, 5, 0, 1);
      expect([...roots].sort((a, b) => a - b)).toEqual(roots);
      const bounds = [0, ...roots, 1];
      for (const [k, from] of bounds.slice(0, -1).entries()) {
        const to = bounds[k + 1] ?? 1;
        const values = [0.1, 0.3, 0.5, 0.7, 0.9].map((share) =>
          evaluatePolynomial(c, 0, 5, from + share * (to - from)),
        );
        // within 1e-12 of zero the sign is rounding
        const signs = values.filter((value) => Math.abs(value) > 1e-12).map(Math.sign);
        expect(new Set(signs).size).toBeLessThanOrEqual(1);
      }
    });
  });

  it('are the mirror images of those of the mirrored polynomial', () => {
    holds(numbers(0.05, 0.45), (root) => {
      const [one, other] = [fromRoots(1, [root, 0.7]), fromRoots(1, [1 - root, 0.3])];
      const [a = NaN] = polynomialRoots(one, 2, 0, 1);
      const b = polynomialRoots(other, 2, 0, 1).at(-1) ?? NaN;
      expect(a).toBeCloseTo(1 - b, 13);
    });
  });
});
