import request from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { beforeAll, describe, expect, test } from 'vitest';
import {
  registerChoicesSchema,
  registerIdsSchema,
  registerPageSchema,
  registerPlaceSchema,
  REGISTER_COLUMNS,
  type RegisterFilter,
  type RegisterSort,
} from '../../../shared/schemas/register.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aMember, anAdministrator, aScheme } from '../../support/factories.ts';
import { box, change, drawn, registered } from '../../support/register.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app } = testApp();

type Asked = {
  readonly filter?: RegisterFilter | Record<string, unknown>;
  readonly sort?: Partial<RegisterSort>;
  readonly offset?: number;
  readonly limit?: number;
};

function queryOf({ filter, sort, ...others }: Asked) {
  return {
    ...(filter && { filter: JSON.stringify(filter) }),
    ...(sort && { sort: JSON.stringify({ column: 'reference', descending: false, ...sort }) }),
    ...others,
  };
}

const witnesses = new Map<string, Promise<TestAgent>>();

/** The witness of a scheme, who stays signed in. */
function witnessOf(scheme: Scheme): Promise<TestAgent> {
  const signedIn = async () => signIn(app(), await aMember(scheme, 'witness'));
  const witness = witnesses.get(scheme.id) ?? signedIn();
  witnesses.set(scheme.id, witness);
  return witness;
}

async function get(scheme: Scheme, end: string, asked: Asked | Record<string, unknown> = {}) {
  const agent = await witnessOf(scheme);
  return agent.get(`/api/schemes/${scheme.id}/register${end}`).query(queryOf(asked));
}

async function page(scheme: Scheme, asked: Asked = {}) {
  const answer = await get(scheme, '', asked);
  expect([answer.status, answer.body]).toMatchObject([200, {}]);
  return registerPageSchema.parse(answer.body);
}

async function references(scheme: Scheme, asked: Asked = {}): Promise<string[]> {
  return (await page(scheme, asked)).rows.map(({ reference }) => reference);
}

let town: Scheme;

beforeAll(async () => {
  town = await aScheme();
  const full = { storeys: 2, eavesHeight: 6, groundLevel: 3, foundingLevel: 2 };
  await change(town, {
    created: [
      drawn('B10', { attributes: { ...full, construction: 'Steel-framed', name: 'Mill' } }),
      drawn('B2', {
        footprint: box(20, 0, 20),
        attributes: { ...full, eOverG: 3, poisson: 0.3, construction: 'mud', use: 'shop' },
      }),
      drawn('b1', { footprint: box(1000, 0, 5), attributes: { storeys: 10, use: 'dwelling' } }),
      drawn('Ä3', {
        footprint: box(2000, 0),
        attributes: { ...full, foundingLevel: 4, construction: 'masonry', address: '12 Quay' },
      }),
    ],
  });
  await change(await aScheme(), { created: [drawn('X1'), drawn('X2')] });
});

