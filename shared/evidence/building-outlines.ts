import { boundingBox } from '../geometry/bounding-box.ts';
import { pointInPolygon } from '../geometry/point-in-polygon.ts';
import type { GroundFrame } from './ground-frame.ts';
import { labelCorners, type LabelBox } from './label-box.ts';
import type { Spot } from './marks.ts';
import type { PlanBuilding } from './plan-material.ts';

/**
 * The outline of a building on paper.
 *
 * Units: mm. Valid: rings by the rule of even and odd. Source: [own].
 */
export type Outline = readonly (readonly Spot[])[];

/**
 * Lays a building on paper.
 *
 * Units: mm. Valid: any building. Source: [own].
 */
export function outlineOf({ place }: GroundFrame, { parts }: Pick<PlanBuilding, 'parts'>): Outline {
  return parts.flatMap((part) => part.map((ring) => ring.map(place)));
}

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
