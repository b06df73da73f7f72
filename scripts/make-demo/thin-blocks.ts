import { common, largest } from './clip.ts';
import { footprint } from './footprints.ts';
import type { Footprint } from './footprints.ts';
import { frameOf } from './frames.ts';
import { tidy } from './ground-plan.ts';
import type { GroundPlan } from './ground-plan.ts';
import { simplifyRing } from './lines.ts';
import { centroid, nearestOnRing, signedArea } from './polygons.ts';
import type { Random } from './prng.ts';
import { along, distance, left, rectangle } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** Puts points that all but meet a neighbour's on the neighbour's, so that the wall is truly shared. */
function snapTo(ring: Ring, neighbour: Ring): Ring {
  return ring.map(
    (point): Point => neighbour.find((other) => distance(other, point) < 0.01) ?? point,
  );
}

/** Houses that go right through a block too thin for two rows back to back. */
export function buildThrough(ground: GroundPlan, random: Random): Footprint[] {
  const frame = frameOf(ground.block);
  const side = left(frame.axis);
  const start = along(frame.centre, frame.axis, -frame.long / 2);
  const built: Footprint[] = [];
  let [from, last]: [number, Ring] = [0, []];
  while (from < frame.long - 3) {
    const drawn = from + random.range(5.2, 9.6);
    const to = frame.long - drawn < 4 ? frame.long + 1 : drawn;
    const slice = rectangle(
      along(start, frame.axis, (from + to) / 2),
      side,
      frame.short + 8,
      to - from,
    );
    const piece = largest(common([ground.block], [slice]));
    from = to;
    if (piece === null || random.chance(0.05)) continue;
    const ring = tidy(snapTo(tidy(simplifyRing(piece, 0.02)), last));
    if (signedArea(ring) < 22 || !ground.fits(ring)) continue;
    ground.build(ring);
    last = ring;
    const front = nearestOnRing(along(centroid(ring), side, frame.short), ground.block).point;
    built.push(
      footprint(ring, random.chance(0.5) ? 'shop' : 'terraced house', front, { row: 'through' }),
    );
  }
  return built;
}
