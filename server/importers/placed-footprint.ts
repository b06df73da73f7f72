import { boundingBox, type Box } from '../../shared/geometry/bounding-box.ts';
import { AppError } from '../errors.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

type Point = readonly [number, number];
type Ring = readonly Point[];

export type PlacedFootprint = {
  /** Closed rings in the scheme's grid. */
  readonly footprint: FootprintRings;
  /** The same in degrees. */
  readonly lonLat: FootprintRings;
  /** In degrees. */
  readonly bounds: Box;
};

function closed(ring: Ring): Ring {
  const [first] = ring;
  const last = ring.at(-1);
  if (first === undefined || last === undefined) return ring;
  return first[0] === last[0] && first[1] === last[1] ? ring : [...ring, first];
}

function eachRing(rings: FootprintRings, change: (ring: Ring) => Ring): FootprintRings {
  return rings.map((part) => part.map(change));
}

/** Closes a footprint's rings and derives where it lies in longitude and latitude. */
export function placedFootprint(
  reference: string,
  rings: FootprintRings,
  place: (point: Point) => Point,
): PlacedFootprint {
  const footprint = eachRing(rings, closed);
  const lonLat = eachRing(footprint, (ring) => ring.map(place));
  const points = lonLat.flat(2);
  const isPlaced = points.every(([x, y]) => Number.isFinite(x) && Number.isFinite(y));
  const hasRings = footprint.length > 0 && footprint.flat().every((ring) => ring.length >= 4);
  if (!hasRings || !isPlaced) {
    const message = hasRings
      ? `The footprint of ${reference} lies outside the scheme's grid.`
      : `The footprint of ${reference} has a ring of fewer than three corners.`;
    throw new AppError('invalid-input', message, [{ path: 'footprint', message }]);
  }
  return { footprint, lonLat, bounds: boundingBox(points) };
}
