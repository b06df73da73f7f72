import type { FootprintRings } from '../models/building-footprint.ts';

type Point = readonly [number, number];
type Ring = readonly Point[];
type Part = readonly Ring[];

/** Formats round corners; those nearer than this, in metres, did not move. */
const WITHIN = 0.005;

function isNear([x, y]: Point, [otherX, otherY]: Point): boolean {
  return Math.hypot(x - otherX, y - otherY) <= WITHIN;
}

/** Whether closed rings run through the same corners, wherever they begin. */
function isSameRing(one: Ring, other: Ring): boolean {
  if (one.length !== other.length) return false;
  const [corners, others] = [one.slice(0, -1), other.slice(0, -1)];
  return others.some((_, shift) =>
    corners.every((corner, at) => {
      const across = others[(at + shift) % others.length];
      return across !== undefined && isNear(corner, across);
    }),
  );
}

function isSamePart(one: Part, other: Part): boolean {
  const [outer = [], ...holes] = one;
  const [otherOuter = [], ...otherHoles] = other;
  if (holes.length !== otherHoles.length || !isSameRing(outer, otherOuter)) return false;
  return holes.every((hole) => otherHoles.some((candidate) => isSameRing(hole, candidate)));
}

/** Whether clean footprints are one but for what a format's figures round away. */
export function isSameFootprint(one: FootprintRings, other: FootprintRings): boolean {
  if (one.length !== other.length) return false;
  return one.every((part) => other.some((candidate) => isSamePart(part, candidate)));
}
