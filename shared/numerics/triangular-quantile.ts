import type { Recorder } from '../working.ts';
import { isRange, type Range } from './range.ts';

/**
 * Whose value is drawn, for the line of a working.
 *
 * Units: `unit` is that of the range. Valid: any. Source: [own].
 */
export type DrawnName = {
  readonly symbol: string;
  readonly meaning: string;
  readonly unit: string;
};

/**
 * The value that a share of a triangular distribution lies below: none below low or above high, most at
 * the central value. A range without width has its one value for every share, and no working.
 *
 * Units: those of the range. Valid: share 0 to 1. Source: [own], from the distribution's two parabolas.
 */
export function triangularQuantile(
  range: Range,
  share: number,
  name?: DrawnName,
  record?: Recorder,
): number {
  if (!isRange(range)) return range.central;
  const { low, central, high } = range;
  const width = high - low;
  const isBelow = share * width < central - low;
  const value = isBelow
    ? low + Math.sqrt(share * width * (central - low))
    : high - Math.sqrt((1 - share) * width * (high - central));
  if (name !== undefined) {
    record?.({
      ...name,
      expression: isBelow
        ? 'low + sqrt(q * (high - low) * (central - low))'
        : 'high - sqrt((1 - q) * (high - low) * (high - central))',
      inputs: { q: share, low, central, high },
      value,
      reference: 'own',
    });
  }
  return value;
}
