import * as polyclip from 'polyclip-ts';
import { footprintArea } from '../../shared/building/footprint-area.ts';
import { boundingBox, type Box } from '../../shared/geometry/bounding-box.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

type Ring = readonly PlanPoint[];
type BoxedRing = { readonly ring: Ring; readonly box: Box };

/** Boxes that reach less than this over each other, in metres, only touch. */
const TOUCH = 0.001;
/** What is counted twice, or taken off twice, and is less than this in square metres is noise. */
const LEAST = 0.01;

/** How often a ring turns about itself, as a whole: once where it is simple, though it may touch itself. */
function turns(ring: Ring): number {
  const corners = ring.slice(0, -1);
  let sum = 0;
  for (const [at, [x, y]] of corners.entries()) {
    const [[x0, y0], [x1, y1]] = [corners.at(at - 1) ?? [x, y], corners[(at + 1) % corners.length] ?? [x, y]]; // prettier-ignore
    const [ax, ay, bx, by] = [x - x0, y - y0, x1 - x, y1 - y];
    sum += Math.atan2(ax * by - ay * bx, ax * bx + ay * by);
  }
  return Math.abs(Math.round(sum / (2 * Math.PI)));
}

/** A corner that a ring comes to twice; else its first. */
function knotOf(ring: Ring): PlanPoint | undefined {
  const seen = new Set<string>();
  const again = ring.slice(0, -1).find(([x, y]) => {
    const key = `${x.toFixed(3)} ${y.toFixed(3)}`;
    return seen.size === seen.add(key).size;
  });
  return again ?? ring[0];
}

function boxed(ring: Ring): BoxedRing {
  return { ring, box: boundingBox(ring) };
}

function lap({ box: a }: BoxedRing, { box: b }: BoxedRing): boolean {
  const wide = Math.min(a.east, b.east) - Math.max(a.west, b.west);
  const high = Math.min(a.north, b.north) - Math.max(a.south, b.south);
  return wide > TOUCH && high > TOUCH;
}

/** Where one of some rings may lie over an earlier one, by their boxes. */
function lapOf(rings: readonly BoxedRing[]): PlanPoint | undefined {
  const over = rings.find((one, at) => rings.slice(0, at).some((other) => lap(one, other)));
  return over?.ring[0];
}

/** A place where rings may lie over each other without their edges crossing; cheap, and often wrong. */
function suspect(footprint: FootprintRings): PlanPoint | undefined {
  const wound = footprint.flat().find((ring) => turns(ring) !== 1);
  if (wound !== undefined) return knotOf(wound);
  const holes = footprint.map(([, ...inner]) => lapOf(inner.map(boxed)));
  const outers = footprint.flatMap(([outer]) => (outer === undefined ? [] : [boxed(outer)]));
  return holes.find((one) => one !== undefined) ?? lapOf(outers);
}

/** The area that is inside, each square metre once; undefined where it cannot be told. */
function areaOnce(footprint: FootprintRings): number | undefined {
  const parts = footprint.map((part) => part.map((ring) => ring.map(([x, y]): [number, number] => [x, y]))); // prettier-ignore
  try {
    const united: FootprintRings = polyclip.union(parts);
    return footprintArea(united);
  } catch {
    return undefined;
  }
}

/**
 * Where rings that cross in corners only, or run along each other, lie over each other all the same: a ring
 * tied in a knot at a corner, parts or holes that cover each other. Undefined where none do.
 */
export function lappedRings(footprint: FootprintRings): PlanPoint | undefined {
  const place = suspect(footprint);
  if (place === undefined) return undefined;
  const area = areaOnce(footprint);
  const isCounted = area === undefined || Math.abs(area - footprintArea(footprint)) < LEAST;
  return isCounted ? undefined : place;
}
