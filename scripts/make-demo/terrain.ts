import { makeOutlineFinder } from './outline-finder.ts';
import { boundsOf, boxesMeet, distanceToRing, inside } from './polygons.ts';
import type { Box } from './polygons.ts';
import type { Site } from './sites.ts';
import type { Point, Ring } from './vector.ts';
import type { Water } from './water.ts';

/** What the ground at a place allows. */
export type Terrain = {
  readonly water: Water;
  readonly sites: readonly Site[];
  /** Distance to the quay edge; negative in the harbour. */
  readonly toQuay: (at: Point) => number;
  /** Distance to the shore of the bank; negative at sea. */
  readonly toShore: (at: Point) => number;
  /** Whether a street may run here. */
  readonly allowsStreet: (at: Point) => boolean;
  /** How late a place was built on: the bank was filled from the harbour outwards. */
  readonly turn: (at: Point) => number;
  /** How far out of the old town a place is: 0 at its heart, 1 where it ends, more beyond. */
  readonly age: (at: Point) => number;
};

const oldTown: Point = [560, 350];
const harbourHead: Point = [490, 352];

export function boxed(ring: Ring): { ring: Ring; box: Box } {
  return { ring, box: boundsOf(ring) };
}

/** Whether a point is within `gap` of a ring or inside it. */
export function isNear(at: Point, { ring, box }: { ring: Ring; box: Box }, gap: number): boolean {
  if (!boxesMeet(box, [at[0], at[1], at[0], at[1]], gap)) return false;
  return inside(at, ring) || (gap > 0 && distanceToRing(at, ring) < gap);
}

export function makeTerrain(water: Water, sites: readonly Site[]): Terrain {
  const quay = boxed(water.quayLine);
  const cuts = water.cutRings.map(boxed);
  const kept = sites.map(({ ring }) => boxed(ring));
  const [findQuay, findCoast] = [makeOutlineFinder(water.quayLine), makeOutlineFinder(water.coast)];
  function toShore(at: Point): number {
    return findCoast(at).distance * (inside(at, water.coast) ? 1 : -1);
  }
  function toQuay(at: Point): number {
    return findQuay(at).distance * (inside(at, water.quayLine) ? -1 : 1);
  }
  function allowsStreet(at: Point): boolean {
    if (isNear(at, quay, 9)) return false;
    if (cuts.some((ring) => isNear(at, ring, 11)) || kept.some((ring) => isNear(at, ring, 0)))
      return false;
    return toShore(at) > 26;
  }
  function age(at: Point): number {
    const [dx, dy] = [at[0] - oldTown[0], (at[1] - oldTown[1]) * 1.1];
    const west = at[0] < 250 ? 0.25 : 0;
    return Math.sqrt(dx * dx + dy * dy) / 330 + west;
  }
  function turn(at: Point): number {
    const [dx, dy] = [(at[0] - harbourHead[0]) * 0.78, at[1] - harbourHead[1]];
    return Math.sqrt(dx * dx + dy * dy);
  }
  return { water, sites, toQuay, toShore, allowsStreet, turn, age };
}
