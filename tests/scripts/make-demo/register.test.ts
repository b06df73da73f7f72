import { describe, expect, it } from 'vitest';
import { boundsOf, centroid } from '../../../scripts/make-demo/polygons.ts';
import { buildingsOf } from '../../support/town-measures.ts';
import { makeTown } from '../../../scripts/make-demo/town.ts';
import { itemAt } from '../../../scripts/make-demo/vector.ts';
import { townFiles } from '../../../scripts/make-demo/write.ts';

describe.each([
  { wanted: 2000, seed: 7 },
  { wanted: 1600, seed: 11 },
])('the register of $wanted buildings, seed $seed', ({ wanted, seed }) => {
  const { crs, features } = buildingsOf(makeTown(wanted, seed), seed);

  it('gives every building its own reference and its full register entry', () => {
    expect(crs).toEqual({ type: 'name', properties: { name: 'urn:ogc:def:crs:EPSG::32631' } });
    expect(new Set(features.map(({ properties }) => properties.reference)).size).toBe(
      features.length,
    );
    expect(itemAt(features, 0).properties.reference).toMatch(/^B0*1$/);
    const levels = features.map(({ properties }) => Number(properties.groundLevel));
    expect(Math.min(...levels)).toBeGreaterThan(2.5);
    expect(Math.max(...levels)).toBeLessThan(14);
    const known = features.filter(({ properties }) => properties.foundingLevel !== null);
    expect(known.length / features.length).toBeLessThan(0.25);
    expect(known.length).toBeGreaterThan(10);
    const listings = features.map(({ properties }) => String(properties.listed));
    expect(listings.every((listing) => /^(not listed|listed, \w+)$/.test(listing))).toBe(true);
    const unlisted = listings.filter((listing) => listing === 'not listed');
    expect(unlisted.length / features.length).toBeGreaterThan(0.8);
    expect(features.every(({ properties }) => properties.address !== 'Port Dogger')).toBe(true);
  });
});

describe('the same seed', () => {
  it('gives the same bytes, and another seed another town', () => {
    function text(seed: number): string {
      return [...townFiles(makeTown(1500, seed), seed)]
        .map(([name, make]) => name + make())
        .join('\n');
    }
    expect(text(7) === text(7)).toBe(true);
    expect(text(8) === text(7)).toBe(false);
  });

  it('spreads references over streets of the whole town', () => {
    const town = makeTown(1500, 7);
    const middles = town.footprints.map(({ ring }) => centroid(ring));
    const [west, , east] = boundsOf(middles);
    expect(east - west).toBeGreaterThan(800);
  });
});
