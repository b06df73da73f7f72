import { polygonArea } from '../../shared/geometry/polygon-area.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

type Ring = readonly PlanPoint[];

/** Corners nearer than this, in metres, are one. */
const ONE_CORNER = 0.001;

function isOne([x, y]: PlanPoint, [otherX, otherY]: PlanPoint): boolean {
  return Math.abs(x - otherX) < ONE_CORNER && Math.abs(y - otherY) < ONE_CORNER;
}

/** The corners of a ring, each once: without repeats, and without spikes that go out and back. */
function corners(ring: Ring): PlanPoint[] {
  const kept: PlanPoint[] = [];
  for (const corner of ring) {
    const [last, before] = [kept.at(-1), kept.at(-2)];
    if (last !== undefined && isOne(last, corner)) continue;
    if (before !== undefined && isOne(before, corner)) kept.pop();
    else kept.push(corner);
  }
  const ends = () => [kept[0], kept.at(-1)] as const;
  for (let [first, last] = ends(); kept.length > 1 && first && last && isOne(first, last);) {
    kept.pop();
    [first, last] = ends();
  }
  return kept;
}

/** A ring closed, running anticlockwise or not; undefined where it has fewer than three corners. */
function cleanRing(ring: Ring, anticlockwise: boolean): Ring | undefined {
  const kept = corners(ring);
  const [first] = kept;
  if (first === undefined || kept.length < 3) return undefined;
  const turned = polygonArea(kept) > 0 === anticlockwise ? kept : [first, ...kept.slice(1).reverse()]; // prettier-ignore
  return [...turned, first];
}

/**
 * A footprint with its rings closed, repeated corners dropped, outer rings anticlockwise and holes
 * clockwise; holes without area are left out. Undefined where an outer ring has fewer than three corners.
 */
export function cleanRings(parts: FootprintRings): FootprintRings | undefined {
  const cleaned: (readonly Ring[])[] = [];
  for (const [outer = [], ...holes] of parts) {
    const ring = cleanRing(outer, true);
    if (ring === undefined) return undefined;
    const inner = holes.map((hole) => cleanRing(hole, false)).filter((hole) => hole !== undefined);
    cleaned.push([ring, ...inner]);
  }
  return cleaned.length === 0 ? undefined : cleaned;
}
