import { Clipper, EndType, FillRule, JoinType } from 'clipper2-ts';
import type { Path64, Paths64 } from 'clipper2-ts';
import { signedArea } from './polygons.ts';
import type { Line, Point, Ring } from './vector.ts';

/** Clipping works in whole millimetres, so that it never meets a rounding error. */
const perMetre = 1000;

function toPath(line: Line): Path64 {
  return line.map(([x, y]) => ({ x: Math.round(x * perMetre), y: Math.round(y * perMetre) }));
}

function toPaths(lines: readonly Line[]): Paths64 {
  return lines.map(toPath);
}

function toRings(paths: Paths64): Ring[] {
  return paths.map((path) => path.map(({ x, y }): Point => [x / perMetre, y / perMetre]));
}

export function unite(rings: readonly Ring[]): Ring[] {
  return toRings(Clipper.union(toPaths(rings), FillRule.NonZero));
}

export function cut(from: readonly Ring[], tool: readonly Ring[]): Ring[] {
  return toRings(Clipper.difference(toPaths(from), toPaths(tool), FillRule.NonZero));
}

export function common(a: readonly Ring[], b: readonly Ring[]): Ring[] {
  return toRings(Clipper.intersect(toPaths(a), toPaths(b), FillRule.NonZero));
}

/** Rings moved outwards, or inwards for a negative distance. */
export function offset(rings: readonly Ring[], by: number, corners: 'round' | 'sharp'): Ring[] {
  const join = corners === 'round' ? JoinType.Round : JoinType.Miter;
  return toRings(
    Clipper.inflatePaths(
      toPaths(rings),
      by * perMetre,
      join,
      EndType.Polygon,
      2.5,
      0.08 * perMetre,
    ),
  );
}

/** The strip a line leaves when drawn with a pen of some width. */
export function strip(line: Line, width: number, ends: 'flat' | 'round'): Ring[] {
  const end = ends === 'flat' ? EndType.Butt : EndType.Round;
  const half = (width / 2) * perMetre;
  return toRings(
    Clipper.inflatePaths([toPath(line)], half, JoinType.Round, end, 2, 0.08 * perMetre),
  );
}

export function outers(rings: readonly Ring[]): Ring[] {
  return rings.filter((ring) => signedArea(ring) > 0);
}

export function holes(rings: readonly Ring[]): Ring[] {
  return rings.filter((ring) => signedArea(ring) < 0);
}

export function largest(rings: readonly Ring[]): Ring | null {
  return outers(rings).reduce<Ring | null>(
    (best, ring) => (best === null || signedArea(ring) > signedArea(best) ? ring : best),
    null,
  );
}
