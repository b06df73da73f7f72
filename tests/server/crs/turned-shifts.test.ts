import { expect, test } from 'vitest';
import { findFileCrs } from '../../../server/crs/file-crs.ts';
import { toLonLat } from '../../../server/crs/to-lon-lat.ts';

/** Degrees of latitude and of longitude are at most so many metres long. */
const METRES = 111_400;

// by PROJ 9.1; the first is also the origin of RDNAPTRANS 2018
test.each([
  [28992, [155000, 463000], [5.3872035, 52.1551723], 1],
  [31370, [149000, 170000], [4.3545547, 50.8404105], 1],
  [3021, [1628000, 6580000], [18.0534475, 59.3214031], 1],
  [2393, [3386000, 6672000], [24.9448107, 60.1437795], 1],
  [2169, [77000, 75000], [6.1266147, 49.6096224], 1],
  [2326, [836694, 819069], [114.1810088, 22.3105952], 1],
  [2039, [219529, 626907], [35.2052076, 31.7347595], 1],
  [9356, [500000, 2700000], [32.999998, 24.4134265], 1],
  [5514, [-740000, -1043000], [14.4601288, 50.0910173], 12],
  [31468, [4468000, 5334000], [11.5685595, 48.1432244], 5],
  [31287, [625000, 483000], [16.3612851, 48.2068412], 1],
  [27700, [530000, 180000], [-0.1283539, 51.5039908], 5],
] as const)('EPSG:%i lies where others say', async (code, place, [longitude, latitude], metres) => {
  const found = await findFileCrs(code);
  if (found === undefined || !('crs' in found)) throw new Error('it is no system of a file');
  const [x, y] = toLonLat(found.crs.definition)(place);
  const off = Math.hypot(x - longitude, y - latitude) * METRES;
  expect(off).toBeLessThan(metres);
});

test.each([6244, 29701])('EPSG:%i is refused, for nobody here can project it', async (code) => {
  expect(await findFileCrs(code)).toMatchObject({
    fault: expect.stringContaining('cannot be placed here') as string,
  });
});
