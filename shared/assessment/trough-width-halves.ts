import { lobattoPoints } from '../numerics/lobatto-points.ts';
import type { Range } from '../numerics/range.ts';
import type { CutOffRule } from './rules.ts';

/** How many points a half takes at least, and how many more if 1/K fell to nothing over it. */
const POINTS = { least: 4, more: 10 } as const;
/** The same where the far tails of a trough count: they are small differences of what is interpolated. */
const POINTS_IN_TAILS = { least: 6, more: 16 } as const;
/** A rule that ignores less settlement than this lets the tails count. */
const TAILS_SETTLEMENT = 1e-4;

/**
 * Chebyshev points in 1/K, since a trough is smooth in 1/i and i grows as K: so many that the strain keeps
 * within 1 % for any K between.
 */
function troughWidthsBetween(from: number, to: number, cutOff: CutOffRule): number[] {
  if (from === to) return [from];
  const hasTails = cutOff.kind === 'settlement' && cutOff.settlement < TAILS_SETTLEMENT;
  const { least, more } = hasTails ? POINTS_IN_TAILS : POINTS;
  const count = least + Math.floor(more * (1 - from / to));
  const [first, last] = [1 / from, 1 / to];
  return lobattoPoints(count).map((point) => {
    if (point === -1) return from;
    return point === 1 ? to : 2 / (first + last + point * (last - first));
  });
}

/**
 * The K at which the movement is worked out on either side of the central one, without a side that has no
 * width. Either side has a polynomial of its own, since the widths of layers bend at the central values.
 *
 * Units: none. Valid: an ordered range of K > 0; at least one side. Source: [own], after trefethen-2013.
 */
export function troughWidthHalves({ low, central, high }: Range, cutOff: CutOffRule): number[][] {
  const lower = troughWidthsBetween(low, central, cutOff);
  const upper = troughWidthsBetween(central, high, cutOff);
  const halves = [lower, upper].filter((widths) => widths.length > 1);
  return halves.length === 0 ? [lower] : halves;
}
