import { cut, holes, offset, outers, strip } from './clip.ts';
import { frameOf } from './frames.ts';
import { createGridIndex } from './grid-index.ts';
import { simplifyRing, spline } from './lines.ts';
import type { RawStreet, StreetClass } from './main-streets.ts';
import { centroid, crossing, inside, signedArea } from './polygons.ts';
import type { Box } from './polygons.ts';
import type { Terrain } from './terrain.ts';
import { along, cyclic, distance, fromAngle, itemAt, left, scale } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** How far a lane runs on into the street it meets: to its carriageway, and no further than a lane is wide. */
export const laneReach = 2.4;

const footways: Record<StreetClass, number> = {
  main: 2.2,
  quay: 1.8,
  street: 1.5,
  lane: 0.8,
  square: 2.2,
  bridge: 1.2,
  track: 1.5,
};

/** From house front to house front. */
export function reserveOf(street: RawStreet): number {
  return street.width + 2 * footways[street.class];
}

/** A round patch where two streets end together, so that the corner between them is filled. */
function cornerPatches(streets: readonly RawStreet[]): Ring[] {
  const ends = createGridIndex<{ street: number; end: number; at: Point }>(20);
  const all = streets.flatMap(({ line }, street) =>
    [itemAt(line, 0), cyclic(line, -1)].map((at, end) => ({ street, end, at })),
  );
  for (const end of all) ends.add([end.at[0], end.at[1], end.at[0], end.at[1]], end);
  return all.flatMap(({ street, end: own, at }) => {
    const box: Box = [at[0] - 4, at[1] - 4, at[0] + 4, at[1] + 4];
    const others = ends
      .near(box)
      .filter(
        (other) => (other.street !== street || other.end !== own) && distance(other.at, at) < 4,
      );
    const widths = [street, ...others.map((other) => other.street)].map((index) =>
      reserveOf(itemAt(streets, index)),
    );
    const radius = Math.min(...widths) / 2;
    return others.length === 0 ? [] : [regular(at, radius)];
  });
}

function regular(centre: Point, radius: number): Ring {
  return Array.from({ length: 20 }, (_, index) =>
    along(centre, fromAngle((index * Math.PI) / 10), radius),
  );
}

/** Maps draw streets with round ends: room is kept for those. */
function roundEnds(streets: readonly RawStreet[]): Ring[] {
  return streets.flatMap(({ line, width }) =>
    [itemAt(line, 0), cyclic(line, -1)].map((at) => regular(at, width / 2 + 0.5)),
  );
}

/** Everything from house front to house front. */
function streetGround(streets: readonly RawStreet[]): Ring[] {
  const strips = streets.flatMap((street) => strip(street.line, reserveOf(street), 'flat'));
  return [...strips, ...cornerPatches(streets), ...roundEnds(streets)];
}

function openGround(terrain: Terrain, streets: readonly RawStreet[]): Ring[] {
  const { water, sites } = terrain;
  const dry = offset([water.coast], -20, 'round');
  const quays = offset([water.quayLine], 12.5, 'round');
  const towpaths = strip(water.cut, water.cutWidth + 9, 'flat');
  const kept = offset(
    sites.map(({ ring }) => ring),
    0.5,
    'sharp',
  );
  return cut(dry, [...quays, ...towpaths, ...kept, ...streetGround(streets)]);
}

/** Lanes from a site that no street has reached to the streets about it. */
function linksTo(hole: Ring, outer: Ring): RawStreet[] {
  const middle = centroid(hole);
  const way = left(frameOf(outer).axis);
  return [way, scale(way, -1)].flatMap((heading): RawStreet[] => {
    const [near, far] = [reachOf(hole, middle, heading), reachOf(outer, middle, heading)];
    if (near === null || far === null) return [];
    const line = [near - 4, near + (far - near) / 2, far + laneReach].map((reach, index) =>
      along(along(middle, heading, reach), left(heading), index === 1 ? (far - near) * 0.06 : 0),
    );
    return [{ line: spline(line, 5), width: 4, class: 'lane', name: null, fixed: true }];
  });
}

/** The ground between streets, quays, kept sites and the shore, and the lanes added to reach all of it. */
export function findBlocks(
  terrain: Terrain,
  streets: readonly RawStreet[],
): { blocks: Ring[]; links: RawStreet[] } {
  const rings = openGround(terrain, streets);
  const shells = outers(rings);
  const links = holes(rings).flatMap((hole) => {
    const shell = shells.find((ring) => inside(itemAt(hole, 0), ring));
    return shell === undefined ? [] : linksTo(hole, shell);
  });
  const open = links.length === 0 ? shells : outers(cut(rings, streetGround(links)));
  return {
    blocks: open.map((ring) => simplifyRing(ring, 0.25)).filter((ring) => signedArea(ring) > 90),
    links,
  };
}

/** How far a point lies from a ring's outline, looking one way. */
export function reachOf(ring: Ring, from: Point, way: Point): number | null {
  const tip = along(from, way, 900);
  const hits = ring.flatMap((a, index) => {
    const hit = crossing(from, tip, a, cyclic(ring, index + 1));
    return hit === null ? [] : [hit.first * 900];
  });
  return hits.length === 0 ? null : Math.min(...hits);
}
