import { boundingBox, type Box } from '../geometry/bounding-box.ts';
import { planDistance } from '../geometry/plan-distance.ts';
import type { PlanPoint, Segment } from '../geometry/point.ts';
import { trueScale } from './true-scale.ts';

/**
 * A building's surroundings drawn to scale: the piece of ground, and where a point of it lies in pixels.
 *
 * Units: box in metres of the grid, drawing in pixels. Valid: made by `planFrame`. Source: [own].
 */
export type PlanFrame = {
  readonly box: Box;
  readonly width: number;
  readonly height: number;
  readonly denominator: number;
  readonly pixelsPerMetre: number;
  readonly place: (point: PlanPoint) => readonly [x: number, y: number];
};

const HEIGHT = 210;
/** In metres round the building. */
const MARGIN = 9;

/**
 * The frame of a drawing so wide that holds a building and some ground round it.
 *
 * Units: parts m, width and height pixels. Valid: at least one corner. Source: [own].
 */
export function planFrame(
  parts: readonly (readonly (readonly PlanPoint[])[])[],
  width: number,
  {
    height = HEIGHT,
    scales,
  }: { readonly height?: number; readonly scales?: readonly number[] } = {},
): PlanFrame {
  const { west, south, east, north } = boundingBox(parts.flat(2));
  const fits = Math.min(width / (east - west + 2 * MARGIN), height / (north - south + 2 * MARGIN));
  const { denominator, pixelsPerMetre } = trueScale(fits, scales);
  const [half, rise] = [width / 2 / pixelsPerMetre, height / 2 / pixelsPerMetre];
  const [x, y] = [(west + east) / 2, (south + north) / 2];
  const box = { west: x - half, south: y - rise, east: x + half, north: y + rise };
  return {
    box,
    width,
    height,
    denominator,
    pixelsPerMetre,
    place: ([easting, northing]) => [
      (easting - box.west) * pixelsPerMetre,
      (box.north - northing) * pixelsPerMetre,
    ],
  };
}

const OUTSIDE = 11;

/**
 * Where the letter of a wall stands: beside its middle, away from the middle of its building.
 *
 * Units: m to pixels. Valid: a wall of no length has its letter at its middle. Source: [own].
 */
export function letterPlace(
  { place }: Pick<PlanFrame, 'place'>,
  { start, end }: Segment,
  middle: PlanPoint,
): readonly [x: number, y: number] {
  const half: PlanPoint = [(start[0] + end[0]) / 2, (start[1] + end[1]) / 2];
  const length = planDistance(start, end) || 1;
  const across = [(end[1] - start[1]) / length, (start[0] - end[0]) / length] as const;
  const away = across[0] * (half[0] - middle[0]) + across[1] * (half[1] - middle[1]) < 0 ? -1 : 1;
  const [x, y] = place(half);
  return [x + away * across[0] * OUTSIDE, y - away * across[1] * OUTSIDE];
}

/**
 * The place of a contour's label: its point that is nearest to a quarter of the drawing, where one is
 * inside.
 *
 * Units: m to pixels. Valid: null where no point is well inside. Source: [own].
 */
export function labelPlace(
  { place, width, height }: Pick<PlanFrame, 'place' | 'width' | 'height'>,
  line: readonly PlanPoint[],
): readonly [x: number, y: number] | null {
  const inside = line
    .map(place)
    .filter(([x, y]) => x > 24 && x < width - 24 && y > 12 && y < height - 12);
  const off = ([x, y]: readonly [number, number]) => planDistance([x, y], [width / 5, height / 2]);
  const [first, ...others] = inside;
  if (first === undefined) return null;
  return others.reduce((best, one) => (off(one) < off(best) ? one : best), first);
}
