import { QueryTypes } from 'sequelize';
import { describe, expect, test } from 'vitest';
import { undoChange } from '../../../server/commands/undo-change.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Building } from '../../../server/models/building.ts';
import { findHistory } from '../../../server/models/find-building-changes.ts';
import { RegisterChange } from '../../../server/models/register-change.ts';
import { Scheme } from '../../../server/models/scheme.ts';
import { aMember, anAdministrator, aScheme } from '../../support/factories.ts';
import { box, change, drawn, E, footprintOf, N, registered } from '../../support/register.ts';
import { testApp } from '../../support/test-app.ts';

const { services } = testApp();

async function one(scheme: Scheme): Promise<Building> {
  const [building] = await registered(scheme);
  if (building === undefined) throw new Error('The register is empty.');
  return building;
}

/** The one who acts, as commands see them. */
async function anActor(scheme: Scheme) {
  const { id } = await aMember(scheme, 'assessor');
  return { id, isAdministrator: false };
}

async function undo(scheme: Scheme, changeId: string) {
  return undoChange(services(), await anActor(scheme), scheme, changeId);
}

function historyOf({ id }: Building) {
  return findHistory(services().database, id);
}

describe('bringing buildings in', () => {
  test('keeps the footprint as it is in the grid, closed, and derives where it lies', async () => {
    const scheme = await aScheme();
    await change(scheme, { created: [drawn('A', { footprint: box(0, 0, 1000) })] });
    const building = await one(scheme);
    const { footprint, lonLat } = await footprintOf(building);
    const ring = [[E, N], [E + 1000, N], [E + 1000, N + 1000], [E, N + 1000], [E, N]]; // prettier-ignore
    expect(footprint).toEqual([[ring]]);
    expect(lonLat[0]?.[0]).toHaveLength(5);
    expect(building.area).toBeCloseTo(1e6, 6);
    expect(building.west).toBeCloseTo(3, 9);
    // a degree is some 111.3 km from north to south, and some 64.1 km from east to west up here
    expect(building.north - building.south).toBeCloseTo(1000 / 111_300, 4);
    expect(building.east - building.west).toBeCloseTo(1000 / 64_100, 4);
  });

  test('keeps what is known, courtyards and parts', async () => {
    const scheme = await aScheme();
    const [outer = []] = box(0, 0, 40)[0] ?? [];
    const [inner = []] = box(10, 10, 20)[0] ?? [];
    const attributes = { name: 'Customs House', storeys: 3, eavesHeight: 11.5, eOverG: 2.6 };
    const footprint = [[outer, inner], ...box(100, 0)];
    await change(scheme, { created: [drawn('A', { footprint, attributes })] });
    const building = await one(scheme);
    expect(building).toMatchObject({ ...attributes, address: null, groundLevel: null, version: 1 });
    expect(building.area).toBeCloseTo(1600 - 400 + 100, 6);
    expect((await footprintOf(building)).footprint.map((rings) => rings.length)).toEqual([2, 1]);
  });

  test('moves the register on by one version and tells the trail', async () => {
    const scheme = await aScheme();
    const by = await anAdministrator();
    const created = [drawn('A'), drawn('B')];
    const done = await change(scheme, { created }, { by, source: 'town.geojson' });
    await scheme.reload();
    expect(scheme.registerVersion).toBe(2);
    const buildings = await registered(scheme);
    expect(done).toMatchObject({ version: 2, buildingIds: buildings.map(({ id }) => id) });
    expect(await RegisterChange.findByPk(done.changeId)).toMatchObject({
      ...{ schemeId: scheme.id, personId: by.id, kind: 'import', source: 'town.geojson' },
    });
    const trail = await AuditEntry.findAll({ where: { schemeId: scheme.id } });
    expect(trail).toMatchObject([
      {
        ...{ action: 'change register', personId: by.id, subjectId: done.changeId },
        after: { kind: 'import', created: 2, changed: 0, removed: 0, registerVersion: 2 },
      },
    ]);
  });

  test('takes thousands one after the other', async () => {
    const scheme = await aScheme();
    function* many() {
      for (let k = 0; k < 5000; k += 1) yield drawn(`B-${k}`, { footprint: box(k, 0) });
    }
    const { buildingIds } = await change(scheme, { created: many() });
    expect(new Set(buildingIds).size).toBe(5000);
    expect(await Building.count({ where: { schemeId: scheme.id } })).toBe(5000);
    const [row] = await services().database.query<{ matched: number }>(
      `select count(*)::integer as matched from buildings join building_footprints on building_id = id
       where scheme_id = $1
         and (footprint->0->0->0->>0)::float8 = $2 + substring(reference from 3)::integer`,
      { type: QueryTypes.SELECT, bind: [scheme.id, E] },
    );
    expect(row?.matched).toBe(5000);
  });

  test.each([
    ['a reference twice', [drawn('A'), drawn('A')], 'already-exists'],
    ['a ring of two corners', [drawn('A', { footprint: [[[[E, N], [E + 1, N]]]] })], 'invalid-input'], // prettier-ignore
    ['no ring', [drawn('A'), drawn('B', { footprint: [] })], 'invalid-input'],
    ['a corner that is no number', [drawn('A', { footprint: box(NaN, 0) })], 'invalid-input'],
    ['a corner off the earth', [drawn('A', { footprint: box(1e12, 0) })], 'invalid-input'],
  ])('refuses %s and brings in nothing', async (_, created, code) => {
    const scheme = await aScheme();
    await expect(change(scheme, { created })).rejects.toMatchObject({ code });
    expect(await Building.count({ where: { schemeId: scheme.id } })).toBe(0);
    await scheme.reload();
    expect(scheme.registerVersion).toBe(1);
  });

  test('refuses a reference that is in the register, by name, and an archived scheme', async () => {
    const scheme = await aScheme();
    await change(scheme, { created: [drawn('A')] });
    await expect(change(scheme, { created: [drawn('B'), drawn('A')] })).rejects.toMatchObject({
      code: 'already-exists',
      message: 'The reference A is in the register already.',
    });
    await scheme.update({ archivedAt: new Date() });
    await expect(change(scheme, { created: [drawn('C')] })).rejects.toMatchObject({
      code: 'archived',
    });
    expect(await Building.count({ where: { schemeId: scheme.id } })).toBe(1);
  });
});

