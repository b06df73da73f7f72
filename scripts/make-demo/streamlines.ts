import { heading } from './field.ts';
import type { Field } from './field.ts';
import {
  add,
  along,
  cyclic,
  direction,
  distance,
  dot,
  fromAngle,
  itemAt,
  left,
  scale,
} from './vector.ts';
import { createTracks } from './tracks.ts';
import type { Tracks } from './tracks.ts';
import type { Line, Point } from './vector.ts';

/** 0 runs along the shore, 1 across. */
export type Family = 0 | 1;
export const step = 6;
/** Cosine of the sharpest turn within one step: near a pole of the field streets would zigzag. */
const sharpest = 0.93;

export type Growth = {
  readonly field: Field;
  readonly allows: (at: Point) => boolean;
  readonly spacing: (at: Point, family: Family) => number;
};

function nextPoint(
  growth: Growth,
  at: Point,
  family: Family,
  way: Point,
): { point: Point; way: Point } {
  const first = heading(growth.field, at, family, way);
  const second = heading(growth.field, along(at, first, step / 2), family, first);
  return { point: along(at, second, step), way: second };
}

/** Whether a line comes back upon itself at its end. */
function meetsItself(line: Line, gap: number): boolean {
  const end = cyclic(line, -1);
  return line.slice(0, Math.max(0, line.length - 30)).some((point) => distance(point, end) < gap);
}

/** Follows the field from a start until the ground or a neighbouring street stops it. */
function trace(growth: Growth, tracks: Tracks, from: Point, family: Family, start: Point): Line {
  const line: Point[] = [from];
  let [at, way] = [from, start];
  for (let count = 0; count < 400; count += 1) {
    const next = nextPoint(growth, at, family, way);
    const gap = growth.spacing(next.point, family) * 0.5;
    line.push(next.point);
    if (dot(way, next.way) < sharpest && count > 0) break;
    if (!growth.allows(next.point) || !tracks.isClear(next.point, gap) || meetsItself(line, gap))
      break;
    ({ point: at, way } = next);
  }
  return line;
}

function traceBothWays(growth: Growth, tracks: Tracks, from: Point, family: Family): Line {
  const start = fromAngle(growth.field(from) + (family * Math.PI) / 2);
  const ahead = trace(growth, tracks, from, family, start);
  const behind = trace(growth, tracks, from, family, scale(start, -1));
  return [...behind.slice(1).reverse(), ...ahead];
}

function candidatesBeside(growth: Growth, line: Line, family: Family): Point[] {
  return line.flatMap((point, index) => {
    if (index % 3 !== 0 || index + 1 >= line.length) return [];
    const aside = left(direction(point, itemAt(line, index + 1)));
    const gap = growth.spacing(point, family);
    return [add(point, scale(aside, gap)), add(point, scale(aside, -gap))];
  });
}

function isAlong(growth: Growth, line: Line, index: number, family: Family): boolean {
  const [a, b] = [
    itemAt(line, Math.max(0, index - 1)),
    itemAt(line, Math.min(line.length - 1, index + 1)),
  ];
  const way = direction(a, b);
  const ideal = fromAngle(growth.field(itemAt(line, index)) + (family * Math.PI) / 2);
  return Math.abs(way[0] * ideal[0] + way[1] * ideal[1]) > 0.72;
}

/** Grows a family of streets, evenly spaced, out from streets that are there already. */
export function growFamily(
  growth: Growth,
  there: readonly Line[],
  family: Family,
  seeds: readonly Line[],
): Line[] {
  const tracks = createTracks();
  for (const line of there)
    tracks.add(line.filter((_, index) => isAlong(growth, line, index, family)));
  const queue = [
    ...seeds.flatMap((line) => line.filter((_, i) => i % 2 === 0)),
    ...there.flatMap((line) => candidatesBeside(growth, line, family)),
  ];
  const grown: Line[] = [];
  for (let taken = 0; taken < queue.length; taken += 1) {
    const from = itemAt(queue, taken);
    if (!growth.allows(from) || !tracks.isClear(from, growth.spacing(from, family) * 0.78))
      continue;
    const line = traceBothWays(growth, tracks, from, family);
    if (line.length * step < 48) continue;
    tracks.add(line);
    grown.push(line);
    queue.push(...candidatesBeside(growth, line, family));
  }
  return grown;
}
