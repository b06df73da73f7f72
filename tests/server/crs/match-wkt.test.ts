import { describe, expect, test } from 'vitest';
import { findFileCrs } from '../../../server/crs/file-crs.ts';
import { matchWkt } from '../../../server/crs/match-wkt.ts';
import { shiftAccuracy } from '../../../server/crs/shift-accuracy.ts';
import { toGrid } from '../../../server/crs/to-grid.ts';

const DEGREE = 'PRIMEM["Greenwich",0.0],UNIT["Degree",0.0174532925199433]]';
const METRE = 'UNIT["Meter",1.0]]';
const ETRS89 = `GEOGCS["GCS_ETRS_1989",DATUM["D_ETRS_1989",SPHEROID["GRS_1980",6378137.0,298.257222101]],${DEGREE}`;
const BESSEL = 'SPHEROID["Bessel_1841",6377397.155,299.1528128]';

function parameters(values: Readonly<Record<string, number>>): string {
  return Object.entries(values).map(([name, value]) => `PARAMETER["${name}",${value}]`).join(','); // prettier-ignore
}

function transverse(
  east: number,
  north: number,
  meridian: number,
  scale: number,
  latitude: number,
) {
  const values = { False_Easting: east, False_Northing: north, Central_Meridian: meridian, Scale_Factor: scale, Latitude_Of_Origin: latitude }; // prettier-ignore
  return `PROJECTION["Transverse_Mercator"],${parameters(values)}`;
}

/** As the commonest program of the trade writes them beside its files, which names no numbers. */
const WRITTEN: Readonly<Record<number, string>> = {
  25830: `PROJCS["ETRS_1989_UTM_Zone_30N",${ETRS89},${transverse(500000, 0, -3, 0.9996, 0)},${METRE}`,
  27700: `PROJCS["British_National_Grid",GEOGCS["GCS_OSGB_1936",DATUM["D_OSGB_1936",SPHEROID["Airy_1830",6377563.396,299.3249646]],${DEGREE},${transverse(400000, -100000, -2, 0.9996012717, 49)},${METRE}`,
  28992: `PROJCS["RD_New",GEOGCS["GCS_Amersfoort",DATUM["D_Amersfoort",${BESSEL}],${DEGREE},PROJECTION["Double_Stereographic"],${parameters({ False_Easting: 155000, False_Northing: 463000, Central_Meridian: 5.38763888888889, Scale_Factor: 0.9999079, Latitude_Of_Origin: 52.15616055555555 })},${METRE}`,
  2056: `PROJCS["CH1903+_LV95",GEOGCS["GCS_CH1903+",DATUM["D_CH1903+",${BESSEL}],${DEGREE},PROJECTION["Hotine_Oblique_Mercator_Azimuth_Center"],${parameters({ False_Easting: 2600000, False_Northing: 1200000, Scale_Factor: 1, Azimuth: 90, Longitude_Of_Center: 7.439583333333333, Latitude_Of_Center: 46.95240555555556 })},${METRE}`,
  31256: `PROJCS["MGI_Austria_GK_East",GEOGCS["GCS_MGI",DATUM["D_MGI",${BESSEL}],${DEGREE},${transverse(0, -5000000, 16.33333333333333, 1, 0)},${METRE}`,
  3035: `PROJCS["ETRS_1989_LAEA",${ETRS89},PROJECTION["Lambert_Azimuthal_Equal_Area"],${parameters({ False_Easting: 4321000, False_Northing: 3210000, Central_Meridian: 10, Latitude_Of_Origin: 52 })},${METRE}`,
  4258: ETRS89,
  4326: `GEOGCS["GCS_WGS_1984",DATUM["D_WGS_1984",SPHEROID["WGS_1984",6378137.0,298.257223563]],${DEGREE}`,
  2154: `PROJCS["RGF_1993_Lambert_93",GEOGCS["GCS_RGF_1993",DATUM["D_RGF_1993",SPHEROID["GRS_1980",6378137.0,298.257222101]],${DEGREE},PROJECTION["Lambert_Conformal_Conic"],${parameters({ False_Easting: 700000, False_Northing: 6600000, Central_Meridian: 3, Standard_Parallel_1: 44, Standard_Parallel_2: 49, Latitude_Of_Origin: 46.5 })},${METRE}`,
}; // prettier-ignore

