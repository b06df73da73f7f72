import request from 'supertest';
import { beforeAll, describe, expect, test } from 'vitest';
import {
  registerChoicesSchema,
  registerIdsSchema,
  registerPageSchema,
  registerPlaceSchema,
  type RegisterFilter,
  type RegisterRow,
  type RegisterSort,
} from '../../../shared/schemas/register.ts';
import { runDetailSchema, type RunResult } from '../../../shared/schemas/runs.ts';
import { findResult } from '../../../server/models/run-results.ts';
import type { Alignment } from '../../../server/models/alignment.ts';
import type { Run } from '../../../server/models/run.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aMember, anAlignment } from '../../support/factories.ts';
import { change, drawn } from '../../support/register.ts';
import { aRun, aTownToRun, UNDER_TOWN } from '../../support/runs.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app, services, runQueue } = testApp();

type Asked = {
  readonly filter?: RegisterFilter;
  readonly sort?: Partial<RegisterSort>;
  readonly offset?: number;
  readonly limit?: number;
};

let scheme: Scheme;
let first: Run;
/** An option that hardly moves the ground. */
let calm: Alignment;
let agent: Awaited<ReturnType<typeof signIn>>;

async function get(end: string, { filter, sort, ...others }: Asked = {}) {
  const answer = await agent.get(`/api/schemes/${scheme.id}/${end}`).query({
    ...(filter && { filter: JSON.stringify(filter) }),
    ...(sort && { sort: JSON.stringify({ column: 'reference', descending: false, ...sort }) }),
    ...others,
  });
  expect([answer.status, answer.body]).toMatchObject([200, {}]);
  return answer.body as unknown;
}

async function page(asked: Asked = {}) {
  return registerPageSchema.parse(await get('register', asked));
}

/** What a row says of a result, out of the record. */
function asListed(result: RunResult): Partial<RegisterRow> {
  const { stage, categoryLow, category, categoryHigh, breakpoint, reserve, isSettled } = result;
  return {
    ...{ stage, categoryLow, category, categoryHigh, breakpoint, reserve },
    strain: result.strain === null ? null : result.strain * 100,
    settlement: result.settlement * 1000,
    slope: result.slope * 1000,
    settled: isSettled === null ? null : isSettled ? 'settled' : 'sensitive',
    heldBy: result.heldBy.length === 0 ? null : result.heldBy.join(', '),
  };
}

beforeAll(async () => {
  const { option, ...made } = await aTownToRun();
  scheme = made.scheme;
  agent = await signIn(app(), await aMember(scheme, 'witness'));
  expect((await page()).run).toBeNull();
  first = await aRun({ services, runQueue }, scheme, option);
  calm = await anAlignment(scheme, {
    name: 'Calm',
    design: { ...UNDER_TOWN, volumeLoss: { low: 0.0001, central: 0.0001, high: 0.0001 } },
  });
  // came after the run
  await change(scheme, { created: [drawn('later')] });
  await scheme.reload();
});

