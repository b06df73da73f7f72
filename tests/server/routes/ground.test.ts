import request from 'supertest';
import { describe, expect, test } from 'vitest';
import { z } from 'zod';
import { groundSchema } from '../../../shared/schemas/ground.ts';
import { Building } from '../../../server/models/building.ts';
import { RegisterChange } from '../../../server/models/register-change.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { box, change, drawn, E, N, registered } from '../../support/register.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app } = testApp();

const refusalSchema = z.object({
  error: z.object({
    message: z.string(),
    fields: z.array(z.object({ path: z.string(), message: z.string() })),
  }),
});

async function aTown() {
  const scheme = await aScheme();
  await change(scheme, {
    created: [
      drawn('A', { footprint: box(0, 0) }),
      drawn('B', { footprint: box(20, 20) }),
      drawn('C', { footprint: box(40, 0), attributes: { groundLevel: 7 } }),
    ],
  });
  const agent = await signIn(app(), await aMember(scheme, 'assessor'));
  const address = `/api/schemes/${scheme.id}/ground`;
  const put = (text: string, query: Record<string, string | number> = {}) =>
    agent
      .put(`${address}/file`)
      .query({ source: 'Survey 2026', ...query })
      .attach('file', Buffer.from(text), 'levels.txt');
  return { scheme, agent, address, put };
}

async function levels(scheme: Scheme): Promise<(number | null)[]> {
  return (await registered(scheme)).map(({ groundLevel }) => groundLevel);
}

/** A slope of one in ten to the east, five metres at the origin. */
const SLOPE = [[-100, -100], [100, -100], [100, 100], [-100, 100]] as const; // prettier-ignore

function spots(
  heading: string,
  separator: string,
  number: (value: number) => string = String,
): string {
  const rows = SLOPE.map(([x, y]) =>
    [E + x, N + y, 5 + x / 10].map((value) => number(value)).join(separator),
  );
  return `\uFEFF${[heading, ...rows].join('\r\n')}\r\n`;
}

describe('one level for a scheme', () => {
  test('is given to buildings without one, and to new ones, and taken away again', async () => {
    const { scheme, agent, address } = await aTown();
    const answer = await agent.put(address).send({ level: 4.5, source: 'Flat' });
    expect(answer.status).toBe(200);
    expect(groundSchema.parse(answer.body)).toMatchObject({
      ground: { kind: 'level', source: 'Flat', points: 1, lowest: 4.5, highest: 4.5 },
      buildings: { fromGround: 2, fromFile: 1, byHand: 0, unknown: 0 },
    });
    expect(await levels(scheme)).toEqual([4.5, 4.5, 7]);
    await change(scheme, { created: [drawn('D', { footprint: box(60, 0) })] }, { kind: 'draw' });
    const [a] = await registered(scheme);
    expect((await registered(scheme))[3]).toMatchObject({
      ...{ groundLevel: 4.5, groundLevelFrom: 'ground' },
    });
    const edit = { version: 2, attributes: { groundLevel: 5 } };
    await agent.patch(`/api/schemes/${scheme.id}/buildings/${a?.id ?? 0}`).send(edit);
    await agent.put(address).send({ level: 3, source: 'Other' });
    expect(await levels(scheme)).toEqual([5, 3, 7, 3]);
    expect(await RegisterChange.count({ where: { schemeId: scheme.id, kind: 'ground' } })).toBe(2);
    const removed = await agent.delete(address);
    expect(groundSchema.parse(removed.body)).toMatchObject({
      ...{ ground: null, buildings: { fromGround: 0, fromFile: 1, byHand: 1, unknown: 2 } },
    });
    expect(await levels(scheme)).toEqual([5, null, 7, null]);
    expect(groundSchema.parse((await agent.get(address)).body).ground).toBeNull();
  });

  test.each([{ level: 'x', source: 'a' }, { level: 1 }, { level: 10_000, source: 'a' }, {}])(
    'is refused as %j',
    async (body) => {
      const { scheme, agent, address } = await aTown();
      expect((await agent.put(address).send(body)).status).toBe(422);
      expect(await levels(scheme)).toEqual([null, null, 7]);
    },
  );
});

