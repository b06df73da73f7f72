import type { OutlineBox } from '../../shared/schemas/building-outlines.ts';
import type { LonLatBox } from '../models/find-buildings-in-box.ts';
import { toLonLat } from './to-lon-lat.ts';

/** A metre and more on the ground, by which the sides of a box of the grid may bulge in degrees. */
const MARGIN = 0.00002;
/** By which share of its size the sides of a large box bulge more than its quarter points tell. */
const BULGE = 0.001;
const QUARTERS = [0, 0.25, 0.5, 0.75, 1];

function sidesOf(values: readonly number[]): [number, number] {
  const [least, most] = [Math.min(...values), Math.max(...values)];
  const margin = MARGIN + BULGE * (most - least);
  return [least - margin, most + margin];
}

/** The degrees round a box of a grid; null where some of it lies outside of what the grid can tell. */
export function boxToLonLat(
  definition: string,
  { west, south, east, north }: OutlineBox,
): LonLatBox | null {
  const place = toLonLat(definition);
  const points = QUARTERS.flatMap((across) =>
    QUARTERS.map((up) => place([west + across * (east - west), south + up * (north - south)])),
  );
  const [left, right] = sidesOf(points.map(([longitude]) => longitude));
  const [bottom, top] = sidesOf(points.map(([, latitude]) => latitude));
  const box: LonLatBox = [left, bottom, right, top];
  return box.every(Number.isFinite) ? box : null;
}
