import { describe, expect, test } from 'vitest';
import { readBackground } from '../../../server/importers/read-background.ts';
import type { BackgroundLayer } from '../../../shared/schemas/background.ts';
import { dbfFile, shpFile, UTM_31_PRJ, type Shape } from '../../support/shapefile.ts';
import { zipFile, type ZipFile } from '../../support/zip-file.ts';

const LINE = [[3, 54], [3.1, 54.2]]; // prettier-ignore
const SHAPE: Shape = { parts: [[[500_000, 6_080_000], [500_100, 6_080_000]]] }; // prettier-ignore

function feature(type: string, coordinates: unknown): object {
  return { type: 'Feature', properties: null, geometry: { type, coordinates } };
}

function collection(features: readonly unknown[], more: object = {}): string {
  return JSON.stringify({ type: 'FeatureCollection', ...more, features });
}

function read(file: string | Buffer, layer: BackgroundLayer = 'streets') {
  return readBackground(Buffer.from(file), layer);
}

/** What the refusal says, and its code. */
async function refusal(file: string | Buffer, layer?: BackgroundLayer): Promise<string> {
  const error: unknown = await read(file, layer).then(
    () => 'It was taken.',
    (reason: unknown) => reason,
  );
  const { code, message } = error as { code: string; message: string };
  return `${code}: ${message}`;
}

function zipped(...files: readonly ZipFile[]): Buffer {
  return zipFile([
    { name: 'a.shp', content: shpFile('lines', [SHAPE]) },
    { name: 'a.prj', content: UTM_31_PRJ },
    ...files,
  ]);
}

describe('GeoJSON', () => {
  test.each([
    ['streets', 'LineString', LINE],
    ['rail', 'MultiLineString', [LINE, LINE]],
    ['water', 'LineString', LINE],
    ['water', 'Polygon', [[...LINE, [3.2, 54], [3, 54]]]],
    ['parks', 'MultiPolygon', [[[...LINE, [3.2, 54], [3, 54]]]]],
  ] as const)('for %s may hold a %s', async (layer, type, coordinates) => {
    const [row] = await read(collection([feature(type, coordinates)]), layer);
    expect(row?.geometry).toEqual({ type, coordinates });
  });

  test.each([
    ['streets', 'Polygon'],
    ['rail', 'Point'],
    ['parks', 'LineString'],
    ['water', 'GeometryCollection'],
  ] as const)('for %s may not hold a %s', async (layer, type) => {
    expect(await refusal(collection([feature(type, LINE)]), layer)).toMatch(
      /^invalid-input: 1 of 1 rows are not right/,
    );
  });

  test('loses heights and closes rings', async () => {
    const ring = [[3, 54, 7], [3.1, 54, 7], [3.1, 54.1, 7]]; // prettier-ignore
    const [row] = await read(collection([feature('Polygon', [ring])]), 'parks');
    const closed = [[3, 54], [3.1, 54], [3.1, 54.1], [3, 54]]; // prettier-ignore
    expect(row?.geometry.coordinates).toEqual([closed]);
  });

  test.each([
    ['urn:ogc:def:crs:OGC:1.3:CRS84', [3, 54]],
    ['urn:ogc:def:crs:EPSG::4326', [3, 54]],
    ['EPSG:4258', [3, 54]],
  ])('in %s is in degrees', async (name, first) => {
    const file = collection([feature('LineString', LINE)], { crs: { properties: { name } } });
    const [row] = await read(file);
    expect([row?.bounds.west, row?.bounds.south]).toEqual(first);
  });

  test.each([
    ['EPSG:9999', /^unreadable: The grid "EPSG:9999" is not known here/],
    ['Mars', /^unreadable: The grid "Mars" is not known here/],
    ['EPSG:5513', /axes .* do not run east and north/],
  ])('in %s is refused', async (name, words) => {
    const file = collection([feature('LineString', LINE)], { crs: { properties: { name } } });
    expect(await refusal(file)).toMatch(words);
  });

  test('that is no JSON is refused by its place', async () => {
    const text = collection([feature('LineString', [[3, 'NaN'], [3.1, 54]])]); // prettier-ignore
    expect(await refusal(text.replace('"NaN"', 'NaN'))).toBe(
      'unreadable: The file is not JSON. features[0].geometry.coordinates[0][1]: "NaN" is not a value that JSON can hold (line 1, column 127)',
    );
    expect(await refusal(text.replace('"NaN"', '1e999'))).toMatch(/^invalid-input: 1 of 1 rows/);
    expect(await refusal(text.slice(0, -3))).toMatch(/the text ends too early/);
    const western = Buffer.from(
      text.replace('"NaN"', '54').replace('null', '{"name":"Å"}'),
      'latin1',
    );
    expect(await refusal(western)).toMatch(/^unreadable: The file is not a text in UTF-8/);
  });

  test.each(['{}', '[]', '{"type":"Topology"}', '[1,2]', '{"type":"FeatureCollection"}'])(
    'that is no collection is refused: %s',
    async (text) => {
      expect(await refusal(text)).toMatch(/is not a FeatureCollection/);
    },
  );

  test('that holds nothing is refused', async () => {
    expect(await refusal(collection([]))).toMatch(/holds nothing to draw/);
  });

  test('that holds more than 200,000 features is refused', async () => {
    const file = `{"type":"FeatureCollection","features":[${'0,'.repeat(200_000)}0]}`;
    expect(await refusal(file)).toMatch(/^too-large: .*200,000/);
  });

  test('that is nested 200,000 deep is refused', async () => {
    const deep = '['.repeat(200_000) + ']'.repeat(200_000);
    expect(await refusal(deep)).toMatch(/nested more than 100 deep/);
    const inProperties = collection([]).replace('[]', `[{"properties":${deep}}]`);
    expect(await refusal(inProperties)).toMatch(/nested more than 100 deep/);
    const inText = JSON.stringify('['.repeat(1000));
    const harmless = collection([feature('LineString', LINE)]).replace(
      'null',
      `{"name":${inText}}`,
    );
    expect(await read(harmless)).toHaveLength(1);
  });

  test('that holds millions of empty lists is refused', async () => {
    const lists = `[${'[],'.repeat(3_000_001)}0]`;
    expect(await refusal(lists)).toMatch(/is not a FeatureCollection/);
    const file = collection([]).replace('[]', lists);
    expect(await refusal(file)).toMatch(/^too-large: /);
  });

  test('may be one feature, or features line by line', async () => {
    const one = JSON.stringify(feature('LineString', LINE));
    expect(await read(one)).toHaveLength(1);
    expect(await read(`${one}\n${one}\n`)).toHaveLength(2);
    expect(await read(`\u001e${one}\n\u001e${one}`)).toHaveLength(2);
  });

  test('with names that are not texts has none', async () => {
    for (const name of [7, null, { toString: 'x' }, '  ', '\u0000']) {
      const named = { ...feature('LineString', LINE), properties: { name } };
      expect((await read(collection([named])))[0]?.name).toBeNull();
    }
    const long = { ...feature('LineString', LINE), properties: { NAME: 'x'.repeat(900) } };
    expect((await read(collection([long])))[0]?.name).toHaveLength(200);
  });
});

