import { expect, test } from 'vitest';
import { findFileCrs } from '../../../server/crs/file-crs.ts';
import { shiftAccuracy } from '../../../server/crs/shift-accuracy.ts';

async function system(code: number) {
  const found = await findFileCrs(code);
  if (found === undefined || !('crs' in found)) throw new Error('it is no system of a file');
  return found.crs;
}

// how far PROJ 9.1 says otherwise in the middle of each
test.each([
  [3058, 4129.1],
  [4718, 771.3],
  [3148, 458.1],
  [2164, 437.4],
  [22032, 351.2],
  [29220, 300],
  [23946, 296.1],
  [26194, 276.1],
  [9284, 266.4],
  [4208, 215.8],
  [3370, 211.1],
  [4132, 200.5],
  [5520, 199.6],
  [3167, 175.6],
  [3837, 138.4],
  [4620, 121.2],
  [3374, 106.6],
  [4144, 104.9],
  [2442, 102.7],
  [22235, 100.2],
  [5536, 85],
  [6990, 78],
  [4224, 69.6],
  [2045, 60.5],
  [23037, 57.1],
  [24882, 48.2],
  [2737, 29],
  [3354, 25.1],
  [4197, 24.9],
  [4198, 24.7],
  [4676, 13.1],
  [8679, 11.7],
  [4231, 6.2],
  [6311, 3.8],
])('EPSG:%i states at least the %d m that it may be off', async (code, metres) => {
  const stated = shiftAccuracy(await system(code), await system(4326)).metres;
  expect(stated).toBeGreaterThanOrEqual(metres);
});

test.each([
  [31468, 5],
  [23030, 10],
  [25830, 1],
])('EPSG:%i does not suffer for the rim of its datum', async (code, metres) => {
  expect(shiftAccuracy(await system(code), await system(4326)).metres).toBe(metres);
});
