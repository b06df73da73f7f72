import type { Warning } from '../warnings.ts';
import type { Levels } from './levels.ts';
import type { TroughWidthRule } from './trough-width-rule.ts';

/**
 * The smallest K for which the clay depth rule holds.
 *
 * Units: none. Valid: a constant. Source: [common].
 */
export const SMALLEST_CLAY_K = 0.4;

/**
 * What a reader must know about a trough width, if anything.
 *
 * Units: levels m. Valid: any rule. Source: oreilly-new-1982 (depths of the fitted lines), [common]
 * (K of the clay rule).
 */
export function troughWidthWarning(
  rule: TroughWidthRule<number>,
  troughWidthParameter: number,
  { ground, founding, axis }: Levels,
): Warning | undefined {
  const axisDepth = ground - axis;
  switch (rule.kind) {
    case 'clay':
      return founding < ground && troughWidthParameter < SMALLEST_CLAY_K
        ? 'depth rule for clay with K below 0.4'
        : undefined;
    case 'oreilly-new-clay':
      return axisDepth < 3 || axisDepth > 34 ? 'trough width rule outside its depths' : undefined;
    case 'oreilly-new-sand':
      return axisDepth < 6 || axisDepth > 10 ? 'trough width rule outside its depths' : undefined;
    case 'constant':
    case 'layered':
      return undefined;
  }
}
