import { overlaps } from './overlaps.ts';
import { boundsOf, boxesMeet, distanceToRing, inside, isSimple, signedArea } from './polygons.ts';
import type { Box } from './polygons.ts';
import { between, cyclic, distance } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** Keeps what is built in a block and refuses what would not fit beside it. */
export type GroundPlan = {
  readonly block: Ring;
  readonly fits: (ring: Ring, gap?: number) => boolean;
  readonly build: (ring: Ring) => void;
};

/** Fronts are straight where streets bend, so a house may stand this far out on the footway. */
const outstand = 0.3;

function toMillimetres([x, y]: Point): Point {
  return [Math.round(x * 1000) / 1000, Math.round(y * 1000) / 1000];
}

/** Rounds a ring to millimetres and drops points that fall together. */
export function tidy(ring: Ring): Ring {
  const rounded = ring.map(toMillimetres);
  return rounded.filter((point, index) => {
    const next = rounded[(index + 1) % rounded.length] ?? point;
    return Math.abs(point[0] - next[0]) + Math.abs(point[1] - next[1]) > 0.03;
  });
}

function isClear(ring: Ring, other: Ring, gap: number): boolean {
  if (overlaps(ring, other)) return false;
  if (gap === 0) return true;
  return (
    ring.every((point) => distanceToRing(point, other) >= gap) &&
    other.every((point) => distanceToRing(point, ring) >= gap)
  );
}

/** Points along the edges of a ring, close enough that no lane slips between two of them. */
function alongEdges(ring: Ring): Point[] {
  return ring.flatMap((a, index) => {
    const b = cyclic(ring, index + 1);
    const count = Math.max(1, Math.ceil(distance(a, b) / 2.5));
    return Array.from({ length: count }, (_, part) => between(a, b, part / count));
  });
}

export function makeGroundPlan(block: Ring): GroundPlan {
  const built: { ring: Ring; box: Box }[] = [];
  const box = boundsOf(block);
  function within(ring: Ring): boolean {
    if (!boxesMeet(box, boundsOf(ring))) return false;
    const isOn = (point: Point): boolean =>
      inside(point, block) || distanceToRing(point, block) < outstand;
    const isOver = (point: Point): boolean =>
      inside(point, ring) && distanceToRing(point, ring) > outstand;
    return alongEdges(ring).every(isOn) && !block.some(isOver);
  }
  function fits(ring: Ring, gap = 0): boolean {
    if (ring.length < 3 || signedArea(ring) < 11 || !isSimple(ring) || !within(ring)) return false;
    const own = boundsOf(ring);
    return built.every(
      (other) => !boxesMeet(own, other.box, gap) || isClear(ring, other.ring, gap),
    );
  }
  return { block, fits, build: (ring) => void built.push({ ring, box: boundsOf(ring) }) };
}