describe('a Shapefile', () => {
  test('may hold areas with holes', async () => {
    const outer = [[500_000, 6_080_000], [500_000, 6_080_100], [500_100, 6_080_100], [500_100, 6_080_000], [500_000, 6_080_000]] as const; // prettier-ignore
    const hole = [...outer]
      .reverse()
      .map(([e, n]) => [e / 2 + 250_020, n / 2 + 3_040_020] as const);
    const shp = shpFile('areas', [{ parts: [outer, hole] }]);
    const file = zipFile([
      { name: 'p.shp', content: shp },
      { name: 'p.prj', content: UTM_31_PRJ },
    ]);
    const [row] = await read(file, 'parks');
    expect(row?.geometry.type).toBe('Polygon');
    expect(row?.geometry.coordinates).toHaveLength(2);
  });

  test('of points, or with a record of no shape, is refused', async () => {
    const points = shpFile('points', [SHAPE]);
    const prj = { name: 'a.prj', content: UTM_31_PRJ };
    expect(await refusal(zipFile([{ name: 'a.shp', content: points }, prj]))).toMatch(
      /^invalid-input: 1 of 1 rows/,
    );
    const empty = Buffer.concat([shpFile('lines', []), Buffer.from('0000000100000002', 'hex'), Buffer.alloc(4)]); // prettier-ignore
    expect(await refusal(zipFile([{ name: 'a.shp', content: empty }, prj]))).toMatch(
      /^invalid-input: 1 of 1 rows/,
    );
  });

  test('reads names in the letters that its table says', async () => {
    const page = { name: 'a.cpg', content: '1252' };
    const western = zipped({ name: 'a.dbf', content: dbfFile(['Ålgade'], 'latin1') }, page);
    expect((await read(western))[0]?.name).toBe('Ålgade');
    const utf8 = zipped({ name: 'a.dbf', content: dbfFile(['Łódzka']) });
    expect((await read(utf8))[0]?.name).toBe('Łódzka');
  });

  test.each([
    ['no .shp', [{ name: 'a.md', content: 'x' }], /holds 0 \.shp files/],
    ['no .prj', [{ name: 'a.shp', content: shpFile('lines', [SHAPE]) }], /has no \.prj file/],
    [
      'another grid’s name',
      [
        { name: 'a.shp', content: '' },
        { name: 'a.prj', content: 'GEOGRAPHIC MOON' },
      ],
      /describes no system that can be read/,
    ],
    [
      'an endless .prj',
      [
        { name: 'a.shp', content: '' },
        { name: 'a.prj', content: UTM_31_PRJ.repeat(30) },
      ],
      /describes no system that can be read/,
    ],
  ])('with %s is refused', async (_, files, words) => {
    expect(await refusal(zipFile(files))).toMatch(words);
  });

  test('beside another is refused', async () => {
    const other = { name: 'b/b.SHP', content: shpFile('lines', [SHAPE]) };
    expect(await refusal(zipped(other))).toMatch(/holds 2 \.shp files/);
  });

  test('that is damaged is refused', async () => {
    const whole = shpFile('lines', [SHAPE, SHAPE]);
    const changed = (at: number, value: number) => {
      const bytes = Buffer.from(whole);
      bytes.writeInt32LE(value, at);
      return bytes;
    };
    const bigEndian = (at: number, value: number) => {
      const bytes = Buffer.from(whole);
      bytes.writeInt32BE(value, at);
      return bytes;
    };
    const damaged = [
      whole.subarray(0, 50),
      whole.subarray(0, 150),
      changed(144, 1_000_000_000), // parts
      changed(144, -1),
      changed(148, 2_000_000_000), // points
      changed(152, 7), // first part
      bigEndian(104, -4), // length of a record
      bigEndian(104, 0),
      bigEndian(104, 2_000_000),
    ];
    for (const shp of damaged) {
      const file = zipFile([
        { name: 'a.shp', content: shp },
        { name: 'a.prj', content: UTM_31_PRJ },
      ]);
      expect(await refusal(file)).toMatch(/^unreadable: The shapes cannot be read/);
    }
  });

  test('with a table that claims more rows than it has is refused', async () => {
    const table = dbfFile(['Quay']);
    table.writeUInt32LE(4_000_000_000, 4);
    expect(await refusal(zipped({ name: 'a.dbf', content: table }))).toMatch(/table .* damaged/);
    expect(await refusal(zipped({ name: 'a.dbf', content: 'x' }))).toMatch(/table .* damaged/);
  });
});

