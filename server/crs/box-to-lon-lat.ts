import type { OutlineBox } from '../../shared/schemas/building-outlines.ts';
import type { LonLatBox } from '../models/find-buildings-in-box.ts';
import { toLonLat } from './to-lon-lat.ts';

/** A metre and more on the ground, by which the sides of a box of the grid may bulge in degrees. */
const MARGIN = 0.00002;

/** The degrees round a small box of a grid; null where some of it lies outside of what the grid can tell. */
export function boxToLonLat(
  definition: string,
  { west, south, east, north }: OutlineBox,
): LonLatBox | null {
  const place = toLonLat(definition);
  const corners = [west, east].flatMap((x) => [south, north].map((y) => place([x, y])));
  const longitudes = corners.map(([longitude]) => longitude);
  const latitudes = corners.map(([, latitude]) => latitude);
  const box: LonLatBox = [
    Math.min(...longitudes) - MARGIN,
    Math.min(...latitudes) - MARGIN,
    Math.max(...longitudes) + MARGIN,
    Math.max(...latitudes) + MARGIN,
  ];
  return box.every(Number.isFinite) ? box : null;
}
