import type { Warning } from '../warnings.ts';
import type { Levels } from './levels.ts';
import { CLAY_DEPTH_FACTOR } from './trough-width.ts';
import type { TroughWidthRule } from './trough-width-rule.ts';

/**
 * The point that the ground moves towards: the axis, or a point below it.
 *
 * Units: none. Valid: 'deep' for K near 0.5 with the clay depth rule.
 * Source: oreilly-new-1982 ('axis'), taylor-1995 ('deep').
 */
export type Focus = 'axis' | 'deep';

/**
 * The depth of the deep focus below the axis, as a share of the axis depth: 0.175/0.325 = 0.5385.
 *
 * Units: none. Valid: a constant. Source: taylor-1995.
 */
export const DEEP_FOCUS_SHARE = 0.175 / CLAY_DEPTH_FACTOR;

/**
 * f, the height of the founding level above the vector focus.
 *
 * Units: m. Valid: founding above the axis. Source: oreilly-new-1982, taylor-1995.
 */
export function depthToFocus(focus: Focus, { ground, founding, axis }: Levels): number {
  if (focus === 'axis') return founding - axis;
  return (ground - axis) * (1 + DEEP_FOCUS_SHARE) - (ground - founding);
}

/**
 * Whether the deep focus is used outside the case it was drawn from.
 *
 * Units: K without unit. Valid: any rule. Source: taylor-1995; the limits of K are [common].
 */
export function focusWarning(
  focus: Focus,
  rule: TroughWidthRule<number>,
  troughWidthParameter: number,
): Warning | undefined {
  if (focus === 'axis') return undefined;
  const meant = rule.kind === 'clay' && troughWidthParameter >= 0.4 && troughWidthParameter <= 0.6;
  return meant ? undefined : 'deep focus outside its range';
}
