import { describe, expect, test } from 'vitest';
import type { ImportAnswer } from '../../../shared/schemas/imports.ts';
import { Building } from '../../../server/models/building.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { feature, geojson, rectangle } from '../../support/import-files.ts';
import { importSession } from '../../support/import-session.ts';
import { box, change, drawn, footprintOf, registered } from '../../support/register.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app, services } = testApp();

async function begin() {
  const scheme = await aScheme();
  const agent = await signIn(app(), await aMember(scheme, 'assessor'));
  return { scheme, agent, session: importSession(agent, scheme, services()) };
}

type Ring = ReturnType<typeof rectangle>;

function fileOf(rings: Readonly<Record<string, Ring>>): string {
  return geojson(Object.entries(rings).map(([ref, ring]) => feature({ ref }, ring)));
}

/** As a format of fewer figures has it. */
function rounded(ring: Ring): Ring {
  return ring.map(([x, y]) => [x + 0.0006, y - 0.0006]);
}

describe('a row over a building of the register', () => {
  async function remarks(rings: Readonly<Record<string, Ring>>) {
    const { scheme, session } = await begin();
    await session.confirm(await session.send(fileOf({ Old: rectangle(0, 0) })));
    await change(scheme, { created: [drawn('Far', { footprint: box(500, 0) })] });
    await change(await aScheme(), { created: [drawn('Elsewhere', { footprint: box(40, 0) })] });
    const row = await session.send(fileOf(rings));
    return (await session.rows(row)).map((one) => [one.reference, one.outcome, one.remarks]);
  }

  test('is noted and comes in; one that shares a wall or lies apart is not noted', async () => {
    const found = await remarks({
      over: rectangle(6, 0),
      beside: rectangle(-10, 0),
      apart: rectangle(40, 0),
    });
    expect(found).toEqual([
      ['over', 'new', ['The footprint overlaps Old of the register by 32 m².']],
      ['beside', 'new', []],
      ['apart', 'new', []],
    ]);
  });

  test('is not noted for the building that it changes, nor for one that moves away', async () => {
    expect(await remarks({ Old: rectangle(1, 1) })).toEqual([['Old', 'changed', []]]);
    const found = await remarks({ Old: rectangle(100, 0), new: rectangle(0, 0) });
    expect(found).toEqual([
      ['Old', 'changed', []],
      ['new', 'new', []],
    ]);
  });
});

describe('a footprint changed by hand', () => {
  async function edited() {
    const begun = await begin();
    const { session, scheme, agent } = begun;
    await session.confirm(await session.send(fileOf({ a: rectangle(0, 0), b: rectangle(30, 0) })));
    const [a] = await registered(scheme);
    const address = `/api/schemes/${scheme.id}/buildings/${a?.id ?? 0}`;
    const answer = await agent.patch(address).send({ version: 1, footprint: box(0, 0, 9) });
    expect(answer.status).toBe(200);
    return begun;
  }
  const nothing: Partial<ImportAnswer['counts'] & object> = { same: 2, changed: 0, conflict: 0 };

  test('stays without a question when the file comes again in a format that rounds', async () => {
    const { session, scheme } = await edited();
    const again = fileOf({ a: rounded(rectangle(0, 0)), b: rounded(rectangle(30, 0)) });
    const row = await session.send(again);
    expect(row).toMatchObject({ counts: nothing, missing: [] });
    const [a] = await session.rows(row);
    expect(a?.changes).toMatchObject([{ field: 'footprint', isConflict: false, isKept: true }]);
    const [building] = await Building.findAll({ where: { schemeId: scheme.id, reference: 'a' } });
    expect(building).toMatchObject({ area: 81 });
  });

  test('is asked about where the file changed too, once for each change of the file', async () => {
    const { session, scheme } = await edited();
    const moved = { a: rectangle(0, 0, 12), b: rectangle(30, 0) };
    const row = await session.send(fileOf(moved));
    expect(row).toMatchObject({ counts: { conflict: 1 }, missing: ['settle'] });
    const settle = { others: 'keep ours' as const, rows: {} };
    await session.confirm(await session.choose(row, { settle }));
    const again = await session.send(fileOf({ ...moved, a: rounded(moved.a) }));
    expect(again).toMatchObject({ counts: nothing, missing: [] });
    const other = await session.send(fileOf({ ...moved, a: rectangle(0, 0, 13) }));
    expect(other.counts).toMatchObject({ conflict: 1 });
    const [a] = await registered(scheme);
    expect((await footprintOf({ id: a?.id ?? 0 })).footprint[0]?.[0]).toHaveLength(5);
  });
});
