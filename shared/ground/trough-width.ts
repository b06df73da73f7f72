import type { Levels } from './levels.ts';
import type { Layer, TroughWidthRule } from './trough-width-rule.ts';

/**
 * The loss of K with depth in clay: K(z) = (K − 0.325 z/z0)/(1 − z/z0).
 *
 * Units: none. Valid: clay. Source: mair-taylor-bracegirdle-1993; for K other than 0.5 [common].
 */
export const CLAY_DEPTH_FACTOR = 0.325;

function layeredWidth(layers: readonly Layer<number>[], founding: number, axis: number): number {
  let width = 0;
  let top = founding;
  for (const { baseLevel, troughWidth } of layers) {
    const base = Math.max(axis, Math.min(top, baseLevel));
    width += troughWidth * (top - base);
    top = base;
  }
  return width;
}

/**
 * i, the trough width at the founding level: the distance from the axis to the inflexion of the
 * settlement trough.
 *
 * Units: K without unit, levels m → m. Valid: see TroughWidthRule; may come out at 0 or less, which
 * callers refuse or leave out. `troughWidth` is not read by the fitted lines and layers.
 * Source: mair-taylor-bracegirdle-1993 (clay), oreilly-new-1982 (fitted lines at ground level; below
 * it i − 0.325 z in clay and i·h/z0 in sand [common]), new-oreilly-1991 (layers).
 */
export function troughWidth(
  rule: TroughWidthRule<number>,
  troughWidthParameter: number,
  levels: Levels,
): number {
  const { ground, founding, axis } = levels;
  const axisDepth = ground - axis;
  const depth = ground - founding;
  switch (rule.kind) {
    case 'constant':
      return troughWidthParameter * (axisDepth - depth);
    case 'clay':
      return troughWidthParameter * axisDepth - CLAY_DEPTH_FACTOR * depth;
    case 'oreilly-new-clay':
      return 0.43 * axisDepth + 1.1 - CLAY_DEPTH_FACTOR * depth;
    case 'oreilly-new-sand':
      if (!(axisDepth > 0)) return 0.28 * axisDepth - 0.1;
      return ((0.28 * axisDepth - 0.1) * (axisDepth - depth)) / axisDepth;
    case 'layered':
      return layeredWidth(rule.layers, founding, axis);
  }
}
