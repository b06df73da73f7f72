import type { Box } from '../../shared/geometry/bounding-box.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

/** One footprint of the file, as little of it as comparing needs. */
export type StoredFootprint = Box & {
  readonly row: number;
  /** Corners of each part's rings, one after the other: x, y, x, y. */
  readonly rings: readonly (readonly Float64Array[])[];
};

/** Footprints that have been taken so far. */
export type FootprintStore = {
  readonly all: readonly StoredFootprint[];
  readonly add: (row: number, footprint: FootprintRings) => void;
  /** The row of an earlier footprint with the same corners. */
  readonly twinOf: (footprint: FootprintRings) => number | undefined;
};

/** Corners nearer than this are the same, in metres. */
const SAME = 0.01;
/** Footprints are looked up by the south-western corner of their boxes, in squares of this width. */
const SQUARE = 0.1;
const ROWS = 2 ** 28;

function packed(row: number, footprint: FootprintRings): StoredFootprint {
  let [west, south, east, north] = [Infinity, Infinity, -Infinity, -Infinity];
  const rings = footprint.map((part) =>
    part.map((ring) => {
      const numbers = new Float64Array(2 * ring.length);
      ring.forEach(([x, y], index) => {
        numbers.set([x, y], 2 * index);
        west = Math.min(west, x);
        east = Math.max(east, x);
        south = Math.min(south, y);
        north = Math.max(north, y);
      });
      return numbers;
    }),
  );
  return { row, rings, west, south, east, north };
}

/** The corners of a packed ring. */
export function unpacked(ring: Float64Array): PlanPoint[] {
  const points: PlanPoint[] = [];
  for (let at = 0; at + 1 < ring.length; at += 2) points.push([ring[at] ?? 0, ring[at + 1] ?? 0]);
  return points;
}

function hasCorner(ring: Float64Array, x: number, y: number): boolean {
  for (let at = 0; at + 1 < ring.length; at += 2) {
    if (Math.abs((ring[at] ?? 0) - x) <= SAME && Math.abs((ring[at + 1] ?? 0) - y) <= SAME) {
      return true;
    }
  }
  return false;
}

function isSameRing(one: Float64Array, other: Float64Array): boolean {
  if (one.length !== other.length) return false;
  for (let at = 0; at + 1 < one.length; at += 2) {
    if (!hasCorner(other, one[at] ?? 0, one[at + 1] ?? 0)) return false;
  }
  return true;
}

function isTwin(one: StoredFootprint, other: StoredFootprint): boolean {
  const [rings, others] = [one.rings.flat(), other.rings.flat()];
  if (rings.length !== others.length || one.rings.length !== other.rings.length) return false;
  return rings.every((ring) => others.some((candidate) => isSameRing(ring, candidate)));
}

/** A square as one number: northings have fewer than ROWS squares. */
function squareOf(west: number, south: number): number {
  return Math.floor(west / SQUARE) * ROWS + Math.floor(south / SQUARE);
}

function squaresAround({ west, south }: Box): Set<number> {
  return new Set([
    squareOf(west - SAME, south - SAME),
    squareOf(west - SAME, south + SAME),
    squareOf(west + SAME, south - SAME),
    squareOf(west + SAME, south + SAME),
  ]);
}

/** A store of footprints, to find those that are there twice. */
export function createFootprintStore(): FootprintStore {
  const all: StoredFootprint[] = [];
  const bySquare = new Map<number, number[]>();
  return {
    all,
    add: (row, footprint) => {
      const stored = packed(row, footprint);
      const key = squareOf(stored.west, stored.south);
      bySquare.set(key, [...(bySquare.get(key) ?? []), all.length]);
      all.push(stored);
    },
    twinOf: (footprint) => {
      const wanted = packed(0, footprint);
      const near = [...squaresAround(wanted)].flatMap((key) => bySquare.get(key) ?? []);
      const twin = near.map((index) => all[index]).find((one) => one && isTwin(one, wanted));
      return twin?.row;
    },
  };
}
