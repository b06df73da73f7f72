import pg from 'pg';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { migration } from '../../../server/database/migrations/34-run-orders.ts';
import { findRunOrders, type OrderedPart } from '../../../server/models/run-orders.ts';
import { findResult } from '../../../server/models/run-results.ts';
import { startRun } from '../../../server/commands/start-run.ts';
import { Building } from '../../../server/models/building.ts';
import type { Run } from '../../../server/models/run.ts';
import { unpackFigures, unpackIds } from '../../../server/register/packed-ids.ts';
import { RESULT_COLUMN_NAMES, type ResultColumn } from '../../../shared/schemas/result-columns.ts';
import { box, change, drawn } from '../../support/register.ts';
import { aRun, aTownToRun } from '../../support/runs.ts';
import { testApp } from '../../support/test-app.ts';

const { services, runQueue } = testApp();

let run: Run;
let made: Awaited<ReturnType<typeof aTownToRun>>;
let owner: pg.Client;

function found(column: ResultColumn): Promise<OrderedPart[]> {
  return findRunOrders(services().database, run.id, column, null);
}

/** Every building that has a value in a column, with its value. */
async function pairs(column: ResultColumn): Promise<[number, string | number][]> {
  const parts = await found(column);
  return parts.flatMap(({ ids, figures, words }) => {
    const values = figures === null ? null : unpackFigures(figures);
    return Array.from(unpackIds(ids), (id, k): [number, string | number] => [
      id,
      values?.[k] ?? words ?? '',
    ]);
  });
}

beforeAll(async () => {
  made = await aTownToRun();
  // founded below the crown beside the line, so that it cannot be worked out
  const attributes = { groundLevel: 5, foundingLevel: -40 };
  await change(made.scheme, { created: [drawn('deep', { footprint: box(-150, 2), attributes })] });
  await made.scheme.reload();
  run = await aRun({ services, runQueue }, made.scheme, made.option);
  owner = new pg.Client(services().env.DATABASE_URL.replace(/\/\/.*@/, ownersPart()));
  await owner.connect();
});

afterAll(async () => {
  await owner.end();
});

function ownersPart(): string {
  const { username, password } = new URL(inject('cluster').ownerUrl);
  return `//${username}:${password}@`;
}

test('figures stand ascending beside the buildings that have them, in the units of the register', async () => {
  const buildings = await Building.findAll({ where: { schemeId: made.scheme.id } });
  const settlements: [number, number][] = [];
  for (const { id } of buildings) {
    const result = await findResult(services().database, run.id, id);
    if (result?.fault === null) settlements.push([id, result.settlement * 1000]);
  }
  const ordered = await pairs('settlement');
  expect(ordered.length).toBe(buildings.length - 1);
  expect(new Map(ordered)).toEqual(new Map(settlements));
  const values = ordered.map(([, value]) => Number(value));
  expect(values).toEqual([...values].sort((a, b) => a - b));
  // of a building that could not be worked out only its stage is known
  expect(await pairs('stage')).toHaveLength(buildings.length);
});

test('words have a row each, as people order them', async () => {
  const words = (await found('heldBy')).map((part) => part.words);
  expect(words).toContain('piled');
  expect(words).toEqual([...new Set(words)].sort((a, b) => String(a).localeCompare(String(b))));
});

test('a run under way has nothing in order', async () => {
  const { id } = await startRun(services(), null, made.scheme, {
    ...{ alignmentId: made.option.id, alignmentVersion: made.option.version },
  });
  expect(await findRunOrders(services().database, id, 'stage', null)).toEqual([]);
  await runQueue().idle();
  expect(await findRunOrders(services().database, id, 'stage', null)).toHaveLength(1);
});

test('runs that were complete before are put in order by the migration alike', async () => {
  const before = await Promise.all(RESULT_COLUMN_NAMES.map(pairs));
  const { username } = new URL(services().env.DATABASE_URL);
  const context = {
    server: `"${username}"`,
    sql: async (text: string) => {
      await owner.query(text);
    },
  };
  await migration.down(context);
  await migration.up(context);
  const after = await Promise.all(RESULT_COLUMN_NAMES.map(pairs));
  const sorted = (columns: typeof before) =>
    columns.map((column) => [...column].sort(([a], [b]) => a - b));
  expect(sorted(after)).toEqual(sorted(before));
  expect(after.map((column) => column.map(([, value]) => value))).toEqual(
    before.map((column) => column.map(([, value]) => value)),
  );
});
