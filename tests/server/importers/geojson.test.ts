import { describe, expect, test } from 'vitest';
import { refusalOf, rowsOf, uploadOf } from '../../support/upload-of.ts';
import { zipFile } from '../../support/zip-file.ts';

const SQUARE = [[[3, 54], [3.1, 54], [3.1, 54.1], [3, 54.1], [3, 54]]]; // prettier-ignore

function feature(properties: object | null, coordinates: unknown = SQUARE, more: object = {}) {
  return { type: 'Feature', properties, geometry: { type: 'Polygon', coordinates }, ...more };
}

function collection(features: readonly unknown[], more: object = {}): string {
  return JSON.stringify({ type: 'FeatureCollection', features, ...more });
}

describe('GeoJSON', () => {
  test.each([
    ['urn:ogc:def:crs:OGC:1.3:CRS84', 4326],
    ['urn:ogc:def:crs:EPSG::25830', 25830],
    ['urn:ogc:def:crs:EPSG:6.9:27700', 27700],
    ['EPSG:2056', 2056],
    ['http://www.opengis.net/def/crs/EPSG/0/31256', 31256],
    ['urn:ogc:def:crs:EPSG::7415', 28992],
    ['urn:ogc:def:crs,crs:EPSG::27700,crs:EPSG::5701', 27700],
    ['EPSG:4979', 4326],
  ])('in %s is in EPSG:%i', async (name, code) => {
    const file = collection([feature({})], { crs: { type: 'name', properties: { name } } });
    expect((await uploadOf(file)).crs).toEqual({ code, said: name });
  });

  test('may name its system by number, in words nobody knows, or say that it has none', async () => {
    const file = (crs: unknown) => collection([feature({})], { crs });
    const byNumber = await uploadOf(file({ type: 'EPSG', properties: { code: 27700 } }));
    expect(byNumber.crs).toEqual({ code: 27700, said: 'EPSG:27700' });
    const strange = await uploadOf(file({ type: 'name', properties: { name: 'Mars' } }));
    expect(strange.crs).toEqual({ said: 'Mars' });
    expect((await uploadOf(file(null))).crs).toBeNull();
    expect((await uploadOf(file({ type: 'name', properties: { name: { a: 1 } } }))).crs).toBeNull();
  });

  test('without a system, and in metres all the same, is asked about', async () => {
    const metres = SQUARE.map((ring) => ring.map(([x = 0, y = 0]) => [x * 1e5, y * 1e5]));
    const upload = await uploadOf(collection([feature({}, metres)]));
    expect(upload.crs).toBeNull();
    expect(upload.notes).toEqual([expect.stringMatching(/should be in longitude and latitude/)]);
  });

  test('may have names of properties that programs trip over', async () => {
    const file = collection([feature({})]).replace(
      '"properties":{}',
      '"properties":{"__proto__":{"polluted":1},"constructor":"x","toString":null,"hasOwnProperty":7}',
    );
    const [row] = await rowsOf(file);
    expect(Object.getPrototypeOf(row?.properties)).toBeNull();
    expect(Object.entries(row?.properties ?? {})).toEqual([
      ['__proto__.polluted', 1],
      ['constructor', 'x'],
      ['toString', null],
      ['hasOwnProperty', 7],
    ]);
    expect('polluted' in {}).toBe(false);
  });

  test('gives scalars only, kept as they can be kept', async () => {
    const [row] = await rowsOf(
      collection([
        feature(
          {
            a: [1, 'b', null, [2]],
            c: { d: 'e', f: { g: 1 } },
            h: 'x\u0000y\ud800',
            i: 'z'.repeat(5000),
          },
          SQUARE,
          { id: 12 },
        ),
      ]),
    );
    expect({ ...row?.properties }).toEqual({
      id: 12,
      a: '1, b, 2',
      'c.d': 'e',
      'c.f': null,
      h: 'xy',
      i: 'z'.repeat(2000),
    });
  });

  test('names the fault of a row and keeps the others', async () => {
    const rows = await rowsOf(
      collection([
        feature({ a: 1 }),
        feature({ b: 2 }, []),
        feature(null, [[[3, 54], [3.1, 54], [3, 54]]]), // prettier-ignore
        { type: 'Feature', properties: {}, geometry: null },
        { type: 'Feature', properties: {}, geometry: { type: 'Point', coordinates: [3, 54] } },
        7,
        { type: 'Feature', geometry: { type: 'GeometryCollection', geometries: [{ type: 'Polygon', coordinates: SQUARE }] } }, // prettier-ignore
      ]),
    );
    expect(rows.map(({ row, fault }) => [row, fault])).toEqual([
      [1, null],
      [2, 'Its geometry is empty.'],
      [3, 'It has a ring of fewer than three corners.'],
      [4, 'It has no geometry.'],
      [5, 'It is a point: a footprint is a polygon.'],
      [6, 'It is not a Feature of GeoJSON.'],
      [7, null],
    ]);
    expect(rows[0]?.geometry).toEqual([SQUARE]);
  });

  test('finds columns wherever they first appear', async () => {
    const file = collection([feature({ b: 1 }), feature({ a: 1 }), feature({ b: 2, c: null })]);
    expect((await uploadOf(file)).columns).toEqual(['b', 'a', 'c']);
  });

  test('is read in each way in which texts are written and packed', async () => {
    const file = collection([feature({ name: 'Łódź' })]);
    const ways = [
      Buffer.from(`\uFEFF${file}`),
      Buffer.from(`\uFEFF${file}`, 'utf16le'),
      Buffer.from(`\uFEFF${file}`, 'utf16le').swap16(),
      zipFile([
        { name: 'readme.txt', content: 'a' },
        { name: 'x/town.geojson', content: file },
      ]),
      Buffer.from(`${JSON.stringify(feature({ name: 'Łódź' }))}\n`),
      Buffer.from(JSON.stringify(feature({ name: 'Łódź' }), null, 2)),
    ];
    for (const way of ways) {
      const [row] = await rowsOf(way);
      expect([row?.geometry, row?.properties.name]).toEqual([[SQUARE], 'Łódź']);
    }
    expect(await refusalOf(Buffer.from(file.replace('Łódź', 'Å'), 'latin1'))).toMatch(/UTF-8/);
  });
});
