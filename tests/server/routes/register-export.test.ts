import Excel from 'exceljs';
import { beforeAll, describe, expect, test } from 'vitest';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { box, change, drawn } from '../../support/register.ts';
import { areaSchema, collectionOf } from '../../support/feature-collection.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app } = testApp();
let scheme: Scheme;

beforeAll(async () => {
  scheme = await aScheme({ name: 'Port Dögger / "crossing"' });
  const [outer = []] = box(0, 0, 40)[0] ?? [];
  const [inner = []] = box(10, 10, 20)[0] ?? [];
  await change(scheme, {
    created: [
      drawn('B10', {
        footprint: [[[...outer].reverse(), inner]],
        attributes: { name: '=1+2', use: '-5', groundLevel: -1.25, storeys: 2, address: '@home' },
      }),
      drawn('B2', {
        footprint: [...box(100, 0), ...box(120, 0)],
        attributes: { name: 'A "q", b' },
      }),
      drawn('-B3', { footprint: box(200, 0), attributes: { name: '+44 20' } }),
    ],
  });
});

async function exported(query: Record<string, string>) {
  const agent = await signIn(app(), await aMember(scheme, 'witness'));
  return agent
    .get(`/api/schemes/${scheme.id}/register/export`)
    .query(query)
    .buffer(true)
    .responseType('blob');
}

function bytesOf(body: unknown): Buffer {
  if (!Buffer.isBuffer(body)) throw new Error('A file is bytes.');
  return body;
}

const COLUMNS = JSON.stringify(['reference', 'name', 'use', 'groundLevel', 'storeys', 'area']);

describe('the register as CSV', () => {
  test('has headings with units, no formulas, and numbers as they are', async () => {
    const answer = await exported({ format: 'csv', columns: COLUMNS });
    expect(answer.status).toBe(200);
    expect(answer.headers['content-type']).toBe('text/csv; charset=utf-8');
    expect(answer.headers['content-disposition']).toMatch(
      /^attachment; filename="?port-dogger-crossing-register-\d{4}-\d\d-\d\d\.csv"?$/,
    );
    expect(bytesOf(answer.body).toString('utf8').split('\r\n')).toEqual([
      '\uFEFFReference,Name,Use,Ground level (m),Storeys,Area in plan (m²)',
      "'-B3,'+44 20,,,,100",
      'B2,"A ""q"", b",,,,200',
      "B10,'=1+2,-5,-1.25,2,1200",
      '',
    ]);
  });

  test('holds what is filtered, in the order that is asked for', async () => {
    const answer = await exported({
      format: 'csv',
      columns: '["reference"]',
      filter: '{"ranges":{"area":{"from":150}}}',
      sort: '{"column":"area","descending":true}',
    });
    expect(bytesOf(answer.body).toString('utf8').split('\r\n').slice(1)).toEqual(['B10', 'B2', '']);
  });
});

describe('the register as GeoJSON', () => {
  const schema = collectionOf(areaSchema);

  /** Twice the signed area. */
  function turn(ring: readonly (readonly [number, number])[] = []): number {
    return ring.reduce((sum, [x, y], k) => {
      const [nextX, nextY] = ring[k + 1] ?? [x, y];
      return sum + (x - 3) * (nextY - 54) - (nextX - 3) * (y - 54);
    }, 0);
  }

  test('is in degrees, outer rings anticlockwise, by reference', async () => {
    const answer = await exported({ format: 'geojson', columns: COLUMNS });
    const { features } = schema.parse(JSON.parse(bytesOf(answer.body).toString('utf8')));
    expect(features.map(({ id }) => id)).toEqual(['-B3', 'B2', 'B10']);
    expect(features[2]?.properties).toEqual({
      ...{ reference: 'B10', name: '=1+2', use: '-5', groundLevel: -1.25, storeys: 2, area: 1200 },
    });
    const [, parts, courtyard] = features.map(({ geometry }) => geometry);
    expect(parts?.type).toBe('MultiPolygon');
    if (courtyard?.type !== 'Polygon') throw new Error('One part is a polygon.');
    expect(turn(courtyard.coordinates[0])).toBeGreaterThan(0);
    expect(turn(courtyard.coordinates[1])).toBeLessThan(0);
    expect(courtyard.coordinates[0]?.[0]?.[0]).toBeCloseTo(3, 2);
  });
});

describe('the register as a workbook', () => {
  test('has typed cells, a heading that stays, and says what it is', async () => {
    const filter = '{"any":{"name":["=1+2","+44 20"]}}';
    const answer = await exported({ format: 'xlsx', columns: COLUMNS, filter });
    const book = new Excel.Workbook();
    const { buffer, byteOffset, byteLength } = bytesOf(answer.body);
    await book.xlsx.load(new Uint8Array(buffer, byteOffset, byteLength).slice().buffer);
    expect(book.worksheets.map(({ name }) => name)).toEqual(['Register', 'About']);
    const sheet = book.getWorksheet('Register');
    expect(sheet?.views[0]).toMatchObject({ state: 'frozen', ySplit: 1 });
    const rows = [1, 2, 3].map((row) =>
      [1, 2, 3, 4, 5, 6].map((column) => sheet?.getRow(row).getCell(column).value),
    );
    expect(rows).toEqual([
      ['Reference', 'Name', 'Use', 'Ground level (m)', 'Storeys', 'Area in plan (m²)'],
      ['-B3', '+44 20', null, null, null, 100],
      ['B10', '=1+2', '-5', -1.25, 2, 1200],
    ]);
    const about = new Map<unknown, unknown>();
    book.getWorksheet('About')?.eachRow((row) => {
      about.set(row.getCell(1).value, row.getCell(2).value);
    });
    expect(about.get('Scheme')).toBe('Port Dögger / "crossing"');
    expect(about.get('Filter')).toBe('Name is =1+2 or +44 20');
    expect(about.get('Buildings')).toBe('2');
    expect(about.get('By')).toMatch(/^Person \d+$/);
  });

  test('holds thousands', async () => {
    const many = await aScheme();
    const created = Array.from({ length: 3000 }, (_, k) =>
      drawn(`B${k}`, { footprint: box(12 * (k % 100), 12 * Math.floor(k / 100)) }),
    );
    await change(many, { created });
    const agent = await signIn(app(), await aMember(many, 'assessor'));
    const address = `/api/schemes/${many.id}/register/export`;
    const lines = (await agent.get(address).query({ format: 'csv' })).text.split('\r\n');
    expect(lines).toHaveLength(3002);
    expect(lines[3000]).toMatch(/^B2999,/);
    const book = await agent.get(address).query({ format: 'xlsx' }).responseType('blob');
    expect(bytesOf(book.body).toString('latin1', 0, 2)).toBe('PK');
  });
});

test.each([
  { format: 'pdf' },
  { format: 'csv', columns: '[]' },
  { format: 'csv', columns: '["x"]' },
])('an export refuses %j', async (query) => {
  expect((await exported(query)).status).toBe(422);
});