describe('spot heights', () => {
  test.each([
    ['x, y and z', spots('x,y,z', ',')],
    ['eastings with units', spots('Easting (m);Northing (m);Level (m)', ';')],
    ['decimal commas', spots('E;N;Height', ';', (value) => value.toFixed(2).replace('.', ','))],
    ['tabs', spots('id\tx\ty\tz', '\t').replaceAll(/\r\n(?=\d)/g, '\r\n1\t')],
  ])('by %s are joined by triangles', async (_, text) => {
    const { scheme, put } = await aTown();
    const answer = await put(text);
    expect([answer.status, answer.body]).toMatchObject([
      200,
      { ground: { kind: 'spots', points: 4, lowest: -5, highest: 15 } },
    ]);
    expect(await levels(scheme)).toEqual([5.5, 7.5, 7]);
  });

  test('by longitude and latitude, or in another grid, are brought to the scheme’s', async () => {
    const { scheme, put } = await aTown();
    const degrees = 'lon;lat;z\n2.99;54.85;5\n3.01;54.85;5\n3.01;54.88;5\n2.99;54.88;5\n';
    expect((await put(degrees)).status).toBe(200);
    expect(await levels(scheme)).toEqual([5, 5, 7]);
    const other = 'x,y,z\n114000,6100000,6\n118000,6100000,6\n116000,6000000,6\n';
    const moved = await put(other, { crs: 32632 });
    expect([moved.status, moved.body]).toMatchObject([200, { ground: { highest: 6 } }]);
    expect(await levels(scheme)).toEqual([6, 6, 7]);
    expect((await put(other, { crs: 4 })).status).toBe(422);
  });

  test('outside of them the nearest tells, and the change says so', async () => {
    const { scheme, put } = await aTown();
    expect((await put(`x,y,z\n${E - 90},${N},1\n${E - 80},${N},2\n${E - 80},${N + 9},3`)).status).toBe(200); // prettier-ignore
    expect(await levels(scheme)).toEqual([3, 3, 7]);
    const [change] = await RegisterChange.findAll({
      where: { schemeId: scheme.id, kind: 'ground' },
    });
    expect(change?.source).toBe('Survey 2026 (2 outside it took the nearest level)');
  });

  test('on one line, at one place or of one point do as well as they can', async () => {
    const { scheme, put } = await aTown();
    for (const rows of [
      `${E},${N},1`,
      `${E},${N},1\n${E},${N},1`,
      `${E},${N},1\n${E + 1},${N},1\n${E + 2},${N},1`,
    ]) {
      expect((await put(`x,y,z\n${rows}\n`)).status).toBe(200);
      expect(await levels(scheme)).toEqual([1, 1, 7]);
    }
  });

  test.each([
    ['nothing', ''],
    ['no heading', '1,2,3\n4,5,6\n'],
    ['no point', 'x,y,z\n'],
    ['a word', 'x,y,z\n1,2,x\n'],
    ['a hole', 'x,y,z\n1,2\n'],
    ['levels beyond the earth', 'x,y,z\n1,2,99999\n'],
    ['a quotation that does not end', 'x,y,z\n"1,2,3\n'],
    ['no text', '\0\0\0'],
    ['infinity', 'x,y,z\nInfinity,2,3\n'],
  ])('are refused with %s', async (_, text) => {
    const { scheme, put } = await aTown();
    const answer = await put(text);
    expect([answer.status, answer.body]).toMatchObject([422, { error: { code: 'unreadable' } }]);
    expect(await levels(scheme)).toEqual([null, null, 7]);
  });
});

describe('what is wrong with a file of levels', () => {
  async function faultsOf(text: string) {
    const { put } = await aTown();
    const answer = await put(text);
    expect(answer.status).toBe(422);
    return refusalSchema.parse(answer.body).error;
  }

  test('is told for every row at once', async () => {
    const rows = [`${E},${N},1`, `${E},${N},high`, `${E},${N}`, `,${N},1`, `${E},${N},9001`];
    const { message, fields } = await faultsOf(`E,N,Level (m)\n${rows.join('\n')}\n`);
    expect(message).toBe('4 places cannot be read.');
    expect(fields.map((fault) => fault.message)).toEqual([
      'Row 3: “high” in column “Level (m)” is not a number.',
      'Row 4: column “Level (m)” is blank.',
      'Row 5: column “E” is blank.',
      'Row 6: no ground lies at 9001 m. Check the units.',
    ]);
  });

  test('is told one by one up to fifty, then counted', async () => {
    const { message, fields } = await faultsOf(`x,y,z\n${'1,2,x\n'.repeat(1204)}`);
    expect(message).toBe('1 204 places cannot be read; the first 50 are listed.');
    expect([fields.length, fields.at(-1)?.path]).toEqual([50, 'row 51']);
  });

  test('is told by row and column of a grid', async () => {
    const heading = `ncols 2\nnrows 2\nxllcorner ${E}\nyllcorner ${N}\ncellsize 5\n`;
    const { fields } = await faultsOf(`${heading}1 two\nthree 4\n`);
    expect(fields.map((fault) => fault.message)).toEqual([
      'Row 1, column 2: “two” is not a number.',
      'Row 2, column 1: “three” is not a number.',
    ]);
  });
});

