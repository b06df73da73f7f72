import fc from 'fast-check';
import { numbers } from './property.ts';

/** The coefficients, lowest first, of scale · (t − r₁)(t − r₂)… */
export function fromRoots(scale: number, roots: readonly number[]): Float64Array {
  let c = [scale];
  for (const root of roots) {
    c = [...c, 0].map((_, k) => (c[k - 1] ?? 0) - root * (c[k] ?? 0));
  }
  return Float64Array.from(c);
}

/** A polynomial of a degree by its coefficients, lowest first. */
export function coefficients(degree: number, size = 10): fc.Arbitrary<number[]> {
  return fc.array(numbers(-size, size), { minLength: degree + 1, maxLength: degree + 1 });
}

/** The value of a polynomial, summed term by term. */
export function valueAt(c: readonly number[], t: number): number {
  return c.reduce((sum, coefficient, power) => sum + coefficient * t ** power, 0);
}
