import { laneReach, reachOf, reserveOf } from './blocks.ts';
import { cut, outers, strip } from './clip.ts';
import { frameOf } from './frames.ts';
import { simplifyRing, spline } from './lines.ts';
import type { RawStreet } from './main-streets.ts';
import { centroid, inside, signedArea } from './polygons.ts';
import type { Random } from './prng.ts';
import type { Terrain } from './terrain.ts';
import { along, itemAt, left, scale } from './vector.ts';
import type { Line, Ring } from './vector.ts';

/** A crooked lane across the longer side of a block, or null where none fits. */
function laneAcross(ring: Ring, random: Random): Line | null {
  const frame = frameOf(ring);
  const middle = along(centroid(ring), frame.axis, random.range(-0.16, 0.16) * frame.long);
  if (!inside(middle, ring)) return null;
  const skew = random.range(-0.16, 0.16);
  const way = along(left(frame.axis), frame.axis, skew);
  const [ahead, behind] = [reachOf(ring, middle, way), reachOf(ring, middle, scale(way, -1))];
  if (ahead === null || behind === null || ahead + behind > 240) return null;
  const bend = random.range(-0.05, 0.05) * (ahead + behind);
  const points: Line = [
    along(middle, way, -behind - laneReach),
    along(along(middle, way, -behind * 0.45), frame.axis, bend),
    along(along(middle, way, ahead * 0.45), frame.axis, -bend),
    along(middle, way, ahead + laneReach),
  ];
  return spline(points, 5);
}

/** In a bent block the first try may miss: several are made before the block is left whole. */
function tryLanes(ring: Ring, random: Random): Line | null {
  for (let tries = 0; tries < 5; tries += 1) {
    const line = laneAcross(ring, random);
    if (line !== null) return line;
  }
  return null;
}

type Cutting = { readonly blocks: Ring[]; readonly lanes: RawStreet[] };

/** Cuts blocks that are too large for their place by lanes, again and again. */
export function cutByLanes(blocks: readonly Ring[], terrain: Terrain, random: Random): Cutting {
  const lanes: RawStreet[] = [];
  const done: Ring[] = [];
  const queue = blocks.map((ring) => ({ ring, depth: 0 }));
  for (let taken = 0; taken < queue.length; taken += 1) {
    const { ring, depth } = itemAt(queue, taken);
    const age = terrain.age(centroid(ring));
    const limit = age < 0.8 ? random.range(2100, 3600) : random.range(4600, 7800);
    const own = random.fork(taken);
    const line = signedArea(ring) > limit && depth < 5 ? tryLanes(ring, own) : null;
    if (line === null) {
      done.push(ring);
      continue;
    }
    const width = age < 0.8 ? own.range(2.8, 3.8) : own.range(4, 5.2);
    const lane: RawStreet = { line, width, class: 'lane', name: null, fixed: false };
    lanes.push(lane);
    const parts = outers(cut([ring], strip(line, reserveOf(lane), 'round')));
    queue.push(...parts.map((part) => ({ ring: simplifyRing(part, 0.2), depth: depth + 1 })));
  }
  return { blocks: done.filter((ring) => signedArea(ring) > 90), lanes };
}
