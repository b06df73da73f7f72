import { nestRings } from './nest-rings.ts';

type Point = readonly [number, number];
type Ring = readonly Point[];
type Edge = { readonly from: Point; readonly to: Point };

function keyOf([x, y]: Point): string {
  return `${x} ${y}`;
}

function turn(ring: Ring): number {
  const [x0, y0] = ring[0] ?? [0, 0];
  let sum = 0;
  let before = ring.at(-1) ?? [0, 0];
  for (const point of ring) {
    sum += (before[0] - x0) * (point[1] - y0) - (point[0] - x0) * (before[1] - y0);
    before = point;
  }
  return sum;
}

/** Outer rings run anticlockwise and holes clockwise, so that what two faces share runs both ways. */
function directed(face: readonly Ring[]): Ring[] {
  return face.map((ring, index) => (turn(ring) > 0 === (index === 0) ? ring : [...ring].reverse()));
}

/** The edges that no neighbour runs back, by where they begin. */
function outerEdges(faces: readonly (readonly Ring[])[]): Map<string, Edge[]> {
  const edges = new Map<string, Edge>();
  for (const ring of faces.flatMap(directed)) {
    let before = ring.at(-1);
    for (const to of ring) {
      const from = before;
      before = to;
      if (from === undefined || keyOf(from) === keyOf(to)) continue;
      const back = `${keyOf(to)} ${keyOf(from)}`;
      if (!edges.delete(back)) edges.set(`${keyOf(from)} ${keyOf(to)}`, { from, to });
    }
  }
  const byStart = new Map<string, Edge[]>();
  for (const edge of edges.values()) {
    const start = keyOf(edge.from);
    byStart.set(start, [...(byStart.get(start) ?? []), edge]);
  }
  return byStart;
}

/** Follows edges from end to start; undefined where a chain does not come back. */
function chained(byStart: Map<string, Edge[]>): Ring[] | undefined {
  const rings: Ring[] = [];
  for (const edges of byStart.values()) {
    for (let edge = edges.pop(); edge !== undefined; edge = edges.pop()) {
      const ring: Point[] = [edge.from];
      const start = keyOf(edge.from);
      let end = edge.to;
      while (keyOf(end) !== start) {
        ring.push(end);
        const next = byStart.get(keyOf(end))?.pop();
        if (next === undefined) return undefined;
        end = next.to;
      }
      rings.push([...ring, edge.from]);
    }
  }
  return rings;
}

/** Joins faces that share edges into parts with holes; faces that overlap or are damaged stay as they are. */
export function dissolveFaces(faces: readonly (readonly Ring[])[]): Ring[][] {
  const flat = faces.filter(([outer]) => outer !== undefined && turn(outer) !== 0);
  const rings = flat.length < 2 ? undefined : chained(outerEdges(flat));
  return rings === undefined || rings.length === 0
    ? flat.map((face) => [...face])
    : nestRings(rings);
}
