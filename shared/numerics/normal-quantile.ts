import { findRoot } from './find-root.ts';
import { normalDistribution } from './normal-distribution.ts';

/**
 * Φ⁻¹(p): the x at which the standard normal distribution reaches p.
 *
 * Units: none. Valid: 1e-12 ≤ p ≤ 1 − 1e-12, error under 1e-9 for 0.001 ≤ p ≤ 0.999.
 * Source: [own], by root finding.
 */
export function normalQuantile(p: number): number {
  if (p === 0.5) return 0;
  return findRoot((x) => normalDistribution(x) - p, -8, 8, 1e-13);
}
