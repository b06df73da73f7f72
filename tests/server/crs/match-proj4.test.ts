import { expect, test } from 'vitest';
import { isProj4, matchProj4 } from '../../../server/crs/match-proj4.ts';

test.each([
  ['+proj=tmerc +lat_0=49 +lon_0=-2 +k=0.9996012717 +x_0=400000 +y_0=-100000 +ellps=airy +units=m +no_defs', 27700],
  ['+proj=sterea +lat_0=52.1561605555556 +lon_0=5.38763888888889 +k=0.9999079 +x_0=155000 +y_0=463000 +ellps=bessel', 28992],
  ['+proj=utm +zone=30 +ellps=GRS80 +towgs84=0,0,0,0,0,0,0 +units=m +no_defs +type=crs', 25830],
  ['+proj=utm +datum=WGS84 +zone=31', 32631],
  ['+proj=longlat +datum=WGS84 +no_defs', 4326],
])('%s is found', async (text, wanted) => {
  expect(isProj4(text)).toBe(true);
  const { code, candidates } = await matchProj4(text);
  expect([code, ...candidates.map((one) => one.code)]).toContain(wanted);
  // where several have the same parameters a person chooses
  expect(code === null).toBe(candidates.length > 0);
}); // prettier-ignore

test.each(['+proj=nowhere', '+', `+proj=utm ${'+x=1 '.repeat(1000)}`])('%.30s is not', async (text) => {
  expect(await matchProj4(text)).toEqual({ code: null, candidates: [] });
}); // prettier-ignore
