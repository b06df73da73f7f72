import type { Filled } from './fill-block.ts';
import { boundsOf, distanceToRing, inside, signedArea } from './polygons.ts';
import type { Random } from './prng.ts';
import type { Site } from './sites.ts';
import { distance } from './vector.ts';
import type { Point, Ring } from './vector.ts';

export type Tree = { readonly at: Point; readonly radius: number };

/** Scatters trees in a ring, clear of its edge, of buildings and of one another. */
function scatter(
  ring: Ring,
  count: number,
  gap: number,
  built: readonly Ring[],
  random: Random,
): Tree[] {
  const [west, south, east, north] = boundsOf(ring);
  const trees: Tree[] = [];
  for (let tries = 0; tries < count * 4 && trees.length < count; tries += 1) {
    const at: Point = [random.range(west, east), random.range(south, north)];
    const radius = random.range(1.5, 3.3);
    if (!inside(at, ring) || distanceToRing(at, ring) < radius + 0.6) continue;
    if (trees.some((tree) => distance(tree.at, at) < gap)) continue;
    if (built.some((other) => inside(at, other) || distanceToRing(at, other) < radius * 0.9))
      continue;
    trees.push({ at, radius: Math.round(radius * 10) / 10 });
  }
  return trees;
}

export function treesOnSites(
  sites: readonly Site[],
  built: readonly Ring[],
  random: Random,
): Tree[] {
  return sites.flatMap((site, index) => {
    const perTree = { park: 210, churchyard: 130, school: 420, square: 0, quay: 0, works: 0 }[
      site.kind
    ];
    if (perTree === 0) return [];
    return scatter(
      site.ring,
      Math.round(signedArea(site.ring) / perTree),
      6,
      built,
      random.fork(index),
    );
  });
}

const perTree = {
  villas: 190,
  flats: 230,
  green: 620,
  terrace: 700,
  court: 420,
  old: 1500,
  office: 600,
  stores: 0,
  works: 0,
};

export function treesInBlock(block: Ring, filled: Filled, random: Random): Tree[] {
  const each = perTree[filled.style];
  if (each === 0) return [];
  return scatter(
    block,
    Math.round(signedArea(block) / each),
    5,
    filled.footprints.map(({ ring }) => ring),
    random,
  );
}