describe('the history of a building', () => {
  test('holds what changed, each time on top of the version before', async () => {
    const scheme = await aScheme();
    const by = await anActor(scheme);
    const attributes = { storeys: 2, groundLevel: 3.5 };
    await change(scheme, { created: [drawn('A', { attributes })] }, { source: 'town.csv' });
    const { id } = await one(scheme);
    const edit = { kind: 'edit', by } as const;
    const first = { id, version: 1, attributes: { storeys: 3, groundLevel: 4, name: null } };
    await change(scheme, { changed: [first] }, edit);
    const second = { id, version: 2, reference: 'A1', footprint: box(0, 0, 20) };
    await change(scheme, { changed: [second] }, edit);
    const [third, middle, begin] = await historyOf(await one(scheme));
    expect(begin).toMatchObject({
      ...{ kind: 'import', source: 'town.csv', by: null, version: 1, before: null },
      after: { reference: 'A', storeys: 2, groundLevel: 3.5, groundLevelFrom: 'file', area: 100 },
    });
    expect(middle?.before).toEqual({ storeys: 2, groundLevel: 3.5, groundLevelFrom: 'file' });
    expect(middle?.after).toEqual({ storeys: 3, groundLevel: 4, groundLevelFrom: 'hand' });
    expect(third).toMatchObject({ before: { reference: 'A', area: 100 }, after: { area: 400 } });
    expect([third?.isNewest, middle?.isNewest, begin?.isNewest]).toEqual([true, false, false]);
  });

  test('goes back step by step, footprint and all, to nothing', async () => {
    const scheme = await aScheme();
    const imported = { storeys: 2, footprint: 'abc' };
    const begin = await change(scheme, {
      created: [drawn('A', { attributes: { storeys: 2, groundLevel: 1 }, imported })],
    });
    const before = await one(scheme);
    const { id } = before;
    const old = await footprintOf(before);
    const next = await change(scheme, {
      changed: [
        {
          ...{ id, version: 1, reference: 'B', footprint: box(5, 5) },
          attributes: { storeys: null, groundLevel: 2 },
          imported: { storeys: null, footprint: 'def' },
        },
      ],
    });
    const there = await undo(scheme, next.changeId);
    const after = await one(scheme);
    expect(after.get()).toEqual({ ...before.get(), version: 3 });
    expect((await footprintOf(after)).get()).toEqual(old.get());
    await expect(undo(scheme, begin.changeId)).rejects.toMatchObject({ code: 'conflict' });
    const back = await undo(scheme, there.changeId);
    expect(await one(scheme)).toMatchObject({ reference: 'B', storeys: null, version: 4 });
    expect(back.buildingIds).toEqual([id]);
  });

  test('tells of a building that was taken out and put back', async () => {
    const scheme = await aScheme();
    await change(scheme, { created: [drawn('A')] });
    const { id } = await one(scheme);
    const kind = 'remove' as const;
    const gone = await change(scheme, { removed: [{ id, version: 1 }] }, { kind });
    expect(await registered(scheme)).toEqual([]);
    // the reference is free
    const other = await change(scheme, { created: [drawn('A')] });
    await expect(undo(scheme, gone.changeId)).rejects.toMatchObject({ code: 'already-exists' });
    await undo(scheme, other.changeId);
    await undo(scheme, gone.changeId);
    const building = await one(scheme);
    expect(building).toMatchObject({ id, version: 3, removedAt: null });
    const kinds = (await historyOf(building)).map((entry) => entry.kind);
    expect(kinds).toEqual(['undo', 'remove', 'import']);
  });
});

