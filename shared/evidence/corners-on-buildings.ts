import { boundingBox } from '../geometry/bounding-box.ts';
import { pointInPolygon } from '../geometry/point-in-polygon.ts';
import { labelCorners, type LabelBox } from './label-box.ts';
import type { Spot } from './marks.ts';

/**
 * The outline of a building on paper.
 *
 * Units: mm. Valid: rings by the rule of even and odd. Source: [own].
 */
export type Outline = readonly (readonly Spot[])[];

/**
 * Tells how many corners of a label, and its middle, lie on buildings.
 *
 * Units: mm. Valid: any outlines. Source: [own].
 */
export function cornersOnBuildings(outlines: readonly Outline[]): (box: LabelBox) => number {
  const boxed = outlines.map((rings) => ({ rings, box: boundingBox(rings.flat()) }));
  const isOn = ([x, y]: Spot) =>
    boxed.some(
      ({ rings, box: { west, east, south, north } }) =>
        x >= west && x <= east && y >= south && y <= north && pointInPolygon([x, y], rings),
    );
  return (box) => [box.middle, ...labelCorners(box)].filter(isOn).length;
}
