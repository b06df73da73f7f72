import { expect, test } from 'vitest';
import { findCrs } from '../../../server/crs/find-crs.ts';
import { stretchFault } from '../../../server/crs/stretch-fault.ts';

async function faultOf(code: number): Promise<string | undefined> {
  const found = await findCrs(code);
  if (found === undefined || 'fault' in found) throw new Error(`EPSG:${code} cannot be drawn on.`);
  return stretchFault(found.crs);
}

test.each([
  ['Pseudo-Mercator', 3857],
  ['World Mercator', 3395],
  ['Mercator of the Pacific', 3832],
  ['Equidistant Cylindrical', 4087],
  ['Equal Earth', 8857],
  ['LCC Europe, 3 % short in its middle', 3034],
])('%s is refused', async (_name, code) => {
  expect(await faultOf(code)).toContain(`Lengths on EPSG:${code}`);
});

test.each([
  ['UTM zone 31N', 32631],
  ['UTM zone 1S, over the date line', 32701],
  ['British National Grid', 27700],
  ['RD New', 28992],
  ['Lambert-93', 2154],
  ['LV95', 2056],
  ['Krovak East North', 5514],
  ['New Zealand Map Grid', 27200],
  ['a Mercator of one coast', 3002],
  ['Hong Kong 1980 Grid', 2326],
])('%s is not', async (_name, code) => {
  expect(await faultOf(code)).toBeUndefined();
});
