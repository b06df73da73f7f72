import request from 'supertest';
import { describe, expect, test } from 'vitest';
import {
  buildingHistorySchema,
  registerChangeSchema,
} from '../../../shared/schemas/register-changes.ts';
import { buildingSchema } from '../../../shared/schemas/buildings.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Building } from '../../../server/models/building.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aMember, anAdministrator, aScheme } from '../../support/factories.ts';
import { regularRing } from '../../support/drawn-geometry.ts';
import { box, change, drawn, E, footprintOf, N, registered } from '../../support/register.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID, UNKNOWN_NUMBER } from '../../support/unknown-ids.ts';

const { app } = testApp();

async function asAssessor(scheme: Scheme) {
  return signIn(app(), await aMember(scheme, 'assessor'));
}

function at({ id }: Scheme, end = ''): string {
  return `/api/schemes/${id}/buildings${end}`;
}

/** A scheme with some buildings in a row, wall to wall. */
async function aRow(...references: string[]): Promise<{ scheme: Scheme; row: Building[] }> {
  const scheme = await aScheme();
  const created = references.map((reference, k) => drawn(reference, { footprint: box(10 * k, 0) }));
  await change(scheme, { created });
  return { scheme, row: await registered(scheme) };
}

function idOf(row: readonly Building[], index = 0): number {
  return row[index]?.id ?? 0;
}

describe('drawing a building', () => {
  test('brings it into the register, and into the history', async () => {
    const { scheme } = await aRow('A');
    const agent = await asAssessor(scheme);
    const footprint = box(50, 0, 12, 8);
    const attributes = { storeys: 2, groundLevel: 4.5, name: ' Mill ' };
    const answer = await agent.post(at(scheme)).send({ reference: 'N1', footprint, attributes });
    expect(answer.status).toBe(201);
    const done = registerChangeSchema.parse(answer.body);
    const building = await Building.findByPk(done.buildingIds[0] ?? 0, { rejectOnEmpty: true });
    expect(building).toMatchObject({
      ...{ reference: 'N1', name: 'Mill', storeys: 2, groundLevel: 4.5, area: 96 },
      ...{ groundLevelFrom: 'hand', version: 1, eavesHeight: null },
    });
    await scheme.reload();
    expect(scheme.registerVersion).toBe(done.version);
    const history = await agent.get(at(scheme, `/${building.id}/history`));
    expect(buildingHistorySchema.parse(history.body)).toMatchObject([
      { kind: 'draw', before: null, mayUndo: true, after: { reference: 'N1', storeys: 2 } },
    ]);
  });

  test('takes an outline of thousands of corners; of other bodies less is taken', async () => {
    const { scheme } = await aRow();
    const agent = await asAssessor(scheme);
    const round = regularRing(9000, 50).map(([x, y]) => [E + 100 + x, N + 100 + y]);
    const body = { reference: 'N1', footprint: [[round]] };
    expect(JSON.stringify(body).length).toBeGreaterThan(300_000);
    expect((await agent.post(at(scheme)).send(body)).status).toBe(201);
    const long = { ...body, note: 'a'.repeat(800_000) };
    const answer = await agent.post(at(scheme)).send(long);
    expect([answer.status, answer.body]).toMatchObject([413, { error: { code: 'too-large' } }]);
    expect((await agent.post(at(scheme, '/joins')).send(body)).status).toBe(413);
  });

  const [outer = []] = box(0, 0)[0] ?? [];
  test.each([
    [
      'a bow tie',
      [
        [
          [
            [E, N],
            [E + 9, N + 9],
            [E + 9, N],
            [E, N + 9],
          ],
        ],
      ],
      'crosses itself',
    ],
    [
      'a line',
      [
        [
          [
            [E, N],
            [E + 9, N],
            [E + 5, N],
          ],
        ],
      ],
      'crosses itself',
    ],
    [
      'two corners',
      [
        [
          [
            [E, N],
            [E + 9, N],
            [E, N],
          ],
        ],
      ],
      'three corners',
    ],
    ['a speck', box(0, 0, 0.9), 'smaller than 1'],
    ['a town', box(0, 0, 450), 'larger than 200,000'],
    ['a courtyard outside', [[outer, box(20, 0, 4)[0]?.[0] ?? []]], 'courtyard'],
    ['a part over another', [...box(0, 0, 20), ...box(5, 5, 4)], 'over each other'],
    ['exchanged axes', [[outer.map(([e, n]) => [n, e])]], 'not where EPSG:32631'],
    ['no part', [], ''],
  ])('refuses %s', async (_, footprint, words) => {
    const { scheme } = await aRow('A');
    const agent = await asAssessor(scheme);
    const answer = await agent.post(at(scheme)).send({ reference: 'N1', footprint });
    expect([answer.status, answer.body]).toMatchObject([422, { error: {} }]);
    expect(JSON.stringify(answer.body)).toContain(words);
    expect(await registered(scheme)).toHaveLength(1);
  });

  test('refuses a reference that is taken, values out of bounds and what it does not know', async () => {
    const { scheme } = await aRow('A');
    const agent = await asAssessor(scheme);
    const good = { reference: 'N1', footprint: box(50, 0) };
    const taken = await agent.post(at(scheme)).send({ ...good, reference: 'A' });
    expect([taken.status, taken.body]).toMatchObject([409, { error: { code: 'already-exists' } }]);
    for (const bad of [
      { reference: '' },
      { reference: 'a\nb' },
      { attributes: { storeys: 2.5 } },
      { attributes: { poisson: 0.7 } },
      { attributes: { area: 5 } },
      { footprint: [[[['x', 1]]]] },
    ]) {
      expect((await agent.post(at(scheme)).send({ ...good, ...bad })).status).toBe(422);
    }
    expect(await registered(scheme)).toHaveLength(1);
  });
});

