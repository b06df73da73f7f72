import type { OutlineBox } from '../../../shared/schemas/building-outlines.ts';
import type { Line } from '../../../shared/geometry/stretch-within.ts';

/** The side of the squares of the grid by which outlines are fetched and kept, in metres. */
const SIDE = 200;

/** How far along a line its coordinate crosses the edges of squares. */
function crossings(from: number, rate: number, length: number): number[] {
  if (rate === 0) return [];
  const [low, high] = [Math.min(from, from + rate * length), Math.max(from, from + rate * length)];
  const [first, last] = [Math.ceil(low / SIDE), Math.floor(high / SIDE)];
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, k) => {
    return ((first + k) * SIDE - from) / rate;
  });
}

/** The squares of the grid that a straight line runs through, in order. */
export function squaresUnder({ start: [x, y], direction, length }: Line): OutlineBox[] {
  const [east, north] = direction;
  const cuts = [0, ...crossings(x, east, length), ...crossings(y, north, length), length];
  cuts.sort((a, b) => a - b);
  return cuts.slice(1).flatMap((to, k) => {
    const from = cuts[k] ?? to;
    if (to - from < 1e-9) return [];
    const middle = (from + to) / 2;
    const west = Math.floor((x + middle * east) / SIDE) * SIDE;
    const south = Math.floor((y + middle * north) / SIDE) * SIDE;
    return [{ west, south, east: west + SIDE, north: south + SIDE }];
  });
}
