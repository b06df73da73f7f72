import { between, cyclic, direction, distance, itemAt } from './vector.ts';
import type { Line, Point, Ring } from './vector.ts';

/** Lengths from the start of a line to each of its points. */
export function chainages(line: Line): number[] {
  let sum = 0;
  return line.map((point, index) => {
    sum += index === 0 ? 0 : distance(point, itemAt(line, index - 1));
    return sum;
  });
}

export function lineLength(line: Line): number {
  return chainages(line).at(-1) ?? 0;
}

/** The point at a length along a line, and the direction of the line there. */
export function pointAt(line: Line, chainage: number): { point: Point; heading: Point } {
  let left = chainage;
  for (let index = 0; index + 1 < line.length; index += 1) {
    const [a, b] = [itemAt(line, index), itemAt(line, index + 1)];
    const size = distance(a, b);
    if (left <= size || index + 2 === line.length) {
      return {
        point: between(a, b, size === 0 ? 0 : Math.min(1, left / size)),
        heading: direction(a, b),
      };
    }
    left -= size;
  }
  return { point: itemAt(line, 0), heading: [1, 0] };
}

/** The part of a line between two lengths along it. */
export function slice(line: Line, from: number, to: number): Line {
  const stations = chainages(line);
  const inside = line.filter((_, index) => {
    const station = itemAt(stations, index);
    return station > from + 0.05 && station < to - 0.05;
  });
  return [pointAt(line, from).point, ...inside, pointAt(line, to).point];
}

/** A line with its points spread evenly, about `step` apart. */
export function resample(line: Line, step: number): Line {
  const total = lineLength(line);
  const count = Math.max(1, Math.round(total / step));
  return Array.from(
    { length: count + 1 },
    (_, index) => pointAt(line, (total * index) / count).point,
  );
}

function splinePoint(p: readonly [Point, Point, Point, Point], t: number): Point {
  function part(axis: 0 | 1): number {
    const [a, b, c, d] = [p[0][axis], p[1][axis], p[2][axis], p[3][axis]];
    return (
      0.5 *
      (2 * b +
        (c - a) * t +
        (2 * a - 5 * b + 4 * c - d) * t * t +
        (3 * b - a - 3 * c + d) * t * t * t)
    );
  }
  return [part(0), part(1)];
}

/** A smooth open line through some points (Catmull and Rom's spline). */
export function spline(points: Line, perSpan = 10): Line {
  const last = points.length - 1;
  const near = (index: number): Point => itemAt(points, Math.max(0, Math.min(last, index)));
  const curve: Point[] = [];
  for (let span = 0; span < last; span += 1) {
    for (let part = 0; part < perSpan; part += 1) {
      const four = [near(span - 1), near(span), near(span + 1), near(span + 2)] as const;
      curve.push(splinePoint(four, part / perSpan));
    }
  }
  return [...curve, near(last)];
}

/** A smooth closed line through some points. */
export function closedSpline(points: Ring, perSpan = 8): Ring {
  return points.flatMap((_, span) => {
    const four = [-1, 0, 1, 2].map((step) => cyclic(points, span + step));
    const [a, b, c, d] = [itemAt(four, 0), itemAt(four, 1), itemAt(four, 2), itemAt(four, 3)];
    return Array.from({ length: perSpan }, (_unused, part) =>
      splinePoint([a, b, c, d], part / perSpan),
    );
  });
}

function farthest(line: Line): { index: number; offset: number } {
  const [start, end] = [itemAt(line, 0), itemAt(line, line.length - 1)];
  const size = Math.max(distance(start, end), 1e-9);
  let found = { index: 0, offset: 0 };
  for (let index = 1; index + 1 < line.length; index += 1) {
    const [x, y] = itemAt(line, index);
    const area = (end[0] - start[0]) * (y - start[1]) - (end[1] - start[1]) * (x - start[0]);
    const offset = size < 1e-6 ? distance([x, y], start) : Math.abs(area) / size;
    if (offset > found.offset) found = { index, offset };
  }
  return found;
}

/** Drops points that lie within `tolerance` of the line without them (Douglas and Peucker). */
export function simplify(line: Line, tolerance: number): Line {
  if (line.length < 3) return line;
  const { index, offset } = farthest(line);
  if (offset <= tolerance) return [itemAt(line, 0), itemAt(line, line.length - 1)];
  const head = simplify(line.slice(0, index + 1), tolerance);
  return [...head.slice(0, -1), ...simplify(line.slice(index), tolerance)];
}

/** The same for a ring, which is first opened at two points far from one another. */
export function simplifyRing(ring: Ring, tolerance: number): Ring {
  const start = itemAt(ring, 0);
  const opposite = ring.reduce(
    (best, point, index) =>
      distance(point, start) > best.size ? { index, size: distance(point, start) } : best,
    { index: 0, size: 0 },
  ).index;
  const there = simplify(ring.slice(0, opposite + 1), tolerance);
  const back = simplify([...ring.slice(opposite), start], tolerance);
  return [...there.slice(0, -1), ...back.slice(0, -1)];
}