describe('an archive', () => {
  test.each(['../a.dbf', '/a.dbf', 'x\\a.dbf', 'C:a.dbf', 'x/../a.dbf', 'a\0.dbf'])(
    'whose names lead out of it is refused: %j',
    async (name) => {
      expect(await refusal(zipped({ name, content: 'x' }))).toMatch(/leads out of the archive/);
    },
  );

  test('in an archive, or deep in folders, is refused', async () => {
    expect(await refusal(zipped({ name: 'more.ZIP', content: 'x' }))).toMatch(
      /archive in the archive/,
    );
    expect(await refusal(zipped({ name: 'a/b/c/d/e/f.dbf', content: 'x' }))).toMatch(/too deep/);
  });

  test('that unpacks to far too much is refused before it is unpacked', async () => {
    const zeros = Buffer.alloc(30 * 1024 * 1024);
    expect(await refusal(zipped({ name: 'a.dbf', content: zeros }))).toMatch(/unpacks to far too/);
    const claims = { unpacked: 401 * 1024 * 1024 };
    const noise = Buffer.from(Array.from({ length: 500_000 }, (_, k) => (k * k * 31) % 251));
    expect(await refusal(zipped({ name: 'b.bin', content: noise, claims }))).toMatch(
      /^(too-large|unreadable): .*(400 MB|far too much)/,
    );
  });

  test('that unpacks to more than it says is refused while it is unpacked', async () => {
    const content = Buffer.alloc(30 * 1024 * 1024);
    const claims = { unpacked: 1000 };
    expect(await refusal(zipped({ name: 'a.dbf', content, claims }))).toBe(
      'unreadable: The archive cannot be read: "a.dbf" is damaged.',
    );
  });

  test('of too many files, or of files that overlap, is refused', async () => {
    const many = Array.from({ length: 1001 }, (_, k) => ({ name: `${k}.txt`, content: 'x' }));
    expect(await refusal(zipFile(many))).toMatch(/more than 1,000 files/);
    expect(await refusal(zipped({ name: 'A.SHP', content: 'x' }))).toMatch(/overlap/);
  });

  test('that is locked, packed strangely or damaged is refused', async () => {
    const content = 'x';
    expect(await refusal(zipped({ name: 'a.dbf', content, claims: { flags: 1 } }))).toMatch(
      /locked/,
    );
    expect(await refusal(zipped({ name: 'a.dbf', content, claims: { method: 12 } }))).toMatch(
      /packed in a way/,
    );
    const file = zipped();
    for (const half of [file.subarray(0, 100), file.subarray(100), Buffer.from('PK')]) {
      expect(await refusal(half)).toMatch(/^unreadable: /);
    }
    const flipped = Buffer.from(file);
    flipped.writeUInt8(flipped.readUInt8(60) ^ 0xff, 60);
    expect(await refusal(flipped)).toMatch(/^unreadable: .*(damaged|cannot be read)/);
  });
});
