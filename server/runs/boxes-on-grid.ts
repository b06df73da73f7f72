import { boundingBox } from '../../shared/geometry/bounding-box.ts';
import { fromLonLat } from '../crs/from-lon-lat.ts';
import type { PlacedBuilding } from './plan-chunks.ts';

/** A building with the box in degrees that its register keeps. */
export type BoxInDegrees = {
  readonly id: number;
  readonly west: number;
  readonly south: number;
  readonly east: number;
  readonly north: number;
};

/** The boxes on a grid that hold boxes in degrees, whose sides may stand askew on it. */
export function boxesOnGrid(boxes: readonly BoxInDegrees[], definition: string): PlacedBuilding[] {
  const place = fromLonLat(definition);
  return boxes.map(({ id, west, south, east, north }) => {
    const corners = [west, east].flatMap((longitude) =>
      [south, north].map((latitude) => place([longitude, latitude])),
    );
    return { id, ...boundingBox(corners) };
  });
}
