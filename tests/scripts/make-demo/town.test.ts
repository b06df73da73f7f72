import { beforeAll, describe, expect, it } from 'vitest';
import { createGridIndex } from '../../../scripts/make-demo/grid-index.ts';
import { slice } from '../../../scripts/make-demo/lines.ts';
import {
  boundsOf,
  distanceToRing,
  inside,
  isSimple,
  signedArea,
} from '../../../scripts/make-demo/polygons.ts';
import type { Box } from '../../../scripts/make-demo/polygons.ts';
import { stationBox } from '../../../scripts/make-demo/sites.ts';
import {
  buildingsOf,
  longestStraight,
  sharedArea,
  touches,
  wallKeys,
} from '../../support/town-measures.ts';
import { makeTown } from '../../../scripts/make-demo/town.ts';
import type { Town } from '../../../scripts/make-demo/town.ts';
import { itemAt } from '../../../scripts/make-demo/vector.ts';
import type { Ring } from '../../../scripts/make-demo/vector.ts';

describe.each([
  { wanted: 2000, seed: 7, low: 1500, high: 2500 },
  { wanted: 1600, seed: 11, low: 1500, high: 2500 },
  { wanted: 9000, seed: 3, low: 8500, high: 9600 },
])('the town of $wanted buildings, seed $seed', ({ wanted, seed, low, high }) => {
  let town: Town;
  let rings: Ring[];
  const index = createGridIndex<number>(40);
  beforeAll(() => {
    town = makeTown(wanted, seed);
    rings = town.footprints.map(({ ring }) => ring);
    for (const [place, ring] of rings.entries()) index.add(boundsOf(ring), place);
  }, 60_000);

  it('has as many buildings as were asked for', () => {
    expect(town.footprints.length).toBeGreaterThanOrEqual(low);
    expect(town.footprints.length).toBeLessThanOrEqual(high);
  });

  it('has many kinds of building over two decades of area', () => {
    expect(new Set(town.footprints.map(({ kind }) => kind)).size).toBeGreaterThanOrEqual(15);
    const areas = rings.map(signedArea).sort((a, b) => a - b);
    expect(itemAt(areas, 0)).toBeGreaterThan(11);
    expect(itemAt(areas, 0)).toBeLessThan(16);
    expect(itemAt(areas, areas.length - 1)).toBeGreaterThan(2000);
  });

  it('has its landmarks', () => {
    const names = town.footprints.map(({ name }) => name);
    for (const name of [
      'Church of St Elwin',
      'Customs House',
      'Bridge keeper’s house',
      'Port Dogger School',
    ]) {
      expect(names).toContain(name);
    }
  });

  it('draws valid rings: counter-clockwise, closed when written, never crossing themselves', () => {
    const broken = rings.filter((ring) => signedArea(ring) <= 0 || !isSimple(ring));
    expect(broken).toEqual([]);
    const open = buildingsOf(town, seed).features.filter(({ geometry }) =>
      geometry.coordinates.some((ring) => ring[0]?.join() !== ring.at(-1)?.join()),
    );
    expect(open).toEqual([]);
  });

  it('keeps holes inside their buildings', () => {
    const pierced = town.footprints.filter(({ holes }) => holes.length > 0);
    expect(
      pierced.every(({ ring, holes }) =>
        holes.flat().every((point) => inside(point, ring) && distanceToRing(point, ring) > 5),
      ),
    ).toBe(true);
  });

  it('builds nothing over anything else', () => {
    const clashes = rings.flatMap((ring, place) =>
      index
        .near(boundsOf(ring))
        .filter((other) => other > place && sharedArea(ring, itemAt(rings, other)) > 0.02),
    );
    expect(clashes).toEqual([]);
  });

  it('shares at least three walls in ten buildings, corner for corner', () => {
    const owners = new Map<string, number>();
    for (const key of rings.flatMap(wallKeys)) owners.set(key, (owners.get(key) ?? 0) + 1);
    const joined = rings.filter((ring) => wallKeys(ring).some((key) => (owners.get(key) ?? 0) > 1));
    expect(joined.length / rings.length).toBeGreaterThan(0.3);
  });

  it('builds nothing in water, on a carriageway or on the station box', () => {
    const { land } = town.terrain.water;
    const wet = rings.filter(
      (ring) => !ring.every((point) => land.some((bank) => inside(point, bank))),
    );
    expect(wet).toEqual([]);
    const onRoad = town.streets.flatMap(({ line, width, name }) => {
      const [west, south, east, north] = boundsOf(line);
      const box: Box = [west - width, south - width, east + width, north + width];
      return index
        .near(box)
        .filter((place) => touches(itemAt(rings, place), line, width / 2))
        .map((place) => `${name}: ${place}`);
    });
    expect(onRoad).toEqual([]);
    expect(rings.filter((ring) => sharedArea(ring, stationBox()) > 0)).toEqual([]);
  });

  it('has no street straight for more than 200 m', () => {
    const straight = town.streets.filter(({ line }) => longestStraight(slice(line, 0, 1e6)) > 200);
    expect(straight.map(({ name }) => name)).toEqual([]);
  });
});