describe('the register', () => {
  test('gives a page in natural order, with what the method assumes', async () => {
    const { rows, found, all, version } = await page(town);
    expect(rows.map(({ reference }) => reference)).toEqual(['Ä3', 'b1', 'B2', 'B10']);
    expect([found, all, version]).toEqual([4, 4, 2]);
    expect(rows.map(({ assumed }) => assumed)).toEqual([
      ['foundingDepth'],
      ['eavesHeight', 'foundingDepth', 'eOverG', 'poisson'],
      [],
      [],
    ]);
    expect(rows[2]).toMatchObject({ area: 400, use: 'shop', groundLevelFrom: 'file', version: 1 });
    expect(rows[1]?.centre[0]).toBeCloseTo(3 + 1002.5 / 64_100, 3);
  });

  test('is cut into pages', async () => {
    expect(await references(town, { offset: 1, limit: 2 })).toEqual(['b1', 'B2']);
    expect(await references(town, { offset: 4 })).toEqual([]);
    expect(await page(town, { limit: 1 })).toMatchObject({ found: 4, all: 4 });
  });

  test('is ordered by any column, unknown last, then by reference', async () => {
    const order = (column: RegisterSort['column'], descending = false) =>
      references(town, { sort: { column, descending } });
    expect(await order('reference', true)).toEqual(['B10', 'B2', 'b1', 'Ä3']);
    expect(await order('storeys')).toEqual(['Ä3', 'B2', 'B10', 'b1']);
    expect(await order('storeys', true)).toEqual(['b1', 'Ä3', 'B2', 'B10']);
    expect(await order('use')).toEqual(['b1', 'B2', 'Ä3', 'B10']);
    expect(await order('use', true)).toEqual(['B2', 'b1', 'Ä3', 'B10']);
    expect(await order('area', true)).toEqual(['B2', 'Ä3', 'B10', 'b1']);
  });

  test.each(REGISTER_COLUMNS)(
    'has one order by %s, near and far',
    async (column) => {
      for (const descending of [false, true]) {
        const sort = { column, descending };
        const [near] = [await page(town, { sort })];
        const far = await page(town, { sort, offset: 0, limit: 200 });
        expect(far).toEqual(near);
        for (const [index, { id }] of near.rows.entries()) {
          const place = await get(town, '/place', { sort, buildingId: id });
          expect(registerPlaceSchema.parse(place.body)).toEqual({ index });
        }
      }
    },
    30_000,
  );

  test.each(REGISTER_COLUMNS)(
    'finds the first rows by %s as they stand in the whole order',
    async (column) => {
      const scheme = await aScheme();
      await change(scheme, {
        created: ['C3', 'C20', 'C1', 'C10', 'C2', 'C4'].map((reference, k) => {
          const some =
            k % 2 === 0 ? { use: `shop ${k}`, groundLevel: 1.1 * k, name: 'Mill 2' } : {};
          const footprint = box(30 * k, 0, k < 3 ? 10 : 8);
          return drawn(reference, { footprint, attributes: { storeys: 2, ...some } });
        }),
      });
      for (const descending of [false, true]) {
        const sort = { column, descending };
        const first = [];
        for (const offset of [0, 1, 2, 3, 4, 5]) {
          first.push(...(await references(scheme, { sort, offset, limit: 1 })));
        }
        const pairs = await references(scheme, { sort, offset: 1, limit: 3 });
        // asking for its place puts all of it in order
        const [row] = (await page(scheme, { sort })).rows;
        await get(scheme, '/place', { sort, buildingId: row?.id ?? 0 });
        const whole = await references(scheme, { sort });
        expect([first, pairs]).toEqual([whole, whole.slice(1, 4)]);
      }
    },
    30_000,
  );

  test.each<[string, Asked['filter'], string[]]>([
    ['words', { search: 'mil' }, ['B10']],
    ['words of an address', { search: '12 qu' }, ['Ä3']],
    ['no words', { search: '' }, ['Ä3', 'b1', 'B2', 'B10']],
    ['a value', { any: { use: ['shop'] } }, ['B2']],
    ['values or none', { any: { use: ['shop', null] } }, ['Ä3', 'B2', 'B10']],
    ['numbers as text', { any: { storeys: ['10', 'x'] } }, ['b1']],
    ['a range', { ranges: { storeys: { from: 2, to: 2 } } }, ['Ä3', 'B2', 'B10']],
    ['an area', { ranges: { area: { from: 101 } } }, ['B2']],
    ['what is unknown', { unknown: ['eavesHeight'] }, ['b1']],
    ['what is assumed', { assumed: true }, ['Ä3', 'b1']],
    ['what is not', { assumed: false }, ['B2', 'B10']],
    ['a box', { within: [3.01, 54, 3.02, 55] }, ['b1']],
    ['all together', { any: { use: ['shop', 'dwelling'] }, assumed: false }, ['B2']],
    ['numbers of none', { ids: [2_000_000_000] }, []],
  ])('is filtered by %s', async (_, filter, wanted) => {
    expect(await references(town, { filter: filter ?? {} })).toEqual(wanted);
    expect(await page(town, { filter: filter ?? {} })).toMatchObject({
      found: wanted.length,
      all: 4,
    });
    const ids = registerIdsSchema.parse(
      (await get(town, '/ids', { filter: filter ?? {} })).body,
    ).ids;
    expect(ids).toHaveLength(wanted.length);
  });

  describe('filtered by an outline', () => {
    const DEGREE = { east: 64_100, north: 111_300 };
    let houses: Scheme;
    /** The middle of the house in the middle, in degrees. */
    let middle: readonly [number, number];

    /** An outline by metres east and north of the middle. */
    function outline(...corners: readonly (readonly [number, number])[]): RegisterFilter {
      const [longitude, latitude] = middle;
      return {
        inside: corners.map(([x, y]) => [longitude + x / DEGREE.east, latitude + y / DEGREE.north]),
      };
    }

    beforeAll(async () => {
      houses = await aScheme();
      const rows = [0, 1, 2].flatMap((y) => [0, 1, 2].map((x) => [x, y] as const));
      await change(houses, {
        created: rows.map(([x, y]) =>
          drawn(`${'SMN'[y]}${x}`, { footprint: box(10 * x, 10 * y, 4) }),
        ),
      });
      const found = (await page(houses)).rows.find(({ reference }) => reference === 'M1');
      middle = found?.centre ?? [0, 0];
    });

    test('has those with their middle inside, also where it is hollow', async () => {
      const hollow = outline(
        ...([[-13, -13], [13, -13], [13, 13], [7, 13], [7, -5], [-7, -5], [-7, 13], [-13, 13]] as const),
      ); // prettier-ignore
      const wanted = ['M0', 'M2', 'N0', 'N2', 'S0', 'S1', 'S2'];
      expect(await references(houses, { filter: hollow })).toEqual(wanted);
      const ids = registerIdsSchema.parse((await get(houses, '/ids', { filter: hollow })).body).ids;
      expect(ids).toHaveLength(wanted.length);
    });

    test('leaves out what it only touches, and what lies near it', async () => {
      const one = outline([-9, -9], [1, -9], [1, 9], [-9, 9]);
      expect(await references(houses, { filter: one })).toEqual(['M1']);
      const slanted = outline([-13, 8], [-13, -13], [8, -13]);
      expect(await references(houses, { filter: slanted })).toEqual(['M0', 'S0', 'S1']);
      const between = outline([3, 3], [7, 3], [7, 7], [3, 7]);
      expect(await references(houses, { filter: between })).toEqual([]);
    });

    test('goes with other conditions', async () => {
      const all = outline([-20, -20], [20, -20], [20, 20], [-20, 20]);
      expect(await references(houses, { filter: all })).toHaveLength(9);
      expect(await references(houses, { filter: { ...all, search: 'S1' } })).toEqual(['S1']);
    });
  });

  test('is filtered by what an import brought or changed', async () => {
    const scheme = await aScheme();
    const importId = '3fa85f64-5717-4562-b3fc-2c963f66afa6';
    await change(scheme, { created: [drawn('A')] }, { importId });
    await change(scheme, { created: [drawn('B')] });
    expect(await references(scheme, { filter: { importId } })).toEqual(['A']);
  });

  test('takes words as they are, whatever they look like', async () => {
    const hostile = [
      `'`,
      `'; drop table buildings; --`,
      `a' or '1'='1`,
      ':*',
      '$9',
      '\\',
      '%',
      `")`,
    ];
    for (const text of hostile) {
      expect(await references(town, { filter: { search: text } })).toEqual([]);
      expect(await references(town, { filter: { any: { use: [text] } } })).toEqual([]);
      expect(await references(town, { filter: { any: { storeys: [text] } } })).toEqual([]);
      const answer = await get(town, '', { sort: { column: text } });
      expect(answer.status).toBe(422);
    }
    expect(await registered(town)).toHaveLength(4);
  });

  test.each([
    ['a filter that is no JSON', { filter: '{' }],
    ['an unknown condition', { filter: '{"where":"true"}' }],
    ['an unknown field', { filter: '{"any":{"password":["x"]}}' }],
    ['an outline of two corners', { filter: '{"inside":[[3,54],[4,54]]}' }],
    ['an outline of words', { filter: '{"inside":[["3)","54"],[4,54],[4,55]]}' }],
    ['an outline off the globe', { filter: '{"inside":[[3,54],[4,54],[4,95]]}' }],
    ['a range of words', { filter: '{"ranges":{"name":{"from":1}}}' }],
    ['an order by nothing', { sort: '{"column":"imported","descending":false}' }],
    ['too many rows', { limit: '1000' }],
    ['a place before the first', { offset: '-1' }],
  ])('refuses %s', async (_, query) => {
    const agent = await signIn(app(), await aMember(town, 'witness'));
    const answer = await agent.get(`/api/schemes/${town.id}/register`).query(query);
    expect(answer.status).toBe(422);
  });

  test('leaves out what was taken out', async () => {
    const scheme = await aScheme();
    await change(scheme, { created: [drawn('A'), drawn('B')] });
    const [a] = await registered(scheme);
    await change(scheme, { removed: [{ id: a?.id ?? 0, version: 1 }] });
    expect(await page(scheme)).toMatchObject({ found: 1, all: 1, version: 3 });
    const place = await get(scheme, '/place', { buildingId: a?.id });
    expect(place.body).toEqual({ index: null });
  });

  test('offers the values of a field, the commonest first', async () => {
    const answer = await get(town, '/choices/use');
    expect(registerChoicesSchema.parse(answer.body)).toEqual([
      { value: null, count: 2 },
      { value: 'dwelling', count: 1 },
      { value: 'shop', count: 1 },
    ]);
    expect((await get(town, '/choices/storeys')).body).toContainEqual({ value: '10', count: 1 });
    expect((await get(town, '/choices/password')).status).toBe(404);
  });

  test.each(['', '/ids', '/choices/use', '/place?buildingId=1', '/export?format=csv'])(
    'at "%s" is not for owners, strangers or nobody',
    async (end) => {
      const address = `/api/schemes/${town.id}/register${end}`;
      const owner = await signIn(app(), await aMember(town, 'owner'));
      expect((await owner.get(address)).status).toBe(403);
      const stranger = await signIn(app(), await aMember(await aScheme(), 'assessor'));
      expect((await stranger.get(address)).status).toBe(404);
      expect((await request(app()).get(address)).status).toBe(401);
      const administrator = await signIn(app(), await anAdministrator());
      expect((await administrator.get(address)).status).toBe(200);
    },
  );
});
