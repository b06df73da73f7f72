import { beforeAll, describe, expect, test } from 'vitest';
import {
  registerChoicesSchema,
  registerIdsSchema,
  registerPageSchema,
  registerPlaceSchema,
  REGISTER_ORDER,
  type RegisterFilter,
  type RegisterRow,
  type RegisterSort,
} from '../../../shared/schemas/register.ts';
import { RESULT_COLUMN_NAMES } from '../../../shared/schemas/result-columns.ts';
import type { Run } from '../../../server/models/run.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aMember, anAlignment } from '../../support/factories.ts';
import { box, change, drawn, registered } from '../../support/register.ts';
import { aRun, aTownToRun, UNDER_TOWN } from '../../support/runs.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app, services, runQueue } = testApp();

let scheme: Scheme;
let second: Run;
let agent: Awaited<ReturnType<typeof signIn>>;
/** The whole register by reference, as it is shown. */
let all: RegisterRow[];

async function get(end: string, query: object): Promise<unknown> {
  const answer = await agent.get(`/api/schemes/${scheme.id}/register${end}`).query(query);
  expect([answer.status, answer.body]).toMatchObject([200, {}]);
  return answer.body;
}

async function page(filter: RegisterFilter = {}, sort: RegisterSort = REGISTER_ORDER) {
  const asked = { filter: JSON.stringify(filter), sort: JSON.stringify(sort), limit: 200 };
  return registerPageSchema.parse(await get('', asked));
}

function references(rows: readonly RegisterRow[]): string[] {
  return rows.map(({ reference }) => reference);
}

/** What an order must come to, worked out from the rows by reference. */
function inOrder(rows: readonly RegisterRow[], { column, descending }: RegisterSort): string[] {
  if (column === 'reference') {
    return descending ? references(rows).reverse() : references(rows);
  }
  const valueOf = (row: RegisterRow) => row[column];
  const known = rows.filter((row) => valueOf(row) !== null);
  const way = descending ? -1 : 1;
  known.sort((a, b) => {
    const [left, right] = [valueOf(a) ?? 0, valueOf(b) ?? 0];
    return left === right ? 0 : way * (left < right ? -1 : 1);
  });
  return references([...known, ...rows.filter((row) => valueOf(row) === null)]);
}

beforeAll(async () => {
  const { option, ...made } = await aTownToRun();
  scheme = made.scheme;
  agent = await signIn(app(), await aMember(scheme, 'witness'));
  // all alike, far from the line, told apart by their references only
  const alike = [10, 9, 2, 100, 1].map((k) =>
    drawn(`B${k}`, { footprint: box(2000, 200), attributes: { use: k > 5 ? 'shop' : 'school' } }),
  );
  const deep = { groundLevel: 5, foundingLevel: -40 };
  const faulty = drawn('deep', { footprint: box(-150, 2), attributes: deep });
  await change(scheme, { created: [...alike, faulty] });
  await scheme.reload();
  await aRun({ services, runQueue }, scheme, option);
  const softer = await anAlignment(scheme, {
    name: 'Softer',
    design: { ...UNDER_TOWN, volumeLoss: { low: 0.005, central: 0.01, high: 0.015 } },
  });
  second = await aRun({ services, runQueue }, scheme, softer);
  await page({}, { column: 'settlement', descending: true });
  // both after the run, and after an order was kept
  const [gone] = (await registered(scheme)).filter(({ reference }) => reference === 'T1-2');
  await change(scheme, {
    created: [drawn('B5', { footprint: box(2000, 200), attributes: { use: 'shop' } })],
    removed: gone === undefined ? [] : [{ id: gone.id, version: gone.version }],
  });
  await scheme.reload();
  all = (await page()).rows;
});