describe('the register after a run', () => {
  test('says of every building what the run recorded, to the last bit', async () => {
    const { rows, run } = await page();
    expect(run).toBe(first.id);
    for (const row of rows) {
      const result = await findResult(services().database, first.id, row.id);
      if (row.reference === 'later') {
        expect([result, row.stage, row.settlement, row.heldBy]).toEqual([
          undefined,
          null,
          null,
          null,
        ]);
      } else {
        expect(result).toBeDefined();
        if (result !== undefined) expect(row).toMatchObject(asListed(result));
      }
    }
    expect(new Set(rows.map(({ stage }) => stage)).size).toBeGreaterThan(2);
  });

  test('finds as many as the run counts, by stage, category and what is sensitive', async () => {
    const { counts } = runDetailSchema.parse(await get(`runs/${first.id}`));
    if (counts === null) throw new Error('The run is not complete.');
    const found = async (filter: RegisterFilter) => (await page({ filter })).found;
    for (const stage of [1, 2, 3]) {
      expect(await found({ any: { stage: [String(stage)] } })).toBe(counts.stages[stage - 1]);
    }
    for (const category of [0, 1, 2, 3, 4]) {
      const values = [String(category)];
      expect(await found({ any: { categoryLow: values } })).toBe(counts.low[category]);
      expect(await found({ any: { category: values } })).toBe(counts.central[category]);
      expect(await found({ any: { categoryHigh: values } })).toBe(counts.high[category]);
    }
    expect(await found({ any: { settled: ['sensitive'] } })).toBe(counts.sensitive);
    expect(await found({ unknown: ['stage'] })).toBe(1);
  });

  test('offers the values of a column of results with how often each is there', async () => {
    const { counts } = runDetailSchema.parse(await get(`runs/${first.id}`));
    const choices = registerChoicesSchema.parse(await get('register/choices/stage'));
    const byValue = Object.fromEntries(choices.map(({ value, count }) => [String(value), count]));
    expect(byValue).toMatchObject({ 1: counts?.stages[0], 3: counts?.stages[2], null: 1 });
  });

  test('takes ranges in the unit that is shown', async () => {
    const { rows } = await page();
    const deep = rows.filter(({ settlement }) => settlement !== null && settlement >= 10);
    expect(deep.length).toBeGreaterThan(0);
    const filter: RegisterFilter = { ranges: { settlement: { from: 10 } } };
    const found = await page({ filter });
    expect(found.rows.map(({ id }) => id)).toEqual(deep.map(({ id }) => id));
    const { ids } = registerIdsSchema.parse(await get('register/ids', { filter }));
    expect(ids).toEqual(deep.map(({ id }) => id).sort((a, b) => a - b));
  });

  test.each(['settlement', 'strain', 'category', 'reserve', 'heldBy', 'settled'] as const)(
    'is ordered by %s, what has none last, near and far alike',
    async (column) => {
      for (const descending of [false, true]) {
        const sort = { column, descending };
        const { rows, found } = await page({ sort });
        const known = rows.map((row) => row[column]).filter((value) => value !== null);
        expect(rows.slice(0, known.length).every((row) => row[column] !== null)).toBe(true);
        const ordered = [...known].sort((a, b) => (a < b ? -1 : a > b ? 1 : 0));
        expect(known).toEqual(descending ? ordered.reverse() : ordered);
        // asks for the whole order
        const last = rows.at(-1);
        const place = await agent.get(`/api/schemes/${scheme.id}/register/place`).query({
          sort: JSON.stringify(sort),
          buildingId: last?.id,
        });
        expect(registerPlaceSchema.parse(place.body).index).toBe(found - 1);
        expect((await page({ sort })).rows.map(({ id }) => id)).toEqual(rows.map(({ id }) => id));
      }
    },
  );

  test('goes out as a file with the figures that are shown', async () => {
    const { rows } = await page({ sort: { column: 'settlement', descending: true } });
    const answer = await agent.get(`/api/schemes/${scheme.id}/register/export`).query({
      format: 'csv',
      columns: JSON.stringify(['reference', 'stage', 'category', 'settlement']),
      sort: JSON.stringify({ column: 'settlement', descending: true }),
    });
    const lines = answer.text.split('\r\n');
    expect(lines[0]).toMatch(/Reference,Stage,Category central,Settlement \(mm\)$/);
    expect(lines.slice(1, -1)).toEqual(
      rows.map((row) =>
        [row.reference, row.stage, row.category, row.settlement].map((one) => one ?? '').join(','),
      ),
    );
  });

  test('follows the next run as soon as it is complete', async () => {
    const filter: RegisterFilter = { ranges: { settlement: { from: 10 } } };
    const sort = { column: 'settlement', descending: true } as const;
    const before = await page({ filter, sort });
    const asked = await aRun({ services, runQueue }, scheme, calm);
    const after = await page({ filter, sort });
    expect(before.run).toBe(first.id);
    expect(after.run).toBe(asked.id);
    expect(before.found).toBeGreaterThan(0);
    expect(after.found).toBe(0);
  });

  test('refuses ranges of what is no number, and columns that are none', async () => {
    for (const filter of [{ ranges: { heldBy: { from: 1 } } }, { any: { governingWall: ['A'] } }]) {
      const answer = await agent
        .get(`/api/schemes/${scheme.id}/register`)
        .query({ filter: JSON.stringify(filter) });
      expect(answer.status).toBe(422);
    }
    expect((await request(app()).get(`/api/schemes/${scheme.id}/register`)).status).toBe(401);
  });
});
