import * as polyclip from 'polyclip-ts';
import { footprintArea } from '../../shared/building/footprint-area.ts';
import type { Box } from '../../shared/geometry/bounding-box.ts';
import { pointInPolygon } from '../../shared/geometry/point-in-polygon.ts';
import { polygonArea } from '../../shared/geometry/polygon-area.ts';
import { ringCrossing } from '../../shared/geometry/ring-crossing.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

/** A footprint with the box around it, in the scheme's grid. */
export type Outlined = { readonly box: Box; readonly rings: FootprintRings };

/** Edges that reach less than this over each other belong to a shared wall, in metres. */
export const SHARED = 0.05;
/** Overlaps of less than this, in square metres, are noise. */
const LEAST = 1;

function holdsBox(outer: Box, inner: Box): boolean {
  const [west, south] = [inner.west - outer.west, inner.south - outer.south];
  const [east, north] = [outer.east - inner.east, outer.north - inner.north];
  return Math.min(west, south, east, north) > -SHARED;
}

/** Whether one may lie in the other; neighbours that share a wall mostly do not. */
function isInside(one: Outlined, other: Outlined): boolean {
  if (!holdsBox(other.box, one.box)) return false;
  const corner = one.rings[0]?.[0]?.[0];
  return corner !== undefined && other.rings.some((part) => pointInPolygon(corner, part));
}

type Ring = FootprintRings[number][number];

/** The middles of a ring's edges, moved off a shared wall: to its inside, whichever way it runs. */
function innerMiddles(ring: Ring): [number, number][] {
  const edges = ring.slice(1).map(([x, y], k) => [...(ring[k] ?? [x, y]), x, y] as const);
  const turn = Math.sign(polygonArea(ring));
  return edges.flatMap(([x0, y0, x1, y1]): [number, number][] => {
    const length = Math.hypot(x1 - x0, y1 - y0);
    if (length === 0) return [];
    const aside = (turn * SHARED) / length;
    return [[(x0 + x1) / 2 - (y1 - y0) * aside, (y0 + y1) / 2 + (x1 - x0) * aside]];
  });
}

/** Whether one reaches into the other along an edge of its own, as houses of a row do that stand in line. */
function reachesInto(one: Outlined, other: Outlined): boolean {
  const middles = one.rings.flatMap(([outer = []]) => innerMiddles(outer));
  return middles.some((point) => other.rings.some((part) => pointInPolygon(point, part)));
}

function mayOverlap(one: Outlined, other: Outlined): boolean {
  const both = [...one.rings.flat(), ...other.rings.flat()];
  if (ringCrossing(both, SHARED) !== undefined) return true;
  if (isInside(one, other) || isInside(other, one)) return true;
  return reachesInto(one, other) || reachesInto(other, one);
}

function commonArea(one: FootprintRings, other: FootprintRings): number {
  const mutable = (parts: FootprintRings) =>
    parts.map((part) => part.map((ring) => ring.map(([x, y]): [number, number] => [x, y])));
  try {
    const common: FootprintRings = polyclip.intersection(mutable(one), mutable(other));
    return footprintArea(common);
  } catch {
    // what it cannot cut is no reason to stop
    return 0;
  }
}

/** By how much two footprints lie over each other, in square metres; 0 where they share a wall only. */
export function overlapArea(one: Outlined, other: Outlined): number {
  const area = mayOverlap(one, other) ? commonArea(one.rings, other.rings) : 0;
  return area > LEAST ? area : 0;
}
