// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { gridCrosses } from '../../../../../src/features/map/place/grid-crosses.ts';
import { createGridProjection } from '../../../../../src/features/map/place/grid-projection.ts';

const UTM_31 = createGridProjection('+proj=utm +zone=31 +datum=WGS84 +units=m +no_defs');

describe('createGridProjection', () => {
  it('puts the middle of zone 31 on the equator at 500 000 m east', () => {
    const [easting, northing] = UTM_31.toGrid([3, 0]) ?? [0, 1];
    expect(easting).toBeCloseTo(500_000, 6);
    expect(northing).toBeCloseTo(0, 6);
  });

  it('comes back to where it started, to a tenth of a millimetre', () => {
    const place = UTM_31.toLonLat([412_508.4, 6_068_379.7]);
    const [easting, northing] = UTM_31.toGrid(place ?? [0, 0]) ?? [0, 0];
    expect(Math.abs(easting - 412_508.4)).toBeLessThan(1e-4);
    expect(Math.abs(northing - 6_068_379.7)).toBeLessThan(1e-4);
  });

  it('has no place for what is out of reach', () => {
    expect(UTM_31.toGrid([Number.NaN, 0])).toBeNull();
  });
});

function ends(crosses: GeoJSON.FeatureCollection): GeoJSON.Position[][] {
  const [feature] = crosses.features;
  return feature?.geometry.type === 'MultiLineString' ? feature.geometry.coordinates : [];
}

describe('gridCrosses', () => {
  const bounds = [412_310, 6_068_040, 412_640, 6_068_390] as const;

  it('stand where round eastings and northings meet, two strokes each', () => {
    const strokes = ends(gridCrosses(UTM_31, bounds, 0.5));
    // steps of 100 m: three eastings by three northings
    expect(strokes).toHaveLength(2 * 3 * 3);
    const [start = [], end = []] = strokes[0] ?? [];
    const [west = 0, east = 0] = [start, end].map(
      ([longitude = 0, latitude = 0]) => UTM_31.toGrid([longitude, latitude])?.[0],
    );
    expect((west + east) / 2).toBeCloseTo(412_400, 3);
    expect(east - west).toBeCloseTo(9 * 0.5, 3);
  });

  it('are left out where they would be too many', () => {
    expect(ends(gridCrosses(UTM_31, [0, 0, 1e6, 1e6], 0.5))).toEqual([]);
  });

  it('are left out where the grid bends', () => {
    expect(ends(gridCrosses(UTM_31, [0, 5e6, 1e6, 7e6], 2000))).toEqual([]);
  });
});
