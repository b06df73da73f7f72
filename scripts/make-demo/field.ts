import { noise } from './noise.ts';
import { createRandom, mix } from './prng.ts';
import { makeOutlineFinder } from './outline-finder.ts';
import type { OutlineFinder } from './outline-finder.ts';
import { atChainage } from './sites.ts';
import { angleOf, fromAngle, left, length, subtract } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** Which way streets run at a place: `along` the shore or the hill, in radians. */
export type Field = (at: Point) => number;

type Sum = { x: number; y: number };

/** Directions without a sense (a street runs both ways) add up as double angles. */
function addTo(sum: Sum, angle: number, weight: number): void {
  sum.x += weight * Math.cos(2 * angle);
  sum.y += weight * Math.sin(2 * angle);
}

function followOutline(
  sum: Sum,
  at: Point,
  find: OutlineFinder,
  reach: number,
  strength: number,
): void {
  const near = find(at);
  const weight = strength * Math.exp(-near.distance / reach);
  if (weight > 0.01) addTo(sum, angleOf(left(subtract(at, near.point))), weight);
}

function roundAbout(sum: Sum, at: Point, centre: Point, reach: number, strength: number): void {
  const from = subtract(at, centre);
  const share = length(from) / reach;
  const weight = strength * Math.exp(-share * share);
  if (weight > 0.01) addTo(sum, angleOf(left(from)), weight);
}

function gridAbout(
  sum: Sum,
  at: Point,
  focus: { centre: Point; reach: number; angle: number },
  strength: number,
): void {
  const share = length(subtract(at, focus.centre)) / focus.reach;
  const weight = strength * Math.exp(-share * share);
  if (weight > 0.01) addTo(sum, focus.angle, weight);
}

const districtSize = 520;

/** Beyond the old town, districts repeat: each has a heart its streets go round or line up with. */
type District = { readonly centre: Point; readonly angle: number; readonly round: boolean };

function makeDistrict(i: number, j: number, seed: number): District {
  const random = createRandom(mix(Math.imul(i, 7919) ^ Math.imul(j, 104729) ^ seed));
  const centre: Point = [
    (i + random.range(0.2, 0.8)) * districtSize,
    (j + random.range(0.2, 0.8)) * districtSize,
  ];
  return { centre, angle: random.range(0, Math.PI), round: random.chance(0.4) };
}

type DistrictFinder = (i: number, j: number) => District;

function createDistricts(seed: number): DistrictFinder {
  const known = new Map<number, District>();
  return (i, j) => {
    const key = (i + 4096) * 8192 + j + 4096;
    const found = known.get(key) ?? makeDistrict(i, j, seed);
    known.set(key, found);
    return found;
  };
}

function followDistricts(sum: Sum, at: Point, find: DistrictFinder): void {
  const [i, j] = [Math.floor(at[0] / districtSize), Math.floor(at[1] / districtSize)];
  for (let di = -1; di <= 1; di += 1) {
    for (let dj = -1; dj <= 1; dj += 1) {
      const heart = find(i + di, j + dj);
      if (heart.round) roundAbout(sum, at, heart.centre, 330, 0.4);
      else gridAbout(sum, at, { centre: heart.centre, reach: 330, angle: heart.angle }, 0.4);
    }
  }
}

/** Streets follow the quays and the shore, go round the hill, and square up to the Market Place. */
export function makeField(quayLine: Ring, coast: Ring, seed: number): Field {
  const market = {
    centre: atChainage(2966, 0),
    reach: 130,
    angle: angleOf(subtract(atChainage(2980, 0), atChainage(2950, 0))),
  };
  const hill: Point = [920, 665];
  const districts = createDistricts(seed);
  const [findQuay, findCoast] = [makeOutlineFinder(quayLine), makeOutlineFinder(coast)];
  return (at) => {
    const sum: Sum = { x: 0.02, y: 0.01 };
    followOutline(sum, at, findQuay, 150, 1.6);
    followOutline(sum, at, findCoast, 90, 1.1);
    roundAbout(sum, at, hill, 190, 1.2);
    gridAbout(sum, at, market, 1.5);
    followDistricts(sum, at, districts);
    // Far out no quay or hill bends the streets, so they must be more crooked of themselves.
    const bend = findQuay(at).distance > 900 ? 1.5 : 1;
    const crooked =
      0.2 * noise(at[0], at[1], 150, seed + 5) + 0.16 * noise(at[0], at[1], 330, seed + 6);
    return Math.atan2(sum.y, sum.x) / 2 + bend * crooked;
  };
}

/** The field's direction, or the one across it, nearest to the way already being gone. */
export function heading(field: Field, at: Point, family: 0 | 1, previous: Point): Point {
  const vector = fromAngle(field(at) + (family * Math.PI) / 2);
  return vector[0] * previous[0] + vector[1] * previous[1] < 0 ? [-vector[0], -vector[1]] : vector;
}