describe('a grid of levels', () => {
  const HEADING = {
    ncols: 3,
    nrows: 3,
    xllcenter: E - 5,
    yllcenter: N - 5,
    cellsize: 20,
    nodata_value: -9999,
  };

  function grid(values: string, heading: Record<string, number | string | undefined> = {}): string {
    const given: Record<string, number | string | undefined> = { ...HEADING, ...heading };
    const lines = Object.entries(given)
      .filter(([, value]) => value !== undefined)
      .map(([key, value]) => `${key}  ${String(value)}`);
    return `${lines.reverse().join('\r\n')}\r\n${values}\r\n`;
  }
  // from the north: centres at −5, 15 and 35 m either way
  const VALUES = '1 2 3\n 4 5 6\n7 8 9';

  test('is read between cells, from the north, its heading in any order', async () => {
    const { scheme, put } = await aTown();
    const answer = await put(grid(VALUES));
    expect([answer.status, answer.body]).toMatchObject([
      200,
      { ground: { kind: 'grid', points: 9, lowest: 1, highest: 9 } },
    ]);
    // A lies half-way between 7, 8, 4 and 5, B half-way between 5, 6, 2 and 3
    expect(await levels(scheme)).toEqual([6, 4, 7]);
  });

  test('by its corner, capital letters, and with cells that have none', async () => {
    const { scheme, put } = await aTown();
    const corner = {
      xllcenter: undefined,
      yllcenter: undefined,
      xllcorner: E - 15,
      yllcorner: N - 15,
    };
    const text = grid('1 2 -9999\n4 5 -9999\n7 8 -9999', corner).toUpperCase();
    expect((await put(text)).status).toBe(200);
    expect(await levels(scheme)).toEqual([6, 5, 7]);
  });

  test('gives nothing outside of it', async () => {
    const { scheme, put } = await aTown();
    expect((await put(grid(VALUES, { xllcenter: E + 1000 }))).status).toBe(200);
    expect(await levels(scheme)).toEqual([null, null, 7]);
  });

  test('in another grid is read where the buildings are in it', async () => {
    const { scheme, put } = await aTown();
    const there = {
      xllcenter: 100_000,
      yllcenter: 6_050_000,
      cellsize: 30_000,
      ncols: 3,
      nrows: 3,
    };
    expect((await put(grid('8 8 8\n8 8 8\n8 8 8', there), { crs: 32632 })).status).toBe(200);
    expect(await levels(scheme)).toEqual([8, 8, 7]);
  });

  test.each([
    ['too few values', grid('1 2 3')],
    ['too many', grid(`${VALUES} 10`)],
    ['a word', grid(VALUES.replace('5', 'five'))],
    ['no size', grid(VALUES, { cellsize: undefined })],
    ['cells of no size', grid(VALUES, { cellsize: 0 })],
    ['no place', grid(VALUES, { xllcenter: undefined })],
    ['half a column', grid(VALUES, { ncols: 2.5 })],
    ['a heading twice', `ncols 3\n${grid(VALUES)}`],
    ['no level at all', grid(VALUES.replaceAll(/\d/g, '-9999'))],
  ])('is refused with %s', async (_, text) => {
    const { scheme, put } = await aTown();
    const answer = await put(text);
    expect([answer.status, answer.body]).toMatchObject([422, { error: { code: 'unreadable' } }]);
    expect(await Building.count({ where: { schemeId: scheme.id, groundLevel: null } })).toBe(2);
  });

  test('of too many cells is refused before they are read', async () => {
    const { put } = await aTown();
    expect((await put(grid('1', { ncols: 1e6, nrows: 1e6 }))).status).toBe(413);
  });
});

test('the ground is read by members, changed by assessors, and nobody else', async () => {
  const { scheme, address } = await aTown();
  const level = { level: 1, source: 'a' };
  const witness = await signIn(app(), await aMember(scheme, 'witness'));
  const owner = await signIn(app(), await aMember(scheme, 'owner'));
  const stranger = await signIn(app(), await aMember(await aScheme(), 'assessor'));
  for (const [agent, read, write] of [
    [witness, 200, 403],
    [owner, 403, 403],
    [stranger, 404, 404],
  ] as const) {
    expect((await agent.get(address)).status).toBe(read);
    expect((await agent.put(address).send(level)).status).toBe(write);
    expect((await agent.put(`${address}/file?source=a`)).status).toBe(write);
    expect((await agent.delete(address)).status).toBe(write);
  }
  expect((await request(app()).get(address)).status).toBe(401);
  expect(await levels(scheme)).toEqual([null, null, 7]);
});
