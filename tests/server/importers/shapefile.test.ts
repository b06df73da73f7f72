import { describe, expect, test } from 'vitest';
import { refusalOf, rowsOf, uploadOf } from '../../support/upload-of.ts';
import { shpFile, tableFile, type Column, type Shape } from '../../support/shapefile.ts';
import { zipFile } from '../../support/zip-file.ts';

type Point = readonly [number, number];

function box(x: number, y: number, size: number): readonly Point[] {
  return [[x, y], [x, y + size], [x + size, y + size], [x + size, y], [x, y]]; // prettier-ignore
}

function archive(
  shapes: readonly Shape[],
  table?: Buffer,
  beside: Record<string, string | Buffer> = {},
) {
  return zipFile([
    { name: 'Town/B.SHP', content: shpFile('areas', shapes) },
    ...(table === undefined ? [] : [{ name: 'Town/b.dbf', content: table }]),
    ...Object.entries(beside).map(([ending, content]) => ({ name: `Town/b.${ending}`, content })),
  ]);
}

const ONE: Shape = { parts: [box(0, 0, 10)] };

describe('a table beside shapes', () => {
  const columns: readonly Column[] = [
    { name: 'TEXT', type: 'C', length: 10 },
    { name: 'NUMBER', type: 'N', length: 20 },
    { name: 'DAY', type: 'D', length: 8 },
    { name: 'YES', type: 'L', length: 1 },
    { name: 'WHOLE', type: 'I', length: 4 },
    { name: 'MEMO', type: 'M', length: 10 },
  ];

  test('is read as texts, numbers, days and yes or no', async () => {
    const table = tableFile(columns, [
      ['Quay 7', '12.50', '20261201', 'T', Buffer.from([7, 0, 0, 0]), '1'],
      ['', '****', '00000000', '?', Buffer.from([255, 255, 255, 255]), ''],
      ['0', '12345678901234567890', '1926', 'n', Buffer.alloc(4), ''],
    ]);
    const rows = await rowsOf(archive([ONE, ONE, ONE], table));
    expect(rows.map(({ properties }) => Object.values(properties))).toEqual([
      ['Quay 7', 12.5, '2026-12-01', true, 7, null],
      [null, null, null, null, -1, null],
      ['0', '12345678901234567890', null, false, 0, null],
    ]);
  });

  test('leaves out rows that were deleted', async () => {
    const [name] = columns;
    const table = tableFile(name ? [name] : [], [['a'], ['b'], ['c']], { deleted: [1] });
    const rows = await rowsOf(archive([ONE, ONE, ONE], table));
    expect(rows.map(({ row, properties }) => [row, properties.TEXT])).toEqual([
      [1, 'a'],
      [3, 'c'],
    ]);
  });

  test('has to have as many rows as there are shapes', async () => {
    const table = tableFile(columns.slice(0, 1), [['a'], ['b']]);
    expect(await refusalOf(archive([ONE], table))).toMatch(/table .* has 2 rows/);
    expect(await refusalOf(archive([ONE, ONE, ONE], table))).toMatch(/table .* has 2 rows/);
  });

  test.each([
    ['a .cpg of UTF-8', Buffer.from('Łódź'), { cpg: 'UTF-8' }, 0, 'Łódź'],
    ['a .cpg of a number', Buffer.from([0xa3, 0xf3, 0x64, 0x9f]), { cpg: '1250' }, 0, 'Łódź'],
    ['a .cpg of letters and a number', Buffer.from('Å', 'latin1'), { cpg: 'ISO 8859-1' }, 0, 'Å'],
    ['a language in its heading', Buffer.from([0x8f, 0x87]), {}, 0x02, 'Åç'],
    ['nothing', Buffer.from('Å', 'latin1'), {}, 0, 'Å'],
    ['nothing, and is in UTF-8', Buffer.from('Å'), {}, 0x57, 'Å'],
    ['a .cpg of UTF-8 that is wrong', Buffer.from('Ñandú', 'latin1'), { cpg: 'UTF-8' }, 0, 'Ñandú'],
    [
      'a .cpg of UTF-8 and a narrow column',
      Buffer.from('Calle añó').subarray(0, 10),
      { cpg: 'UTF-8' },
      0,
      'Calle añ',
    ],
    ['a .cpg of nonsense', Buffer.from('Å', 'latin1'), { cpg: '<html>\0' }, 0, 'Å'],
  ])('is read where %s tells its letters', async (_, bytes, beside, language, text) => {
    const table = tableFile(columns.slice(0, 1), [[bytes]], { language });
    const file = archive([ONE], table, beside);
    expect((await rowsOf(file))[0]?.properties.TEXT).toBe(text);
    const notes = (await uploadOf(file)).notes.filter((note) => note.includes('.cpg'));
    expect(notes).toHaveLength('cpg' in beside && beside.cpg.startsWith('<') ? 1 : 0);
  });
});

describe('shapes', () => {
  test('are sorted into parts and holes by where they lie, in whatever direction they run', async () => {
    const rings = [box(4, 4, 2), box(0, 0, 10), box(20, 0, 5), box(2, 2, 6), box(21, 1, 1)];
    for (const parts of [rings, rings.map((ring) => [...ring].reverse()), rings.toReversed()]) {
      const [row] = await rowsOf(archive([{ parts }]));
      const sorted = row?.geometry?.map((part) => part.map((ring) => ring.length && ring[0]?.[0]));
      expect(sorted?.map((part) => part.length).sort()).toEqual([1, 2, 2]);
    }
  });

  test('of none are rows without a geometry', async () => {
    const whole = shpFile('areas', [ONE]);
    const none = Buffer.concat([Buffer.from('0000000200000002', 'hex'), Buffer.alloc(4)]);
    const content = Buffer.concat([whole, none]);
    const rows = await rowsOf(zipFile([{ name: 'a.shp', content }]));
    expect(rows.map(({ fault }) => fault)).toEqual([null, 'It has no geometry.']);
  });

  test.each([
    ['PROJCS["X",GEOGCS["Y"]]', { wkt: 'PROJCS["X",GEOGCS["Y"]]', said: 'X' }, undefined],
    ['\uFEFFGEOGCRS["Z"]', { wkt: 'GEOGCRS["Z"]', said: 'Z' }, undefined],
    ['<html>404</html>', null, /holds a web page instead of a system/],
    ['EPSG 25830', null, /describes no system/],
    ['EPSG:25830\n', { code: 25830, said: 'EPSG:25830' }, undefined],
    ['+proj=utm +zone=30', { wkt: '+proj=utm +zone=30', said: '+proj=utm +zone=30' }, undefined],
    [
      '+init=epsg:25830',
      { code: 25830, wkt: '+init=epsg:25830', said: '+init=epsg:25830' },
      undefined,
    ],
    [Buffer.from('PROJCS["X"]', 'utf16le'), { wkt: 'PROJCS["X"]', said: 'X' }, undefined],
    [Buffer.alloc(200), null, /describes no system/],
    [undefined, null, /has no \.prj file/],
  ])('beside a .prj %j', async (prj, crs, note) => {
    const upload = await uploadOf(archive([ONE], undefined, prj === undefined ? {} : { prj }));
    expect(upload.crs).toEqual(crs);
    expect(upload.notes).toEqual(note === undefined ? [] : [expect.stringMatching(note)]);
  });
});
