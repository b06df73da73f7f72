import { footprint } from './footprints.ts';
import type { Footprint, Kind } from './footprints.ts';
import { frameOf } from './frames.ts';
import type { Frame } from './frames.ts';
import { tidy } from './ground-plan.ts';
import type { GroundPlan } from './ground-plan.ts';
import { centroid, nearestOnRing } from './polygons.ts';
import type { Random } from './prng.ts';
import { notchedTower, officeShape, slab } from './templates.ts';
import { along, left, place, scale } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** Builds a ring if it fits, its address read from the nearest street front. */
function tryBuild(
  ring: Ring,
  kind: Kind,
  ground: GroundPlan,
  gap: number,
  rest: Partial<Footprint> = {},
): Footprint[] {
  const shape = tidy(ring);
  if (!ground.fits(shape, gap)) return [];
  ground.build(shape);
  return [footprint(shape, kind, nearestOnRing(centroid(shape), ground.block).point, rest)];
}

/** Draws a shape larger or smaller, and about the middle of a block, until it fits. */
export function fitInto(
  ground: GroundPlan,
  draw: (factor: number) => Ring,
  frame: Frame,
  least: number,
): Ring | null {
  const spots = [centroid(ground.block), frame.centre];
  for (let factor = 1; factor >= least; factor -= 0.06) {
    for (const spot of spots) {
      for (const axis of [frame.axis, scale(frame.axis, -1)]) {
        const ring = tidy(place(draw(factor), spot, axis));
        if (ground.fits(ring)) return ring;
      }
    }
  }
  return null;
}

export function buildOffice(ground: GroundPlan, random: Random): Footprint[] {
  const frame = frameOf(ground.block);
  const shape = random.fork('shape');
  const ring = fitInto(
    ground,
    (factor) =>
      officeShape((frame.long - 5) * factor, (frame.short - 5) * factor, shape.fork('one')),
    frame,
    0.45,
  );
  return ring === null ? [] : tryBuild(ring, 'office', ground, 0);
}

function spots(frame: Frame, long: number, short: number): Point[] {
  const [across, up] = [
    Math.max(1, Math.floor(frame.long / long)),
    Math.max(1, Math.floor(frame.short / short)),
  ];
  return Array.from({ length: across * up }, (_, index) => {
    const [i, j] = [index % across, Math.floor(index / across)];
    const u = ((i + 0.5) / across - 0.5) * frame.long;
    const v = ((j + 0.5) / up - 0.5) * frame.short;
    return along(along(frame.centre, frame.axis, u), left(frame.axis), v);
  });
}

/** Slabs or towers of flats, standing free on lawns. */
export function buildFlats(ground: GroundPlan, random: Random): Footprint[] {
  const frame = frameOf(ground.block);
  if (random.chance(0.3)) {
    return spots(frame, 33, 33).flatMap((spot) =>
      tryBuild(place(notchedTower(random.range(18, 22)), spot, frame.axis), 'flats', ground, 8),
    );
  }
  const turned = frame.short > 44 && random.chance(0.5);
  const axis = turned ? left(frame.axis) : frame.axis;
  const [long, short] = [
    random.range(22, Math.min(46, Math.max(26, (turned ? frame.short : frame.long) - 12))),
    random.range(10.5, 13),
  ];
  const cell = turned ? spots(frame, short + 11, long + 6) : spots(frame, long + 6, short + 11);
  return cell.flatMap((spot) => {
    for (const factor of [1, 0.8, 0.6]) {
      const built = tryBuild(place(slab(long * factor, short), spot, axis), 'flats', ground, 7);
      if (built.length > 0) return built;
    }
    return [];
  });
}

/** A shed of several bays side by side, each bay a building with shared long walls. */
function bays(spot: Point, axis: Point, random: Random, ground: GroundPlan): Footprint[] {
  const [count, wide, long] = [random.whole(1, 4), random.range(7, 10), random.range(13, 25)];
  return Array.from({ length: count }, (_, bay) => {
    const centre = along(spot, axis, (bay - (count - 1) / 2) * wide);
    return tryBuild(
      place(slab(wide, long), centre, axis),
      random.chance(0.3) ? 'warehouse' : 'workshop',
      ground,
      0,
    );
  }).flat();
}

/** Works yards: sheds in rough lines with ways for carts between. */
export function buildWorks(ground: GroundPlan, random: Random): Footprint[] {
  const frame = frameOf(ground.block);
  const places = spots(frame, 34, 30);
  const big = places.flatMap((spot) => {
    const aside: Point = [spot[0] + random.range(-2, 2), spot[1] + random.range(-2, 2)];
    return bays(aside, frame.axis, random, ground);
  });
  const small = spots(frame, 17, 17).flatMap((spot) =>
    random.chance(0.3)
      ? tryBuild(
          place(slab(random.range(5, 9), random.range(4, 6)), spot, frame.axis),
          'outbuilding',
          ground,
          2,
        )
      : [],
  );
  return [...big, ...small];
}
