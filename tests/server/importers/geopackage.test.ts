import { describe, expect, test } from 'vitest';
import { geopackageFile, type GivenLayer } from '../../support/footprint-files.ts';
import { twinTown } from '../../support/twin-town.ts';
import { rowsOf, uploadOf } from '../../support/upload-of.ts';

const ROWS = twinTown();

function layer(name: string, kind: string, count: number, srs = 25830): GivenLayer {
  return { name, kind, rows: ROWS.slice(0, count), srs };
}

describe('a GeoPackage', () => {
  test('of several layers is read by the largest that holds areas', async () => {
    const file = await geopackageFile([
      layer('points', 'POINT', 9),
      layer('anything', 'GEOMETRY', 8),
      layer('few', 'POLYGON', 2),
      layer('many "quoted"', 'MULTIPOLYGON', 5),
    ]);
    const upload = await uploadOf(file);
    expect(upload).toMatchObject({ layer: 'many "quoted"', count: 5 });
    expect(upload.layers).toEqual(['many "quoted"', 'few', 'anything']);
    expect(upload.notes).toEqual([
      'The layer "many "quoted"" was taken. There is also "few", "anything".',
    ]);
  });

  test('of several layers is read by the one that is called buildings', async () => {
    const file = await geopackageFile([
      layer('parcels', 'MULTIPOLYGON', 9),
      layer('Edificios', 'MULTIPOLYGON', 3),
      layer('building points', 'POINT', 9),
      layer('buildings of any kind', 'GEOMETRY', 9),
    ]);
    expect(await uploadOf(file)).toMatchObject({ layer: 'Edificios', count: 3 });
  });

  test.each([
    [0, null],
    [4326, { code: 4326, wkt: 'GEOGCS["WGS 84"]', said: 'EPSG:4326' }],
    [100001, { wkt: 'PROJCS["ours"]', said: 'A grid of ours' }],
    [77, { said: 'system 77' }],
  ])('in system %i of its own list', async (srs, crs) => {
    const file = await geopackageFile([layer('a', 'MULTIPOLYGON', 1, srs)]);
    expect((await uploadOf(file)).crs).toEqual(crs);
  });

  test('gives values as they are kept, without what is made up while it is read', async () => {
    const file = await geopackageFile(
      [layer('a', 'MULTIPOLYGON', 1)],
      `alter table a add column listed boolean; alter table a add column level real;
       alter table a add column photo blob; alter table a add column double real as (level * 2);
       update a set listed = 1, level = 2.5, photo = x'00ff';
       create view b as select * from a;`,
    );
    const upload = await uploadOf(file);
    const [row] = await rowsOf(file);
    expect(upload.columns).not.toContain('double');
    expect(row?.properties).toMatchObject({ fid: 1, listed: true, level: 2.5, photo: null });
  });

  test('is read as it was written last before changes that lie in another file', async () => {
    const file = await geopackageFile([layer('a', 'MULTIPOLYGON', 3)]);
    file[18] = 2;
    file[19] = 2;
    expect(await uploadOf(file)).toMatchObject({ count: 3 });
  });

  test('has faults where a geometry is missing or damaged', async () => {
    const file = await geopackageFile(
      [layer('a', 'MULTIPOLYGON', 4)],
      `update a set geom = null where fid = 2; update a set geom = x'4750' where fid = 3;`,
    );
    expect((await rowsOf(file)).map(({ fault }) => fault)).toEqual([
      null,
      'It has no geometry.',
      'Its geometry is damaged.',
      null,
    ]);
  });
});
