import ExcelJS from 'exceljs';
import { describe, expect, test } from 'vitest';
import { sheetOf, workbookOf } from '../../../scripts/bench/hostile/archive-files.ts';
import { refusalOf, rowsOf, uploadOf } from '../../support/upload-of.ts';

const POLYGON = 'POLYGON((3 54,3.1 54,3.1 54.1,3 54))';
const RINGS = [[[[3, 54], [3.1, 54], [3.1, 54.1], [3, 54]]]]; // prettier-ignore

async function values(bytes: Buffer | string): Promise<unknown[][]> {
  return (await rowsOf(bytes)).map(({ row, properties }) => [row, ...Object.values(properties)]);
}

describe('CSV', () => {
  test.each([',', ';', '\t', '|'])('is read with %j between its values', async (delimiter) => {
    const file = [['reference', 'level'], ['007', '3,5'], ['', ' ']] // prettier-ignore
      .map((line) => line.map((value) => `"${value}"`).join(delimiter))
      .join('\n');
    const upload = await uploadOf(file);
    expect(upload).toMatchObject({ format: 'csv', kind: 'values', crs: null, count: 1 });
    expect(await values(file)).toEqual([[2, '007', '3,5']]);
  });

  test('counts rows as a spreadsheet does, with blank ones and breaks in quotes', async () => {
    const file = 'sep=;\r\na;b\r\n1;"x\r\ny; ""z"""\r\n\r\n2;\r\n';
    expect(await values(file)).toEqual([
      [2, '1', 'x\r\ny; "z"'],
      [4, '2', null],
    ]);
  });

  test('is read in Windows-1252 where it is not UTF-8, and in UTF-16 by its mark', async () => {
    const file = 'reference,street\n1,Ålgade “bajo”\n';
    const western = Buffer.from(file.replace('“', '\u0093').replace('”', '\u0094'), 'latin1');
    for (const way of [
      western,
      Buffer.from(`\uFEFF${file}`),
      Buffer.from(`\uFEFF${file}`, 'utf16le'),
    ]) {
      expect(await values(way)).toEqual([[2, '1', 'Ålgade “bajo”']]);
    }
  });

  test.each([false, true])('is read in UTF-16 without its mark (turned: %j)', async (isTurned) => {
    const bytes = Buffer.from('reference,street\n1,Ålgade “bajo”\n', 'utf16le');
    expect(await values(isTurned ? bytes.swap16() : bytes)).toEqual([[2, '1', 'Ålgade “bajo”']]);
  });

  test('has names for columns that have none, or the same', async () => {
    const upload = await uploadOf('a,,a,a,__proto__\n1,2,3,4,5\n');
    expect(upload.columns).toEqual(['a', 'column 2', 'a (2)', 'a (3)', '__proto__']);
  });

  test('has faults where a row has more values than the heading', async () => {
    const rows = await rowsOf('a,b\n1,2,3\n1\n1,2,,\n');
    expect(rows.map(({ fault }) => fault)).toEqual(['It has 3 values for 2 columns.', null, null]);
  });

  test.each([
    POLYGON,
    `SRID=25830;${POLYGON}`,
    `  polygon ZM ((3 54 7 1, 3.1 54 7 1, 3.1 54.1 7 1, 3 54 7 1))`,
    'POLYGONZ((3 54 7,3.1 54 7,3.1 54.1 7,3 54 7))',
    'MULTIPOLYGON M (((3.0e0 +54 1,3.1 54 1,3.1 54.1 1,3 54 1)));',
  ])('finds footprints in %s', async (wkt) => {
    const file = `shape_text;reference\n"${wkt}";1\n;2\nPOLYGON EMPTY;3\nPOINT(1 2);4`;
    const rows = await rowsOf(file);
    expect(rows.map(({ geometry }) => geometry)).toEqual([RINGS, null, null, null]);
    expect(rows.map(({ fault }) => fault)).toEqual([
      null,
      'It has no geometry.',
      'Its geometry is empty.',
      'It is a point: a footprint is a polygon.',
    ]);
    const upload = await uploadOf(file);
    expect([upload.kind, upload.columns]).toEqual(['footprints', ['reference']]);
    expect(upload.crs?.code).toBe(wkt.startsWith('SRID') ? 25830 : undefined);
  });

  test('of points by X and Y holds values', async () => {
    expect((await uploadOf('x,y,name\n1,2,a\n')).kind).toBe('values');
    expect(await refusalOf('X_Coord;Y_Coord;Z\n1;2;3\n')).toContain('points are not footprints');
  });

  test.each([
    ['', 4326],
    [',"crs":{"type":"name","properties":{"name":"EPSG:25830"}}', 25830],
  ])('finds footprints in GeoJSON%s', async (more, code) => {
    const polygon = `{"type":"Polygon"${more},"coordinates":${JSON.stringify(RINGS[0])}}`;
    const texts = [polygon, `{"type":"Feature","geometry":${polygon}}`, polygon.slice(0, -9), '{"type":"Point","coordinates":[1,2]}']; // prettier-ignore
    const file = ['ref,geom', ...texts.map((text, k) => `${k},"${text.replaceAll('"', '""')}"`)].join('\n'); // prettier-ignore
    const upload = await uploadOf(file);
    expect([upload.kind, upload.columns, upload.crs?.code]).toEqual(['footprints', ['ref'], code]);
    const rows = await rowsOf(file);
    expect(rows.map(({ geometry }) => geometry)).toEqual([RINGS, RINGS, null, null]);
    expect(rows.map(({ fault }) => fault)).toEqual([
      null,
      null,
      'Its GeoJSON is damaged: it may be cut off.',
      'It is a point: a footprint is a polygon.',
    ]);
  });

  test('does not take GeoJSON that is nested without end', async () => {
    const deep = '{"type":"GeometryCollection","geometries":['.repeat(20_000);
    const good = '{"type":"Polygon","coordinates":[[[3,54],[3.1,54],[3.1,54.1],[3,54]]]}';
    const file = `ref,geom\n${[deep, good].map((text, k) => `${k},"${text.replaceAll('"', '""')}"`).join('\n')}`;
    const [first] = await rowsOf(file);
    expect(first?.fault).toBe('Its GeoJSON is nested too deep.');
  });
});

