import { footprint } from './footprints.ts';
import type { Footprint, Kind } from './footprints.ts';
import { frameOf } from './frames.ts';
import { makeGroundPlan } from './ground-plan.ts';
import type { GroundPlan } from './ground-plan.ts';
import { nearestEdge } from './landmarks.ts';
import { centroid, signedArea } from './polygons.ts';
import { fitInto } from './set-pieces.ts';
import { combShape, slab, teeShape, youShape } from './templates.ts';
import { distance } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** A landmark that takes the first block with room for it near some place. */
type Wish = {
  readonly name: string;
  readonly kind: Kind;
  readonly near: Point;
  readonly leastArea: number;
  readonly draw: (factor: number) => Ring;
};

const wishes: readonly Wish[] = [
  {
    name: 'Town Hall',
    kind: 'town hall',
    near: [770, 520],
    leastArea: 1900,
    draw: (f) => teeShape(36 * f, 26 * f, 14 * f),
  },
  {
    name: 'Herring Hall',
    kind: 'market hall',
    near: [812, 385],
    leastArea: 1600,
    draw: (f) => combShape(44 * f, 26 * f, 9 * f),
  },
  {
    name: 'Harbour Chapel',
    kind: 'chapel',
    near: [160, 420],
    leastArea: 900,
    draw: (f) => slab(19 * f, 11 * f),
  },
  {
    name: 'Netmakers’ Chapel',
    kind: 'chapel',
    near: [690, 250],
    leastArea: 900,
    draw: (f) => teeShape(20 * f, 16 * f, 10 * f),
  },
  {
    name: 'Lifeboat House',
    kind: 'lifeboat house',
    near: [410, 30],
    leastArea: 500,
    draw: (f) => slab(19 * f, 9.5 * f),
  },
  {
    name: 'Pilot Office',
    kind: 'office',
    near: [150, 330],
    leastArea: 1400,
    draw: (f) => youShape(34 * f, 24 * f, 11 * f),
  },
];

/** Claims for each wish the nearest block that has room, and builds there. */
export function grantWishes(
  blocks: readonly Ring[],
): Map<number, { footprint: Footprint; ground: GroundPlan }> {
  const granted = new Map<number, { footprint: Footprint; ground: GroundPlan }>();
  for (const wish of wishes) {
    const ranked = blocks
      .map((block, index) => ({ block, index, off: distance(centroid(block), wish.near) }))
      .filter(
        ({ block, index, off }) =>
          off < 160 && signedArea(block) > wish.leastArea && !granted.has(index),
      )
      .sort((a, b) => a.off - b.off);
    for (const { block, index } of ranked) {
      const ground = makeGroundPlan(block);
      const ring = fitInto(ground, wish.draw, frameOf(block), 0.9);
      if (ring === null) continue;
      ground.build(ring);
      granted.set(index, {
        footprint: footprint(ring, wish.kind, nearestEdge(centroid(ring), block), {
          name: wish.name,
        }),
        ground,
      });
      break;
    }
  }
  return granted;
}
