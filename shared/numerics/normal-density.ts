import { exponential } from './exponential.ts';

/**
 * √(2π).
 *
 * Units: none. Valid: a constant. Source: [own].
 */
export const SQRT_TWO_PI = 2.5066282746310002;

/**
 * φ(x), the standard normal density.
 *
 * Units: none. Valid: all x. Source: abramowitz-stegun-1964, 26.2.1.
 */
export function normalDensity(x: number): number {
  return exponential((-x * x) / 2) / SQRT_TWO_PI;
}
