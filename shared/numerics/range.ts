import { MethodError } from '../method-error.ts';

/**
 * A likely range of one input: its low, central and high value.
 *
 * Units: those of the input. Valid: low ≤ central ≤ high. Source: [own].
 */
export type Range = { readonly low: number; readonly central: number; readonly high: number };

/**
 * The five positions in a range: low, half-way, central, half-way, high.
 *
 * Units: none. Valid: 0 to 4. Source: [own].
 */
export type FivePosition = 0 | 1 | 2 | 3 | 4;

/**
 * All five positions in order.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const FIVE_POSITIONS: readonly FivePosition[] = [0, 1, 2, 3, 4];

/**
 * The position of the central value among the five.
 *
 * Units: none. Valid: a constant. Source: [own].
 */
export const CENTRAL: FivePosition = 2;

/**
 * A range with one value throughout.
 *
 * Units: those of the input. Valid: finite. Source: [own].
 */
export function certain(value: number): Range {
  return { low: value, central: value, high: value };
}

/**
 * A range from a single value or from low, central and high.
 *
 * Units: those of the input. Valid: throws `bad-range` when the three are not in order.
 * Source: [own].
 */
export function rangeOf(input: number | readonly [number, number, number]): Range {
  if (typeof input === 'number') return certain(input);
  const [low, central, high] = input;
  if (!(low <= central && central <= high)) {
    throw new MethodError('bad-range', `${low}, ${central}, ${high} is not low, central, high.`);
  }
  return { low, central, high };
}

/**
 * Whether a range says more than one value.
 *
 * Units: none. Valid: any range. Source: [own].
 */
export function isRange(range: Range): boolean {
  return range.low !== range.high;
}

/**
 * The value of a range at a position in it: one of the five, or anywhere between them.
 *
 * Units: those of the input. Valid: any ordered range; position 0 to 4. Source: [own].
 */
export function atPosition({ low, central, high }: Range, position: number): number {
  return position < 2
    ? ((2 - position) * low + position * central) / 2
    : ((4 - position) * central + (position - 2) * high) / 2;
}

/**
 * The position in a range at which it has a value, the inverse of `atPosition`.
 *
 * Units: none. Valid: low ≤ value ≤ high; the middle of a range without width. Source: [own].
 */
export function positionOf({ low, central, high }: Range, value: number): number {
  if (value < central) return (2 * (value - low)) / (central - low);
  return value > central ? 2 + (2 * (value - central)) / (high - central) : 2;
}
