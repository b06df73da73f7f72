import { createHash } from 'node:crypto';
import type { FootprintRings } from '../models/building-footprint.ts';

type Point = readonly [number, number];

function before([x, y]: Point, [otherX, otherY]: Point): boolean {
  return x < otherX || (x === otherX && y < otherY);
}

/** A closed ring to the millimetre, from its westernmost corner on. */
function written(ring: readonly Point[]): string {
  const corners = ring.slice(0, -1).map(([x, y]): Point => [Math.round(x * 1e3), Math.round(y * 1e3)]); // prettier-ignore
  let first = 0;
  corners.forEach((corner, index) => {
    if (before(corner, corners[first] ?? corner)) first = index;
  });
  return [...corners.slice(first), ...corners.slice(0, first)].join(' ');
}

/** What a footprint is known by: the same for the same rings, wherever they begin. */
export function footprintHash(parts: FootprintRings): string {
  const rings = parts.map((part) => part.map(written).join(';')).sort();
  return createHash('sha1').update(rings.join('|')).digest('base64url');
}
