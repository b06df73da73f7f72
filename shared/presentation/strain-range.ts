import type { Bracket } from '../assessment/bracket.ts';
import { CENTRAL, type Range } from '../numerics/range.ts';

/**
 * The strain over a bracket: the least, that at the central values, and the most.
 *
 * Units: m/m. Valid: a bracket of at least one strain. Source: [own].
 */
export function strainRange({ strains }: Bracket): Range {
  const all = strains.flat(2);
  const central = strains[strains.length >> 1]?.[1]?.[CENTRAL] ?? 0;
  return { low: Math.min(...all), central, high: Math.max(...all) };
}
