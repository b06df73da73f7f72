import type { Percent, Ratio } from './quantity.ts';

/**
 * A strain or volume loss for people to read; 0.05 % is 500 microstrain.
 *
 * Units: m/m → %. Valid: any finite ratio. Source: [own].
 */
export function percentFromRatio(ratio: Ratio): Percent {
  return Number(ratio) * 100;
}
