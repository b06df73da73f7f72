import { boundingBox, type Box } from '../geometry/bounding-box.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { cornersOf, type Rectangle, type Spot } from './marks.ts';

/**
 * A piece of ground on paper: where a point of the grid lies, which way a direction of the grid runs, and what
 * lies at a place of the paper. `right` is the direction of the grid that runs to the right of the sheet.
 *
 * Units: grid m, paper mm. Valid: made by `groundFrame`; box holds all of the window. Source: [own].
 */
export type GroundFrame = {
  readonly denominator: number;
  readonly right: PlanPoint;
  readonly window: Rectangle;
  readonly box: Box;
  readonly place: (point: PlanPoint) => Spot;
  readonly turned: (direction: PlanPoint) => Spot;
  readonly ground: (spot: Spot) => PlanPoint;
};

const MM_PER_METRE = 1000;

/**
 * The ground in a window of a sheet at a scale of 1 : `denominator`, a point of the grid in its middle.
 *
 * Units: grid m, window mm. Valid: denominator > 0, `right` of length 1. Source: [own].
 */
export function groundFrame(
  window: Rectangle,
  {
    centre,
    denominator,
    right = [1, 0],
  }: { readonly centre: PlanPoint; readonly denominator: number; readonly right?: PlanPoint },
): GroundFrame {
  const scale = MM_PER_METRE / denominator;
  const middle: Spot = [(window.left + window.right) / 2, (window.top + window.bottom) / 2];
  const turned = ([x, y]: PlanPoint): Spot => [
    x * right[0] + y * right[1],
    x * right[1] - y * right[0],
  ];
  const place = ([e, n]: PlanPoint): Spot => {
    const [x, y] = turned([e - centre[0], n - centre[1]]);
    return [middle[0] + x * scale, middle[1] + y * scale];
  };
  const ground = ([x, y]: Spot): PlanPoint => {
    const [along, up] = [(x - middle[0]) / scale, (middle[1] - y) / scale];
    return [
      centre[0] + along * right[0] - up * right[1],
      centre[1] + along * right[1] + up * right[0],
    ];
  };
  const corners = cornersOf(window).map(ground);
  return { denominator, right, window, box: boundingBox(corners), place, turned, ground };
}