describe('changes at the same time', () => {
  test('of one version: the first is kept, the others are told by name', async () => {
    const scheme = await aScheme();
    await change(scheme, { created: [drawn('A'), drawn('B')] });
    const [a] = await registered(scheme);
    const id = a?.id ?? 0;
    const edits = [1, 2, 3].map(async (storeys) => {
      const seen = await Scheme.findByPk(scheme.id, { rejectOnEmpty: true });
      return change(seen, { changed: [{ id, version: 1, attributes: { storeys } }] });
    });
    const results = await Promise.allSettled(edits);
    expect(results.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    const refused = results
      .filter((result) => result.status === 'rejected')
      .map(({ reason }): unknown => reason);
    expect(refused).toHaveLength(2);
    for (const reason of refused) {
      expect(reason).toMatchObject({ code: 'conflict' });
      expect(String(reason)).toContain('Somebody else changed A meanwhile.');
    }
    expect(await Building.findByPk(id)).toMatchObject({ version: 2 });
  });

  test('of one that was taken out meanwhile, or that nobody knows, are refused whole', async () => {
    const scheme = await aScheme();
    await change(scheme, { created: [drawn('A'), drawn('B')] });
    const [a, b] = (await registered(scheme)).map(({ id }) => id);
    await change(scheme, { removed: [{ id: a ?? 0, version: 1 }] });
    const storeys = { storeys: 2 };
    for (const id of [a ?? 0, 999_999]) {
      const changed = [
        { id: b ?? 0, version: 1, attributes: storeys },
        { id, version: 1, attributes: storeys },
      ];
      await expect(change(scheme, { changed })).rejects.toMatchObject({ code: 'conflict' });
    }
    expect(await one(scheme)).toMatchObject({ storeys: null, version: 1 });
  });

  test('leave a building as it is that is given the values that it has', async () => {
    const scheme = await aScheme();
    await change(scheme, { created: [drawn('A', { attributes: { storeys: 2 } })] });
    const { id } = await one(scheme);
    const same = { id, version: 1, attributes: { storeys: 2 }, footprint: box(0, 0) };
    await change(scheme, { changed: [{ ...same, imported: { storeys: 2 } }] });
    expect(await one(scheme)).toMatchObject({ version: 1, imported: { storeys: 2 } });
  });
});