async function file(code: number) {
  const found = await findFileCrs(code);
  if (found === undefined || 'fault' in found) throw new Error(`EPSG:${code} cannot be used.`);
  return found.crs;
}

describe('matchWkt', () => {
  test.each(Object.entries(WRITTEN))('knows EPSG:%s by its parameters', async (code, wkt) => {
    expect((await matchWkt(wkt)).code).toBe(Number(code));
  });

  test('believes a number, and reads the flat half of a system with heights', async () => {
    const numbered = (WRITTEN[27700] ?? '').replace(/\]$/, ',AUTHORITY["EPSG","27700"]]');
    const vertical = 'VERT_CS["ODN height",VERT_DATUM["Newlyn",2005],UNIT["metre",1]]';
    expect((await matchWkt(numbered)).code).toBe(27700);
    expect((await matchWkt(`COMPD_CS["with heights",${numbered},${vertical}]`)).code).toBe(27700);
    expect((await matchWkt(`COMPD_CS["with heights",${WRITTEN[25830] ?? ''},${vertical}]`)).code).toBe(25830); // prettier-ignore
  });

  test('lists what fits where several do, and chooses none', async () => {
    const unnamed = (WRITTEN[25830] ?? '')
      .replace('D_ETRS_1989', 'D_Unknown')
      .replace('ETRS_1989_UTM_Zone_30N', 'custom');
    const { code, candidates } = await matchWkt(unnamed);
    expect(code).toBeNull();
    expect(candidates.map((one) => one.code)).toContain(25830);
  });

  test.each(['<html><body>Not found</body></html>', '', 'LOCAL_CS["site grid"]', 'PROJCS[', 'A'.repeat(30_000)])(
    'makes nothing of %.40j',
    async (text) => {
      expect(await matchWkt(text)).toEqual({ code: null, candidates: [] });
    },
  ); // prettier-ignore
});

describe('shiftAccuracy', () => {
  test.each([
    [25830, 25830, 0, 'own system'],
    [4258, 25830, 0, 'Both stand on ETRS89'],
    [4312, 31256, 0, 'Both stand on MGI'],
    [4326, 25830, 1, 'up to 1 m'],
    [27700, 32631, 5, 'OSTN15'],
    [27700, 25830, 6, 'a grid of shifts would be exact'],
    [4230, 25830, 11, 'up to 11 m'],
    [2263, 32618, 2, 'up to 2 m'],
  ])('of EPSG:%i into EPSG:%i is %d m', async (from, into, metres, words) => {
    const accuracy = shiftAccuracy(await file(from), await file(into));
    expect(accuracy.metres).toBe(metres);
    expect(accuracy.words).toContain(words);
  });

  test('is unknown where no shift is', () => {
    const side = { code: 1, name: 'Old / grid', datum: 'Old', grid: null, accuracy: null };
    const other = { code: 2, name: 'WGS 84', datum: 'WGS 84', grid: null, accuracy: 0 };
    const { metres, words } = shiftAccuracy(side, other);
    expect(metres).toBeNull();
    expect(words).toContain('some hundred metres');
  });
});

describe('toGrid', () => {
  test('leaves coordinates of the scheme’s own system as they are', async () => {
    const own = await file(25830);
    expect(toGrid(own, own)([351943.57212345, 4436784.15849876])).toEqual([351943.57212345, 4436784.15849876]); // prettier-ignore
  });

  test('takes feet for feet', async () => {
    const [feet, metres] = [await file(2263), await file(32118)];
    const [east, north] = toGrid(feet, metres)([984250, 200000]);
    expect(east).toBeCloseTo(300_000, 2);
    expect(north).toBeCloseTo(60_960.12, 1);
  });

  test('does not place what is no number', async () => {
    const [from, into] = [await file(4326), await file(25830)];
    expect(toGrid(from, into)([Number.NaN, 1])).toEqual([Number.NaN, Number.NaN]);
  });
});
