import Delaunator from 'delaunator';
import Flatbush from 'flatbush';
import type { Sampler, Spots } from './ground.ts';

/** A point on an edge belongs to the triangle. */
const EDGE = 1e-9;

type Point = readonly [x: number, y: number, level: number];

/** The level on a plane through three points, undefined outside of their triangle. */
function onTriangle([a, b, c]: readonly [Point, Point, Point], x: number, y: number) {
  const twice = (b[0] - a[0]) * (c[1] - a[1]) - (c[0] - a[0]) * (b[1] - a[1]);
  if (twice === 0) return undefined;
  const shareB = ((x - a[0]) * (c[1] - a[1]) - (c[0] - a[0]) * (y - a[1])) / twice;
  const shareC = ((b[0] - a[0]) * (y - a[1]) - (x - a[0]) * (b[1] - a[1])) / twice;
  const shareA = 1 - shareB - shareC;
  if (Math.min(shareA, shareB, shareC) < -EDGE) return undefined;
  return shareA * a[2] + shareB * b[2] + shareC * c[2];
}

/** Joins spot heights by triangles and reads levels on them; outside, the nearest point tells. */
export function spotSampler({ points }: Spots): Sampler {
  const count = points.length / 3;
  const [x0, y0] = [points[0] ?? 0, points[1] ?? 0];
  const pointAt = (k: number): Point => [
    (points[3 * k] ?? NaN) - x0,
    (points[3 * k + 1] ?? NaN) - y0,
    points[3 * k + 2] ?? NaN,
  ];
  const flat = new Float64Array(2 * count);
  const near = new Flatbush(count);
  for (let k = 0; k < count; k += 1) {
    const [x, y] = pointAt(k);
    flat.set([x, y], 2 * k);
    near.add(x, y, x, y);
  }
  near.finish();
  const { triangles } = new Delaunator(flat);
  const cornersOf = (triangle: number): [Point, Point, Point] => [
    pointAt(triangles[3 * triangle] ?? 0),
    pointAt(triangles[3 * triangle + 1] ?? 0),
    pointAt(triangles[3 * triangle + 2] ?? 0),
  ];
  const boxes = triangles.length === 0 ? undefined : new Flatbush(triangles.length / 3);
  for (let k = 0; boxes !== undefined && k < triangles.length / 3; k += 1) {
    const [a, b, c] = cornersOf(k);
    boxes.add(
      ...([Math.min(a[0], b[0], c[0]), Math.min(a[1], b[1], c[1])] as const),
      ...([Math.max(a[0], b[0], c[0]), Math.max(a[1], b[1], c[1])] as const),
    );
  }
  boxes?.finish();
  return ([east, north]) => {
    const [x, y] = [east - x0, north - y0];
    for (const triangle of boxes?.search(x, y, x, y) ?? []) {
      const level = onTriangle(cornersOf(triangle), x, y);
      if (level !== undefined) return { level, isNearest: false };
    }
    const [nearest] = near.neighbors(x, y, 1);
    return nearest === undefined ? null : { level: pointAt(nearest)[2], isNearest: true };
  };
}