describe('a workbook', () => {
  test('gives results of formulas, days as texts, and texts without their looks', async () => {
    const workbook = new ExcelJS.Workbook();
    workbook.addWorksheet('Empty');
    workbook.addWorksheet('Hidden', { state: 'hidden' }).addRow(['no', 'never']);
    const sheet = workbook.addWorksheet('Levels');
    sheet.addRow(['Levels of the town']);
    sheet.addRow([]);
    sheet.addRow(['reference', 'level', 'day', 'time', 'listed', 'rich', 'wrong']);
    sheet.addRow([
      '007',
      { formula: '1+1.5', result: 2.5 },
      new Date(Date.UTC(2026, 11, 1)),
      new Date(Date.UTC(2026, 11, 1, 13, 30)),
      true,
      { richText: [{ text: 'Quay ' }, { font: { bold: true }, text: '7' }] },
      { error: '#N/A' },
    ]);
    sheet.getCell('C4').numFmt = 'dd/mm/yyyy';
    sheet.getCell('D4').numFmt = '[$-409]d-mmm-yy h:mm;@';
    sheet.getCell('H9').numFmt = '0.00 "days"';
    const file = Buffer.from(await workbook.xlsx.writeBuffer());
    expect(await uploadOf(file)).toMatchObject({ format: 'xlsx', kind: 'values', layer: 'Levels' });
    expect(await values(file)).toEqual([
      [4, '007', 2.5, '2026-12-01', '2026-12-01T13:30:00', true, 'Quay 7', null],
    ]);
  });

  test('may say nothing of where its cells are, and claim to be as large as can be', async () => {
    const text = (value: string) => `<x:c t="inlineStr"><x:is><x:t>${value}</x:t></x:is></x:c>`;
    const row = (...cells: string[]) => `<x:row>${cells.join('')}</x:row>`;
    const sheet = sheetOf(
      row(text('a'), text('b')) + row(text('1'), '<x:c/>') + row('<x:c><x:v>2.5</x:v></x:c>'),
      '<dimension ref="A1:XFD1048576"/>',
    );
    expect(await values(workbookOf(sheet))).toEqual([
      [2, '1', null],
      [3, 2.5, null],
    ]);
  });
});
