import { describe, expect, test } from 'vitest';
import { insertBuildings, type NewBuilding } from '../../../server/commands/insert-buildings.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Building } from '../../../server/models/building.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { anAdministrator, aScheme } from '../../support/factories.ts';
import { testApp } from '../../support/test-app.ts';

const { services } = testApp();
/** Of EPSG:32631: on its central meridian, so due north is due north. */
const [E, N] = [500_000, 6_080_000];

function square(reference: string, side = 10, more: Partial<NewBuilding> = {}): NewBuilding {
  const ring = [[E, N], [E + side, N], [E + side, N + side], [E, N + side]] as const; // prettier-ignore
  return { reference, footprint: [[ring]], ...more };
}

async function insert(
  scheme: Scheme,
  buildings: readonly NewBuilding[],
  by: { id: string } | null = null,
) {
  await services().database.transaction((transaction) =>
    insertBuildings(scheme, buildings, transaction, by),
  );
  return Building.findAll({ where: { schemeId: scheme.id }, order: ['reference'] });
}

describe('inserting buildings', () => {
  test('keeps the footprint as it is in the grid, closed, and derives where it lies', async () => {
    const scheme = await aScheme();
    const [building] = await insert(scheme, [square('A', 1000)]);
    const ring = [[E, N], [E + 1000, N], [E + 1000, N + 1000], [E, N + 1000], [E, N]]; // prettier-ignore
    expect(building?.footprint).toEqual([[ring]]);
    expect(building?.lonLat[0]?.[0]).toHaveLength(5);
    expect(building?.west).toBeCloseTo(3, 9);
    // a degree is some 111.3 km from north to south, and some 64.1 km from east to west up here
    expect((building?.north ?? 0) - (building?.south ?? 0)).toBeCloseTo(1000 / 111_300, 4);
    expect((building?.east ?? 0) - (building?.west ?? 0)).toBeCloseTo(1000 / 64_100, 4);
    expect(building?.lonLat[0]?.[0]?.[0]?.[0]).toBeCloseTo(3, 8);
  });

  test('keeps what is known, and courtyards and parts', async () => {
    const scheme = await aScheme();
    const outer = square('A', 40).footprint[0]?.[0] ?? [];
    const inner = outer.map(([e, n]) => [(e - E) / 2 + E + 10, (n - N) / 2 + N + 10] as const);
    const [building] = await insert(scheme, [
      square('A', 10, {
        footprint: [[outer, inner], [outer.map(([e, n]) => [e + 100, n] as const)]],
        name: 'Customs House',
        storeys: 3,
        eavesHeight: 11.5,
        foundation: 'piled',
      }),
    ]);
    expect(building).toMatchObject({
      name: 'Customs House',
      storeys: 3,
      eavesHeight: 11.5,
      foundation: 'piled',
      address: null,
      groundLevel: null,
    });
    expect(building?.footprint.map((rings) => rings.length)).toEqual([2, 1]);
    expect(building?.lonLat.map((rings) => rings.length)).toEqual([2, 1]);
  });

  test('moves the register on by one version and tells the trail', async () => {
    const scheme = await aScheme();
    const by = await anAdministrator();
    await insert(scheme, [square('A'), square('B')], by);
    await scheme.reload();
    expect(scheme.registerVersion).toBe(2);
    expect(await AuditEntry.findAll({ where: { schemeId: scheme.id } })).toMatchObject([
      {
        action: 'insert buildings',
        personId: by.id,
        after: { buildings: 2, registerVersion: 2 },
      },
    ]);
  });

  test('brings in thousands in one go', async () => {
    const scheme = await aScheme();
    const many = Array.from({ length: 12_000 }, (_, k) =>
      square(`B-${String(k).padStart(5, '0')}`),
    );
    expect(await insert(scheme, many)).toHaveLength(12_000);
  });

  test.each([
    ['a reference twice', [square('A'), square('A')], 'already-exists'],
    ['a ring of two corners', [square('A', 10, { footprint: [[[[E, N], [E + 1, N]]]] })], 'invalid-input'], // prettier-ignore
    ['no ring', [square('A'), square('B', 10, { footprint: [] })], 'invalid-input'],
    ['a corner that is no number', [square('A', NaN)], 'invalid-input'],
    ['a corner off the earth', [square('A', 1e12)], 'invalid-input'],
  ])('refuses %s and brings in nothing', async (_, buildings, code) => {
    const scheme = await aScheme();
    await expect(insert(scheme, buildings)).rejects.toMatchObject({ code });
    expect(await Building.count({ where: { schemeId: scheme.id } })).toBe(0);
    await scheme.reload();
    expect(scheme.registerVersion).toBe(1);
  });

  test('refuses a reference that is in the register already, and an archived scheme', async () => {
    const scheme = await aScheme();
    await insert(scheme, [square('A')]);
    await expect(insert(scheme, [square('B'), square('A')])).rejects.toMatchObject({
      code: 'already-exists',
    });
    await scheme.update({ archivedAt: new Date() });
    await expect(insert(scheme, [square('C')])).rejects.toMatchObject({ code: 'archived' });
    expect(await Building.count({ where: { schemeId: scheme.id } })).toBe(1);
  });
});