describe('editing a building', () => {
  test('changes what is given, on top of the version that was seen', async () => {
    const { scheme, row } = await aRow('A', 'B');
    const agent = await asAssessor(scheme);
    const address = at(scheme, `/${idOf(row)}`);
    const edit = { version: 1, reference: 'A1', attributes: { use: 'shop', condition: '' } };
    expect((await agent.patch(address).send({ ...edit, footprint: box(0, 0, 9) })).status).toBe(
      200,
    );
    const answer = buildingSchema.parse((await agent.get(address)).body);
    expect(answer).toMatchObject({ reference: 'A1', use: 'shop', condition: null, area: 81 });
    expect(answer.version).toBe(2);
    const late = await agent.patch(address).send({ ...edit, attributes: { use: 'mill' } });
    expect([late.status, late.body]).toMatchObject([409, { error: { code: 'conflict' } }]);
    expect(JSON.stringify(late.body)).toContain('changed A1 meanwhile');
    expect(await Building.findByPk(idOf(row))).toMatchObject({ use: 'shop', version: 2 });
  });

  test('by three at once: one is kept, two are told', async () => {
    const { scheme, row } = await aRow('A');
    const agents = await Promise.all([1, 2, 3].map(() => asAssessor(scheme)));
    const answers = await Promise.all(
      agents.map((agent, k) =>
        agent
          .patch(at(scheme, `/${idOf(row)}`))
          .send({ version: 1, attributes: { storeys: k + 1 } }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409]);
  });

  test('refuses what is not right and what is not there', async () => {
    const { scheme, row } = await aRow('A', 'B');
    const agent = await asAssessor(scheme);
    const address = at(scheme, `/${idOf(row)}`);
    expect((await agent.patch(address).send({ attributes: {} })).status).toBe(422);
    expect((await agent.patch(address).send({ version: 1, reference: 'B' })).status).toBe(409);
    const foreign = await aRow('F');
    for (const id of [UNKNOWN_NUMBER, idOf(foreign.row)]) {
      expect((await agent.patch(at(scheme, `/${id}`)).send({ version: 1 })).status).toBe(404);
    }
    expect(await Building.findByPk(idOf(row))).toMatchObject({ reference: 'A', version: 1 });
  });
});

describe('a footprint over others', () => {
  test('is kept, and tells which, but not of a shared wall', async () => {
    const { scheme, row } = await aRow('A', 'B');
    const agent = await asAssessor(scheme);
    const drawn = { reference: 'Gallery', footprint: box(5, 2, 10, 4) };
    const answer = await agent.post(at(scheme)).send(drawn);
    expect(answer.status).toBe(201);
    const { overlaps, buildingIds } = registerChangeSchema.parse(answer.body);
    expect(overlaps).toEqual([
      { id: idOf(row, 0), reference: 'A', area: 20 },
      { id: idOf(row, 1), reference: 'B', area: 20 },
    ]);
    expect(await Building.findByPk(buildingIds[0] ?? 0)).toMatchObject({ area: 40 });
    const address = at(scheme, `/${buildingIds[0] ?? 0}`);
    const edited = await agent.patch(address).send({ version: 1, footprint: box(0, 8, 10, 4) });
    expect(registerChangeSchema.parse(edited.body).overlaps).toMatchObject([{ reference: 'A' }]);
    const beside = await agent.patch(address).send({ version: 2, footprint: box(0, 10, 20, 4) });
    expect(registerChangeSchema.parse(beside.body).overlaps).toEqual([]);
    const named = await agent.patch(address).send({ version: 3, attributes: { use: 'shop' } });
    expect(registerChangeSchema.parse(named.body).overlaps).toBeUndefined();
  });
});

describe('editing many', () => {
  test('gives all that are meant the same values, in one change that can be undone', async () => {
    const { scheme } = await aRow('A', 'B', 'C');
    const agent = await asAssessor(scheme);
    const filter = { search: 'a' };
    const all = { filter: {}, expected: 3, attributes: { construction: 'masonry' } };
    const answer = await agent.post(at(scheme, '/edits')).send(all);
    expect(answer.status).toBe(200);
    const { changeId, buildingIds } = registerChangeSchema.parse(answer.body);
    expect(buildingIds).toHaveLength(3);
    expect((await registered(scheme)).map(({ construction }) => construction)).toEqual([
      ...['masonry', 'masonry', 'masonry'],
    ]);
    const wrong = await agent.post(at(scheme, '/edits')).send({ ...all, filter });
    expect([wrong.status, wrong.body]).toMatchObject([409, { error: { code: 'conflict' } }]);
    const undo = `/api/schemes/${scheme.id}/register-changes/${changeId}/undo`;
    expect((await agent.post(undo)).status).toBe(200);
    expect((await registered(scheme)).map(({ construction }) => construction)).toEqual([
      ...[null, null, null],
    ]);
    expect((await agent.post(undo)).status).toBe(409);
  });

  test('tells before what they have, and leaves out whom it is told to', async () => {
    const scheme = await aScheme();
    const created = [
      drawn('A', { attributes: { use: 'shop', storeys: 2 } }),
      ...[drawn('B', { footprint: box(20, 0) }), drawn('C', { footprint: box(40, 0) })],
      drawn('D', { footprint: box(60, 0), attributes: { use: 'mill', storeys: 2 } }),
    ];
    await change(scheme, { created });
    const row = await registered(scheme);
    const agent = await asAssessor(scheme);
    const filter = { except: [idOf(row, 1)] };
    const attributes = { use: 'shop', storeys: null };
    const preview = await agent.post(at(scheme, '/edits/preview')).send({ filter, attributes });
    expect([preview.status, preview.body]).toEqual([
      200,
      [
        { field: 'use', same: 1, unknown: 1 },
        { field: 'storeys', same: 1, unknown: 1 },
      ],
    ]);
    expect((await registered(scheme)).map(({ use }) => use)).toEqual(['shop', null, null, 'mill']);
    const body = { filter, expected: 3, attributes };
    expect((await agent.post(at(scheme, '/edits')).send(body)).status).toBe(200);
    expect((await registered(scheme)).map(({ use }) => use)).toEqual([
      ...['shop', null, 'shop', 'shop'],
    ]);
  });

  test('takes as many by number as can be marked', async () => {
    const { scheme, row } = await aRow('A');
    const agent = await asAssessor(scheme);
    const ids = Array.from({ length: 5000 }, (_, k) => (k === 0 ? idOf(row) : 2_000_000_000 + k));
    const asked = { filter: { ids }, attributes: { use: 'shop' } };
    const preview = await agent.post(at(scheme, '/edits/preview')).send(asked);
    expect(preview.body).toEqual([{ field: 'use', same: 0, unknown: 1 }]);
    expect((await agent.post(at(scheme, '/edits')).send({ ...asked, expected: 1 })).status).toBe(
      200,
    );
    const more = { ...asked, filter: { ids: [...ids, 1] } };
    expect((await agent.post(at(scheme, '/edits/preview')).send(more)).status).toBe(422);
  });

  test('is previewed only by who may edit, where the scheme is theirs', async () => {
    const { scheme } = await aRow('A');
    const body = { filter: {}, attributes: { use: 'x' } };
    const of = (agent: Awaited<ReturnType<typeof asAssessor>>) =>
      agent.post(at(scheme, '/edits/preview')).send(body);
    expect((await of(await signIn(app(), await aMember(scheme, 'witness')))).status).toBe(403);
    expect((await of(await asAssessor(await aScheme()))).status).toBe(404);
  });

  test.each([
    [{ expected: 1, attributes: { use: 'x' } }],
    [{ filter: {}, expected: 0, attributes: { use: 'x' } }],
    [{ filter: {}, expected: 1, attributes: {} }],
    [{ filter: { x: 1 }, expected: 1, attributes: { use: 'x' } }],
  ])('refuses %j', async (body) => {
    const { scheme } = await aRow('A');
    const agent = await asAssessor(scheme);
    expect((await agent.post(at(scheme, '/edits')).send(body)).status).toBe(422);
  });
});

describe('splitting a building', () => {
  async function split(line: number[][], more: object = {}) {
    const { scheme, row } = await aRow('A', 'A-2');
    const agent = await asAssessor(scheme);
    const answer = await agent
      .post(at(scheme, `/${idOf(row)}/split`))
      .send({ version: 1, line, ...more });
    return { scheme, row, answer, agent };
  }

  test('leaves the larger piece its reference and gives the other its values', async () => {
    const { scheme, row, answer, agent } = await split([[E + 3, N - 1], [E + 3, N + 11]]); // prettier-ignore
    expect([answer.status, answer.body]).toMatchObject([200, {}]);
    const { changeId, buildingIds } = registerChangeSchema.parse(answer.body);
    const [a, , piece] = await registered(scheme);
    expect([a?.id, piece?.reference]).toEqual([idOf(row), 'A-3']);
    expect([a?.area, piece?.area]).toEqual([70, 30]);
    expect(buildingIds).toEqual([a?.id, piece?.id]);
    const { west, east } = piece ?? { west: 0, east: 0 };
    expect(east - west).toBeCloseTo(3 / 64_100, 6);
    const undo = `/api/schemes/${scheme.id}/register-changes/${changeId}/undo`;
    expect((await agent.post(undo)).status).toBe(200);
    expect((await registered(scheme)).map(({ area }) => area)).toEqual([100, 100]);
  });

  test('conserves area along a bent line, to the last piece', async () => {
    const bent = [[E - 5, N + 4.3], [E + 2.1, N + 4.7], [E + 6.3, N + 2.2], [E + 8.8, N + 15]]; // prettier-ignore
    const { scheme, answer } = await split(bent);
    expect([answer.status, answer.body]).toMatchObject([200, {}]);
    const areas = (await registered(scheme)).map(({ area }) => area);
    expect(areas.reduce((sum, area) => sum + area, 0)).toBeCloseTo(200, 6);
    expect(areas).toHaveLength(3);
  });

  test.each([
    [
      'that begins inside',
      [
        [E + 5, N + 5],
        [E + 5, N + 20],
      ],
      'outside the building',
    ],
    [
      'that misses',
      [
        [E - 5, N - 5],
        [E + 15, N - 5],
      ],
      'does not cut',
    ],
    [
      'that shaves',
      [
        [E - 1, N + 0.05],
        [E + 11, N + 0.05],
      ],
      'smaller than 1',
    ],
    ['of one point', [[E, N]], ''],
  ])('refuses a line %s', async (_, line, words) => {
    const { scheme, answer } = await split(line);
    expect(answer.status).toBe(422);
    expect(JSON.stringify(answer.body)).toContain(words);
    expect((await registered(scheme)).map(({ version }) => version)).toEqual([1, 1]);
  });

  test('refuses an old version', async () => {
    const { answer } = await split([[E + 3, N - 1], [E + 3, N + 11]], { version: 7 }); // prettier-ignore
    expect(answer.status).toBe(409);
  });

  test('cuts through a courtyard', async () => {
    const scheme = await aScheme();
    const [outer = []] = box(0, 0, 40)[0] ?? [];
    const [inner = []] = box(10, 10, 20)[0] ?? [];
    await change(scheme, { created: [drawn('A', { footprint: [[outer, inner]] })] });
    const [a] = await registered(scheme);
    const agent = await asAssessor(scheme);
    const address = at(scheme, `/${a?.id ?? 0}/split`);
    const open = [[E - 5, N + 20], [E + 20, N + 20]]; // prettier-ignore
    expect((await agent.post(address).send({ version: 1, line: open })).body).toMatchObject({
      error: {
        message: 'Draw the line on until it ends outside the building, not in a courtyard.',
      },
    });
    const line = [[E - 5, N + 15], [E + 45, N + 15]]; // prettier-ignore
    expect((await agent.post(address).send({ version: 1, line })).status).toBe(200);
    const areas = (await registered(scheme)).map(({ area }) => area);
    expect(areas.reduce((sum, area) => sum + area, 0)).toBeCloseTo(1200, 6);
    expect(areas).toHaveLength(2);
  });
});

describe('joining buildings', () => {
  test('makes one of those that touch, gaps filled, and goes back whole', async () => {
    const { scheme, row } = await aRow('A', 'B', 'C');
    const agent = await asAssessor(scheme);
    const [a, b, c] = row.map(({ id }) => id);
    const edit = { version: 1, attributes: { storeys: 3, groundLevel: 2, use: 'shop' } };
    await agent.patch(at(scheme, `/${b ?? 0}`)).send(edit);
    await agent.patch(at(scheme, `/${a ?? 0}`)).send({ version: 1, attributes: { use: 'mill' } });
    const buildings = [{ id: a, version: 2 }, { id: c, version: 1 }, { id: b, version: 2 }]; // prettier-ignore
    const answer = await agent.post(at(scheme, '/joins')).send({ buildings });
    expect([answer.status, answer.body]).toMatchObject([200, { buildingIds: [a] }]);
    const [joined, ...others] = await registered(scheme);
    expect(others).toEqual([]);
    expect(joined).toMatchObject({
      ...{ reference: 'A', use: 'mill', storeys: 3, groundLevel: 2, groundLevelFrom: 'hand' },
      area: 300,
    });
    expect((await footprintOf({ id: a ?? 0 })).footprint[0]?.[0]?.length).toBeLessThanOrEqual(9);
    const { changeId } = registerChangeSchema.parse(answer.body);
    await agent.post(`/api/schemes/${scheme.id}/register-changes/${changeId}/undo`);
    expect((await registered(scheme)).map(({ reference, area }) => [reference, area])).toEqual([
      ...[['A', 100], ['B', 100], ['C', 100]], // prettier-ignore
    ]);
  });

  test('refuses those that do not touch, one twice, and those of others', async () => {
    const { scheme, row } = await aRow('A', 'B', 'C');
    const foreign = await aRow('F');
    const agent = await asAssessor(scheme);
    const join = (...ids: number[]) =>
      agent.post(at(scheme, '/joins')).send({ buildings: ids.map((id) => ({ id, version: 1 })) });
    const apart = await join(idOf(row, 0), idOf(row, 2));
    expect([apart.status, apart.body]).toMatchObject([
      422,
      {
        error: {
          message:
            'They do not touch: only buildings that share a wall, or stand at most 5 cm apart, can be joined.',
        },
      },
    ]);
    expect((await join(idOf(row), idOf(row))).status).toBe(422);
    expect((await join(idOf(row))).status).toBe(422);
    expect((await join(idOf(row), idOf(foreign.row))).status).toBe(404);
    expect((await join(idOf(row), UNKNOWN_NUMBER)).status).toBe(404);
    expect(await registered(scheme)).toHaveLength(3);
  });
});

describe('removing a building', () => {
  test('takes it out of the register and keeps its history', async () => {
    const { scheme, row } = await aRow('A', 'B');
    const agent = await asAssessor(scheme);
    const address = at(scheme, `/${idOf(row)}`);
    expect((await agent.delete(address).send({ version: 3 })).status).toBe(409);
    expect((await agent.delete(address).send({})).status).toBe(422);
    expect((await agent.delete(address).send({ version: 1 })).body).toMatchObject({
      buildingIds: [],
    });
    expect((await agent.get(address)).status).toBe(404);
    expect((await agent.delete(address).send({ version: 2 })).status).toBe(404);
    const history = buildingHistorySchema.parse((await agent.get(`${address}/history`)).body);
    expect(history.map(({ kind, after }) => [kind, after === null])).toEqual([
      ...[['remove', true], ['import', false]], // prettier-ignore
    ]);
    expect((await registered(scheme)).map(({ reference }) => reference)).toEqual(['B']);
    const trail = await AuditEntry.findAll({ where: { schemeId: scheme.id }, order: ['id'] });
    expect(trail.at(-1)).toMatchObject({ after: { kind: 'remove', removed: 1 } });
  });
});

describe('removing many', () => {
  test('takes all that are meant out, in one change that can be undone', async () => {
    const { scheme, row } = await aRow('A', 'B', 'C');
    const agent = await asAssessor(scheme);
    const ids = [idOf(row, 0), idOf(row, 2)];
    const answer = await agent.post(at(scheme, '/removals')).send({ filter: { ids }, expected: 2 });
    expect([answer.status, answer.body]).toMatchObject([200, { buildingIds: [] }]);
    const { changeId, version } = registerChangeSchema.parse(answer.body);
    expect((await registered(scheme)).map(({ reference }) => reference)).toEqual(['B']);
    await scheme.reload();
    expect(scheme.registerVersion).toBe(version);
    const history = await agent.get(at(scheme, `/${idOf(row)}/history`));
    expect(buildingHistorySchema.parse(history.body)[0]).toMatchObject({
      ...{ changeId, kind: 'remove', source: '2 chosen buildings', after: null },
    });
    const trail = await AuditEntry.findAll({ where: { schemeId: scheme.id }, order: ['id'] });
    expect(trail.at(-1)).toMatchObject({ after: { kind: 'remove', removed: 2 } });
    const undo = `/api/schemes/${scheme.id}/register-changes/${changeId}/undo`;
    expect((await agent.post(undo)).status).toBe(200);
    expect((await registered(scheme)).map(({ reference }) => reference)).toEqual(['A', 'B', 'C']);
  });

  test('refuses another number than was said, and leaves others in peace', async () => {
    const { scheme } = await aRow('A', 'B');
    const foreign = await aRow('F');
    const agent = await asAssessor(scheme);
    const remove = (body: object) => agent.post(at(scheme, '/removals')).send(body);
    const wrong = await remove({ filter: {}, expected: 3 });
    expect([wrong.status, wrong.body]).toMatchObject([409, { error: { code: 'conflict' } }]);
    expect(JSON.stringify(wrong.body)).toContain('These are 2 buildings now, not 3.');
    const others = { filter: { ids: [idOf(foreign.row)] }, expected: 1 };
    expect((await remove(others)).status).toBe(409);
    expect(await registered(scheme)).toHaveLength(2);
    expect(await registered(foreign.scheme)).toHaveLength(1);
  });

  test.each([
    [{ expected: 1 }],
    [{ filter: {}, expected: 0 }],
    [{ filter: { x: 1 }, expected: 1 }],
    [{ filter: {}, expected: 1, attributes: {} }],
  ])('refuses %j', async (body) => {
    const { scheme } = await aRow('A');
    const agent = await asAssessor(scheme);
    expect((await agent.post(at(scheme, '/removals')).send(body)).status).toBe(422);
    expect(await registered(scheme)).toHaveLength(1);
  });
});

describe('the history of a building', () => {
  test('is read by those who may read the register, and undone by assessors', async () => {
    const { scheme, row } = await aRow('A');
    const [assessor, witness] = [
      await asAssessor(scheme),
      await signIn(app(), await aMember(scheme, 'witness')),
    ];
    const address = at(scheme, `/${idOf(row)}`);
    await assessor.patch(address).send({ version: 1, footprint: box(0, 0, 20) });
    const own = buildingHistorySchema.parse((await assessor.get(`${address}/history`)).body);
    expect(own).toMatchObject([
      {
        before: { area: 100, footprint: 100 },
        after: { area: 400, footprint: 400 },
        mayUndo: true,
      },
      { kind: 'import', mayUndo: false },
    ]);
    const theirs = buildingHistorySchema.parse((await witness.get(`${address}/history`)).body);
    expect(theirs.map(({ mayUndo }) => mayUndo)).toEqual([false, false]);
    const undo = `/api/schemes/${scheme.id}/register-changes`;
    expect((await witness.post(`${undo}/${own[0]?.changeId ?? ''}/undo`)).status).toBe(403);
    expect((await assessor.post(`${undo}/${own[1]?.changeId ?? ''}/undo`)).status).toBe(409);
    expect((await assessor.post(`${undo}/${UNKNOWN_ID}/undo`)).status).toBe(404);
    expect((await assessor.post(`${undo}/${own[0]?.changeId ?? ''}/undo`)).status).toBe(200);
    const elsewhere = await asAssessor(await aScheme());
    expect((await elsewhere.get(`${address}/history`)).status).toBe(404);
  });

  test('tells what was undone and done again, and lets it be turned once more', async () => {
    const { scheme, row } = await aRow('A');
    const agent = await asAssessor(scheme);
    const address = at(scheme, `/${idOf(row)}`);
    const history = async () => {
      return buildingHistorySchema.parse((await agent.get(`${address}/history`)).body);
    };
    await agent.patch(address).send({ version: 1, attributes: { use: 'mill' } });
    const uses: unknown[] = [];
    for (let turn = 0; turn < 3; turn += 1) {
      const [newest] = await history();
      expect(newest?.mayUndo).toBe(true);
      const undo = `/api/schemes/${scheme.id}/register-changes/${newest?.changeId ?? ''}/undo`;
      expect((await agent.post(undo)).status).toBe(200);
      uses.push((await registered(scheme))[0]?.use);
    }
    expect(uses).toEqual([null, 'mill', null]);
    expect((await history()).map(({ kind }) => kind)).toEqual([
      ...['undo', 'redo', 'undo', 'edit', 'import'],
    ]);
  });

  test('brings a removed building back, takes it out again, and back', async () => {
    const { scheme, row } = await aRow('A');
    const agent = await asAssessor(scheme);
    const out = await agent.delete(at(scheme, `/${idOf(row)}`)).send({ version: 1 });
    let { changeId } = registerChangeSchema.parse(out.body);
    const counts: number[] = [];
    for (let turn = 0; turn < 3; turn += 1) {
      const undo = `/api/schemes/${scheme.id}/register-changes/${changeId}/undo`;
      ({ changeId } = registerChangeSchema.parse((await agent.post(undo)).body));
      counts.push((await registered(scheme)).length);
    }
    expect(counts).toEqual([1, 0, 1]);
  });

  test('of another scheme cannot be undone from here', async () => {
    const { scheme } = await aRow('A');
    const foreign = await aScheme();
    const { changeId } = await change(foreign, { created: [drawn('F')] });
    const agent = await asAssessor(scheme);
    const undo = `/api/schemes/${scheme.id}/register-changes/${changeId}/undo`;
    expect((await agent.post(undo)).status).toBe(404);
    expect(await registered(foreign)).toHaveLength(1);
  });
});

describe('the walls of a building', () => {
  test('are lettered, measured, and tell who stands against them', async () => {
    const { scheme, row } = await aRow('A', 'B');
    const agent = await asAssessor(scheme);
    const { walls } = buildingSchema.parse((await agent.get(at(scheme, `/${idOf(row)}`))).body);
    expect(walls.map(({ letter, length }) => [letter, length])).toEqual([
      ...[['A', 10], ['B', 10], ['C', 10], ['D', 10]], // prettier-ignore
    ]);
    expect(walls.map(({ bearing }) => Math.round(bearing) % 180)).toEqual([90, 0, 90, 0]);
    expect(walls.map(({ sharedWith }) => sharedWith)).toEqual([
      ...[[], [{ id: idOf(row, 1), reference: 'B' }], [], []], // prettier-ignore
    ]);
  });
});

describe('changing a register', () => {
  test('is for assessors, and not in an archived scheme', async () => {
    const { scheme, row } = await aRow('A');
    const good = { reference: 'N1', footprint: box(50, 0) };
    const all = { filter: {}, expected: 1 };
    const members = [
      await anAdministrator(),
      await aMember(scheme, 'designer'),
      await aMember(scheme, 'witness'),
      await aMember(scheme, 'owner'),
    ];
    for (const member of members) {
      const agent = await signIn(app(), member);
      expect((await agent.post(at(scheme)).send(good)).status).toBe(403);
      const edit = await agent.patch(at(scheme, `/${idOf(row)}`)).send({ version: 1 });
      expect(edit.status).toBe(403);
      expect((await agent.post(at(scheme, '/removals')).send(all)).status).toBe(403);
    }
    const stranger = await asAssessor(await aScheme());
    expect((await stranger.post(at(scheme)).send(good)).status).toBe(404);
    expect((await stranger.post(at(scheme, '/removals')).send(all)).status).toBe(404);
    expect((await request(app()).post(at(scheme)).send(good)).status).toBe(403);
    expect((await request(app()).post(at(scheme, '/removals')).send(all)).status).toBe(403);
    const agent = await asAssessor(scheme);
    await scheme.update({ archivedAt: new Date() });
    expect((await agent.post(at(scheme)).send(good)).status).toBe(409);
    expect((await agent.post(at(scheme, '/removals')).send(all)).status).toBe(409);
    expect(await registered(scheme)).toHaveLength(1);
  });
});