describe('the register by what a run found', () => {
  test('shows the second run, without what has left, with what came since', () => {
    expect(references(all)).not.toContain('T1-2');
    expect(references(all).filter((one) => one.startsWith('B'))).toEqual([
      ...['B1', 'B2', 'B5', 'B9', 'B10', 'B100'],
    ]);
    const shown = (reference: string) => all.find((row) => row.reference === reference);
    expect(shown('B5')).toMatchObject({ stage: null, settlement: null, offset: null });
    expect(shown('deep')).toMatchObject({ settlement: null, category: null });
    expect(shown('deep')?.stage).not.toBeNull();
    expect(new Set(['B1', 'B9', 'B100'].map((one) => shown(one)?.settlement)).size).toBe(1);
  });

  test.each(RESULT_COLUMN_NAMES)('is ordered by %s, those alike by reference', async (column) => {
    for (const descending of [false, true]) {
      const sort = { column, descending };
      const { rows, found, run } = await page({}, sort);
      expect(run).toBe(second.id);
      expect(found).toBe(all.length);
      expect(references(rows)).toEqual(inOrder(all, sort));
      const [third] = rows.slice(2);
      const place = await get('/place', { sort: JSON.stringify(sort), buildingId: third?.id });
      expect(registerPlaceSchema.parse(place).index).toBe(2);
    }
  });

  test.each(RESULT_COLUMN_NAMES)('offers what %s says of its buildings', async (column) => {
    const choices = registerChoicesSchema.parse(await get(`/choices/${column}`, {}));
    const counts = new Map<string | null, number>();
    for (const row of all) {
      const value = row[column];
      const text = value === null ? null : String(value);
      counts.set(text, (counts.get(text) ?? 0) + 1);
    }
    expect(new Map(choices.map(({ value, count }) => [value, count]))).toEqual(counts);
    expect(choices.map(({ count }) => count)).toEqual(
      choices.map(({ count }) => count).sort((a, b) => b - a),
    );
  });
});

const SORTS: readonly RegisterSort[] = [
  REGISTER_ORDER,
  { column: 'reference', descending: true },
  { column: 'settlement', descending: true },
  { column: 'stage', descending: false },
  { column: 'area', descending: true },
  { column: 'use', descending: true },
];

const FILTERS: readonly [string, RegisterFilter, (row: RegisterRow) => boolean][] = [
  ['a stage', { any: { stage: ['2', '3'] } }, ({ stage }) => stage === 2 || stage === 3],
  ['what was not in the run', { any: { stage: [null] } }, ({ stage }) => stage === null],
  ['what is unknown', { unknown: ['settlement'] }, ({ settlement }) => settlement === null],
  [
    'a range',
    { ranges: { settlement: { from: 1, to: 12 } } },
    ({ settlement }) => settlement !== null && settlement >= 1 && settlement <= 12,
  ],
  ['words', { any: { heldBy: ['piled'] } }, ({ heldBy }) => heldBy === 'piled'],
  [
    'two figures and a use',
    { any: { stage: ['1'], use: ['shop'] }, ranges: { offset: { from: 0 } } },
    ({ stage, use, offset }) => stage === 1 && use === 'shop' && offset !== null && offset >= 0,
  ],
  [
    'a figure and a state',
    { any: { stage: ['1'], state: ['to decide'] } },
    ({ stage, state }) => stage === 1 && state === 'to decide',
  ],
];

describe.each(FILTERS)('the register by %s', (_, filter, isMeant) => {
  test.each(SORTS)('has the same buildings in the order of $column', async (sort) => {
    const meant = all.filter(isMeant);
    expect(meant.length).toBeGreaterThan(0);
    expect(meant.length).toBeLessThan(all.length);
    const { rows, found, all: count } = await page(filter, sort);
    expect(references(rows)).toEqual(inOrder(meant, sort));
    expect([found, count]).toEqual([meant.length, all.length]);
    const { ids } = registerIdsSchema.parse(await get('/ids', { filter: JSON.stringify(filter) }));
    expect(ids).toEqual(meant.map(({ id }) => id).sort((a, b) => a - b));
  });
});
