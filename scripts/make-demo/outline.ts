import { distanceToRing } from './polygons.ts';
import {
  along,
  between,
  cyclic,
  direction,
  distance,
  dot,
  itemAt,
  left,
  unit,
  add,
} from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** A block's edge measured along, counter-clockwise, so that the block lies to the left. */
export type Outline = {
  readonly ring: Ring;
  readonly stations: readonly number[];
  readonly total: number;
};
/** Where two frontages meet; a positive turn is a corner that juts out into the street. */
export type Corner = { readonly station: number; readonly at: Point; readonly turn: number };

export function makeOutline(ring: Ring): Outline {
  const stations: number[] = [];
  let total = 0;
  for (let index = 0; index < ring.length; index += 1) {
    stations.push(total);
    total += distance(cyclic(ring, index), cyclic(ring, index + 1));
  }
  return { ring, stations, total };
}

function wrap(outline: Outline, station: number): number {
  return ((station % outline.total) + outline.total) % outline.total;
}

function sideAt(stations: readonly number[], station: number): number {
  let [low, high] = [0, stations.length - 1];
  while (low < high) {
    const middle = Math.ceil((low + high) / 2);
    if (itemAt(stations, middle) <= station) low = middle;
    else high = middle - 1;
  }
  return low;
}

export function pointOn(outline: Outline, station: number): Point {
  const at = wrap(outline, station);
  const side = sideAt(outline.stations, at);
  const [a, b] = [cyclic(outline.ring, side), cyclic(outline.ring, side + 1)];
  const size = distance(a, b);
  return between(a, b, size === 0 ? 0 : (at - itemAt(outline.stations, side)) / size);
}

/** The direction into the block, square to the frontage between two stations. */
export function inwardAt(outline: Outline, from: number, to: number): Point {
  return left(direction(pointOn(outline, from), pointOn(outline, to)));
}

/** The direction into the block at a bent place, halving the bend. */
export function inwardAtCorner(outline: Outline, station: number): Point {
  const before = inwardAt(outline, station - 3, station);
  const after = inwardAt(outline, station, station + 3);
  return unit(add(before, after));
}

const window = 4;
const sharpTurn = (28 * Math.PI) / 180;

function turnAt(outline: Outline, station: number): number {
  const at = pointOn(outline, station);
  const before = direction(pointOn(outline, station - window), at);
  const after = direction(at, pointOn(outline, station + window));
  return Math.atan2(before[0] * after[1] - before[1] * after[0], dot(before, after));
}

/** All sharp corners, in order along the outline, none closer than `window` to another. */
export function cornersOf(outline: Outline): Corner[] {
  const sharp = outline.ring
    .map((at, index): Corner => {
      const station = itemAt(outline.stations, index);
      return { station, at, turn: turnAt(outline, station) };
    })
    .filter(({ turn }) => Math.abs(turn) > sharpTurn)
    .sort((a, b) => Math.abs(b.turn) - Math.abs(a.turn));
  const kept: Corner[] = [];
  for (const corner of sharp) {
    const apart = kept.every(({ station }) => {
      const gap = Math.abs(station - corner.station);
      return Math.min(gap, outline.total - gap) > window;
    });
    if (apart) kept.push(corner);
  }
  return kept.sort((a, b) => a.station - b.station);
}

/** How deep one may build from a frontage before another frontage is nearer. */
export function depthLimit(ring: Ring, from: Point, inward: Point, most: number): number {
  let [low, high] = [0, most];
  for (let round = 0; round < 11; round += 1) {
    const depth = (low + high) / 2;
    if (distanceToRing(along(from, inward, depth), ring) >= depth * 0.985 - 0.05) low = depth;
    else high = depth;
  }
  return low;
}

/** Points of the outline strictly between two stations that stand off the straight line between them. */
export function bendsBetween(outline: Outline, from: number, to: number, off: number): Point[] {
  const [a, b] = [pointOn(outline, from), pointOn(outline, to)];
  const way = left(direction(a, b));
  const span = wrap(outline, to - from);
  const bends: { reach: number; point: Point }[] = [];
  for (const [index, point] of outline.ring.entries()) {
    const reach = wrap(outline, itemAt(outline.stations, index) - from);
    if (reach < 0.5 || reach > span - 0.5) continue;
    if (Math.abs(dot(way, [point[0] - a[0], point[1] - a[1]])) > off) bends.push({ reach, point });
  }
  return bends.sort((x, y) => x.reach - y.reach).map(({ point }) => point);
}
