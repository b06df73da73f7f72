import { complementaryErrorFunction } from './error-function.ts';

/**
 * Φ(x), the standard normal distribution.
 *
 * Units: none. Valid: all x, absolute error under 1e-14. Source: abramowitz-stegun-1964, 26.2.29.
 */
export function normalDistribution(x: number): number {
  return complementaryErrorFunction(-x * Math.SQRT1_2) / 2;
}
