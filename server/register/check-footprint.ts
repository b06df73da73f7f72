import { footprintArea } from '../../shared/building/footprint-area.ts';
import { pointInPolygon } from '../../shared/geometry/point-in-polygon.ts';
import { ringCrossing } from '../../shared/geometry/ring-crossing.ts';
import { AppError } from '../errors.ts';
import { lappedRings } from '../imports/lapped-rings.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

type Point = readonly [number, number];
type Ring = readonly Point[];

/** A shed and a factory, in square metres. */
const LEAST_AREA = 1;
const MOST_AREA = 200_000;

function refusal(message: string): AppError {
  return new AppError('invalid-input', message, [{ path: 'footprint', message }]);
}

/** A ring that ends where it begins, without corners that stand on the one before. */
function tidied(ring: Ring): Ring {
  const corners = ring.filter(([x, y], k) => {
    const [px, py] = ring[k - 1] ?? ring.at(-1) ?? [];
    return x !== px || y !== py;
  });
  const [first] = corners;
  if (first === undefined || corners.length < 3) {
    throw refusal('Draw three corners at least.');
  }
  return [...corners, first];
}

function words([east, north]: Point): string {
  return `E ${east.toFixed(1)}, N ${north.toFixed(1)}`;
}

/** By any corner of a hole, for others may stand on the edge of its building. */
function hasHoleOutside(footprint: FootprintRings): boolean {
  return footprint.some(([outer = [], ...holes]) => {
    return !holes.every((hole) => hole.some((corner) => pointInPolygon(corner, [outer])));
  });
}

function checkRings(footprint: FootprintRings): void {
  const crossing = ringCrossing(footprint.flat(), 0);
  if (crossing !== undefined) throw refusal(`The outline crosses itself near ${words(crossing)}.`);
  if (hasHoleOutside(footprint)) throw refusal('A courtyard lies outside its building.');
  const lapped = lappedRings(footprint);
  if (lapped === undefined) return;
  throw refusal(
    footprint.flat().length === 1
      ? `The outline crosses itself near ${words(lapped)}.`
      : `Parts or courtyards lie over each other near ${words(lapped)}.`,
  );
}

/** A footprint drawn by hand made tidy, or a refusal that says what is wrong with it and where. */
export function checkedFootprint(given: FootprintRings): FootprintRings {
  const footprint = given.map((part) => part.map(tidied));
  checkRings(footprint);
  const area = footprintArea(footprint);
  if (area < LEAST_AREA) throw refusal('The building is smaller than 1 m².');
  if (area > MOST_AREA) throw refusal('The building is larger than 200,000 m².');
  return footprint;
}
