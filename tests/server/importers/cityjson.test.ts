import { describe, expect, test } from 'vitest';
import { rowsOf, uploadOf } from '../../support/upload-of.ts';

/** Two triangles of a square of 10 m, another square beside it higher up, and a roof. */
const VERTICES = [
  [0, 0, 0], [10, 0, 0], [10, 10, 0], [0, 10, 0],
  [10, 0, 2], [20, 0, 2], [20, 10, 2], [10, 10, 2],
  [0, 0, 9], [20, 0, 9], [20, 10, 9], [0, 10, 9],
]; // prettier-ignore
const TRIANGLES = [[[0, 2, 1]], [[0, 3, 2]]]; // prettier-ignore
const STEP = [[4, 7, 6, 5]]; // prettier-ignore
const ROOF = [[8, 9, 10, 11]];

function city(objects: object, more: object = {}): string {
  return JSON.stringify({
    type: 'CityJSON',
    version: '1.1',
    CityObjects: objects,
    vertices: VERTICES,
    transform: { scale: [1, 1, 1], translate: [100, 200, 0] },
    ...more,
  });
}

function solid(faces: readonly unknown[], kinds: readonly number[]): object {
  const surfaces = [{ type: 'GroundSurface' }, { type: 'RoofSurface' }];
  return { type: 'Solid', lod: 2, boundaries: [faces], semantics: { surfaces, values: [kinds] } };
}

async function partsOf(objects: object): Promise<unknown> {
  const [row] = await rowsOf(city(objects));
  return row?.geometry?.map((part) => part.map((ring) => ring.length - 1));
}

describe('CityJSON', () => {
  test('joins faces on the ground that share edges, from whatever heights', async () => {
    const geometry = [solid([...TRIANGLES, STEP, ROOF], [0, 0, 0, 1])];
    const [row] = await rowsOf(city({ a: { type: 'Building', geometry } }));
    expect(row?.geometry).toHaveLength(1);
    const points = row?.geometry?.[0]?.[0]?.map(String) ?? [];
    const corners = ['100,200', '110,200', '120,200', '120,210', '110,210', '100,210'];
    expect(new Set(points)).toEqual(new Set(corners));
    expect(points).toHaveLength(7);
  });

  test('takes a footprint of its own before any solid, and the finest solid before others', async () => {
    const flat = { type: 'MultiSurface', lod: '0', boundaries: [STEP] };
    const geometry = [solid([...TRIANGLES, ROOF], [0, 0, 1]), flat];
    expect(await partsOf({ a: { type: 'Building', geometry } })).toEqual([[4]]);
  });

  test('finds the lowest level faces where nothing is said of them', async () => {
    const geometry = [{ type: 'Solid', lod: 1, boundaries: [[...TRIANGLES, STEP, ROOF]] }];
    expect(await partsOf({ a: { type: 'Building', geometry } })).toEqual([[4]]);
  });

  test('makes parts of a building parts of its footprint, and other objects nothing', async () => {
    const objects = {
      a: { type: 'Building', attributes: { use: 'school' }, children: ['b', 'c', 'gone'] },
      b: { type: 'BuildingPart', parents: ['a'], geometry: [solid([STEP, ROOF], [0, 1])] },
      c: { type: 'BuildingInstallation', parents: ['a'], geometry: [solid(TRIANGLES, [0, 0])] },
      d: { type: 'Road', geometry: [] },
      e: { type: 'BuildingPart', geometry: [solid(TRIANGLES, [0, 0])] },
      f: { type: 'Building', geometry: [{ type: 'MultiPoint', boundaries: [0] }] },
    };
    const rows = await rowsOf(city(objects));
    expect(rows.map(({ properties, fault }) => [properties.id, fault])).toEqual([
      ['a', null],
      ['e', null],
      ['f', 'It has no face on the ground.'],
    ]);
    expect(rows[0]?.properties.use).toBe('school');
  });

  test.each([
    ['https://www.opengis.net/def/crs/EPSG/0/7415', 28992],
    ['urn:ogc:def:crs:EPSG::7415', 28992],
    ['EPSG:25830', 25830],
    [undefined, undefined],
  ])('in %s', async (referenceSystem, code) => {
    const object = { type: 'Building', geometry: [solid([STEP], [0])] };
    const upload = await uploadOf(city({ a: object }, { metadata: { referenceSystem } }));
    expect(upload.crs?.code).toBe(code);
  });
});
