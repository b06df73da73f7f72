import { addressAll } from './addresses.ts';
import type { Address } from './addresses.ts';
import { findBlocks } from './blocks.ts';
import { chooseStyle } from './block-styles.ts';
import { makeField } from './field.ts';
import { fillAround, fillBlock } from './fill-block.ts';
import type { Filled } from './fill-block.ts';
import type { Footprint } from './footprints.ts';
import { buildKeepersHouse, buildOnSites } from './landmarks.ts';
import { buildQuayHuts } from './quay-huts.ts';
import { grantWishes } from './wishes.ts';
import { cutByLanes } from './lanes.ts';
import { createStreetFinder, nameStreets } from './named-streets.ts';
import type { Street, StreetFinder } from './named-streets.ts';
import { overlaps } from './overlaps.ts';
import { centroid } from './polygons.ts';
import { createRandom } from './prng.ts';
import type { Random } from './prng.ts';
import { makeSites } from './sites.ts';
import type { Site } from './sites.ts';
import { layStreets } from './streets.ts';
import { makeTerrain } from './terrain.ts';
import type { Terrain } from './terrain.ts';
import { pinStyles } from './style-pins.ts';
import { treesInBlock, treesOnSites } from './trees.ts';
import type { Tree } from './trees.ts';
import { itemAt } from './vector.ts';
import type { Line, Ring } from './vector.ts';
import { makeWater } from './water.ts';

type Block = { readonly ring: Ring; readonly filled: Filled };
export type Town = {
  readonly terrain: Terrain;
  readonly sites: readonly Site[];
  readonly streets: readonly Street[];
  readonly blocks: readonly Block[];
  readonly footprints: readonly Footprint[];
  readonly addresses: ReadonlyMap<Footprint, Address>;
  readonly walls: readonly Line[];
  readonly trees: readonly Tree[];
};

/** How many times the small town's size the bank must be for so many buildings. */
function growthFor(buildings: number): number {
  const each = 2500 + 0.0038 * Math.min(buildings, 100_000);
  return buildings <= 2200 ? 1 : Math.sqrt(buildings / each + 0.15);
}

/** Whether a front looks on to one of the busier streets. */
function isBusy(find: StreetFinder, front: readonly [number, number]): boolean {
  const kind = find(front)?.street.class;
  return kind === 'main' || kind === 'quay' || kind === 'square';
}

/** Fills blocks from the old town outwards until there are buildings enough; the rest stay fields. */
function fillTown(
  rings: readonly Ring[],
  terrain: Terrain,
  find: StreetFinder,
  wanted: number,
  random: Random,
): Block[] {
  const granted = grantWishes(rings);
  const pinned = pinStyles(rings, new Set(granted.keys()));
  const out = rings.map((ring) => terrain.turn(centroid(ring)));
  const order = [...rings.keys()].sort((a, b) => itemAt(out, a) - itemAt(out, b));
  const sense = { isBusy: (front: readonly [number, number]) => isBusy(find, front) };
  let left = wanted;
  return order.map((index) => {
    const ring = itemAt(rings, index);
    const own = random.fork(index);
    const claim = granted.get(index);
    const style = left > 0 ? (pinned.get(index) ?? chooseStyle(ring, terrain, own)) : 'green';
    const filled =
      claim === undefined
        ? fillBlock(ring, style, sense, own)
        : fillAround(claim.ground, claim.footprint, style, sense, own);
    left -= filled.footprints.length;
    return { ring, filled };
  });
}

function isOffStreets(
  find: StreetFinder,
  landmarks: readonly Footprint[],
): (ring: Ring) => boolean {
  return (ring) =>
    ring.every((point) => (find(point)?.off ?? 99) > 0.8) &&
    !landmarks.some((landmark) => overlaps(landmark.ring, ring));
}

/** Streets that no building looks on to are tracks over the fields. */
function markTracks(
  streets: readonly Street[],
  footprints: readonly Footprint[],
  find: StreetFinder,
): Street[] {
  const fronted = new Set(footprints.map(({ front }) => find(front)?.street.id));
  return streets.map((street) =>
    (street.class !== 'street' && street.class !== 'lane') ||
    fronted.has(street.id) ||
    street.name.includes('Park')
      ? street
      : { ...street, class: 'track', width: 2.6 },
  );
}

/** Makes the whole town for a number of buildings. */
export function makeTown(buildings: number, seed: number): Town {
  const random = createRandom(seed);
  const water = makeWater(growthFor(buildings), seed);
  const sites = makeSites();
  const terrain = makeTerrain(water, sites);
  const raw = layStreets(
    terrain,
    makeField(water.quayLine, water.coast, seed),
    random.fork('streets'),
  );
  const { blocks: open, links } = findBlocks(terrain, raw);
  const { blocks: rings, lanes } = cutByLanes(open, terrain, random.fork('lanes'));
  const streets = nameStreets([...raw, ...links, ...lanes], random.fork('names'));
  const find = createStreetFinder(streets);
  const landmarks = [...buildOnSites(sites), buildKeepersHouse(water)];
  const huts = buildQuayHuts(water, isOffStreets(find, landmarks));
  const standing = [...landmarks, ...huts];
  const blocks = fillTown(rings, terrain, find, buildings - standing.length, random.fork('blocks'));
  const footprints = [...standing, ...blocks.flatMap(({ filled }) => filled.footprints)];
  const trees = blocks.flatMap(({ ring, filled }, index) =>
    treesInBlock(ring, filled, random.fork(`trees ${index}`)),
  );
  return {
    terrain,
    sites,
    streets: markTracks(streets, footprints, find),
    blocks,
    footprints,
    addresses: addressAll(footprints, find),
    walls: blocks.flatMap(({ filled }) => filled.walls),
    trees: [
      ...treesOnSites(
        sites,
        standing.map(({ ring }) => ring),
        random.fork('trees'),
      ),
      ...trees,
    ],
  };
}
