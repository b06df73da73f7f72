import Flatbush from 'flatbush';
import * as polyclip from 'polyclip-ts';
import { footprintArea } from '../../shared/building/footprint-area.ts';
import { ringCrossing } from '../../shared/geometry/ring-crossing.ts';
import type { Box } from '../../shared/geometry/bounding-box.ts';
import { pointInPolygon } from '../../shared/geometry/point-in-polygon.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { unpacked, type StoredFootprint } from './footprint-store.ts';

export type Overlap = { readonly row: number; readonly other: number; readonly area: number };

/** Edges that reach less than this over each other belong to a shared wall, in metres. */
const SHARED = 0.05;
/** Overlaps of less than this, in square metres, are noise. */
const LEAST = 1;
/** A file that is one heap of overlaps says so with fewer. */
const MOST = 20_000;

type Unpacked = ReturnType<typeof ringsOf>;

function ringsOf({ rings }: StoredFootprint) {
  return rings.map((part) => part.map(unpacked));
}

type Drawn = { readonly box: Box; readonly rings: Unpacked };

function holdsBox(outer: Box, inner: Box): boolean {
  const [west, south] = [inner.west - outer.west, inner.south - outer.south];
  const [east, north] = [outer.east - inner.east, outer.north - inner.north];
  return Math.min(west, south, east, north) > -SHARED;
}

/** Whether one may lie in the other; neighbours that share a wall mostly do not. */
function isInside(one: Drawn, other: Drawn): boolean {
  if (!holdsBox(other.box, one.box)) return false;
  const corner = one.rings[0]?.[0]?.[0];
  return corner !== undefined && other.rings.some((part) => pointInPolygon(corner, part));
}

function mayOverlap(one: Drawn, other: Drawn): boolean {
  const both = [...one.rings.flat(), ...other.rings.flat()];
  return ringCrossing(both, SHARED) !== undefined || isInside(one, other) || isInside(other, one);
}

function overlapArea(one: Unpacked, other: Unpacked): number {
  const mutable = (parts: Unpacked) =>
    parts.map((part) => part.map((ring) => ring.map(([x, y]): [number, number] => [x, y])));
  try {
    const common: FootprintRings = polyclip.intersection(mutable(one), mutable(other));
    return footprintArea(common);
  } catch {
    // what it cannot cut is no reason to stop an import
    return 0;
  }
}

/** Footprints of a file that lie over earlier ones by more than a shared wall. */
export function findOverlaps(all: readonly StoredFootprint[]): Overlap[] {
  if (all.length < 2) return [];
  const index = new Flatbush(all.length);
  for (const { west, south, east, north } of all) index.add(west, south, east, north);
  index.finish();
  const found: Overlap[] = [];
  for (const [at, one] of all.entries()) {
    const near = index.search(
      one.west + SHARED, one.south + SHARED, one.east - SHARED, one.north - SHARED,
      (other) => other < at,
    ); // prettier-ignore
    const drawn = { box: one, rings: ringsOf(one) };
    for (const other of near
      .sort((a, b) => a - b)
      .map((place) => all[place])
      .filter((stored) => stored !== undefined)) {
      const others = { box: other, rings: ringsOf(other) };
      if (!mayOverlap(drawn, others)) continue;
      const area = overlapArea(drawn.rings, others.rings);
      if (area > LEAST) found.push({ row: one.row, other: other.row, area });
      if (found.length === MOST) return found;
    }
  }
  return found;
}
