import type { Recorder } from '../working.ts';
import { atOrAbove } from './at-or-above.ts';

/**
 * Rankin's class of a building by name; never by number, which would be taken for a damage category.
 *
 * Units: none. Valid: closed list. Source: rankin-1988.
 */
export type RankinClass = 'negligible' | 'slight' | 'moderate' | 'high';

/**
 * Rankin's classes with the slope and settlement from which each is reached.
 *
 * Units: slope m/m, settlement m. Valid: from negligible up. Source: rankin-1988.
 */
export const RANKIN_CLASSES: readonly {
  readonly name: RankinClass;
  readonly slope: number;
  readonly settlement: number;
}[] = [
  { name: 'negligible', slope: 0, settlement: 0 },
  { name: 'slight', slope: 1 / 500, settlement: 0.01 },
  { name: 'moderate', slope: 1 / 200, settlement: 0.05 },
  { name: 'high', slope: 1 / 50, settlement: 0.075 },
];

/**
 * Rankin's class by the steepest slope and the largest settlement, the worse of the two.
 *
 * Units: slope m/m, settlement m. Valid: both ≥ 0. Source: rankin-1988.
 */
export function rankinClass(slope: number, settlement: number, record?: Recorder): RankinClass {
  let reached: RankinClass = 'negligible';
  let steps = 0;
  for (const [index, row] of RANKIN_CLASSES.entries()) {
    if (index === 0) continue;
    if (atOrAbove(slope, row.slope) || atOrAbove(settlement, row.settlement)) {
      reached = row.name;
      steps = index;
    }
  }
  record?.({
    symbol: 'Rankin',
    meaning: `steps above negligible by slope or settlement: Rankin ${reached}`,
    expression:
      'max((m >= 1/500) + (m >= 1/200) + (m >= 1/50), (S >= 0.01) + (S >= 0.05) + (S >= 0.075))',
    inputs: { m: slope, S: settlement },
    value: steps,
    unit: '',
    reference: 'rankin-1988',
  });
  return reached;
}
