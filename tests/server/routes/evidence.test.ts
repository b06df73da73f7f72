import { createHash, randomUUID } from 'node:crypto';
import { appendFileSync, existsSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import {
  aboutSheetsSchema,
  planMaterialSchema,
} from '../../../shared/schemas/evidence-material.ts';
import {
  layoutSchema,
  layoutsSchema,
  printSchema,
  printsSchema,
} from '../../../shared/schemas/evidence.ts';
import { recoverPrints } from '../../../server/commands/recover-prints.ts';
import { printFile, unfinishedFile } from '../../../server/evidence/print-file.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { BackgroundFeature } from '../../../server/models/background-feature.ts';
import { beginPrint, insertPrint } from '../../../server/models/prints.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { RunState } from '../../../server/models/run-state.ts';
import { toLonLat } from '../../../server/crs/to-lon-lat.ts';
import { crsOfScheme } from '../../../server/crs/crs-of-scheme.ts';
import { aPlan, aStrip } from '../../support/evidence.ts';
import { aMember, anAdministrator, aPerson, aScheme } from '../../support/factories.ts';
import { bookmarksOfPdf, factsOfPdf } from '../../support/pdf-tools.ts';
import { E, N } from '../../support/register.ts';
import { aRun, aTownToRun } from '../../support/runs.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const started = testApp();
const { app, services } = started;

async function begin() {
  const { scheme, option } = await aTownToRun();
  const run = await aRun(started, scheme, option);
  const agent = await signIn(app(), await aMember(scheme, 'witness'));
  const base = `/api/schemes/${scheme.id}`;
  return { scheme, run, agent, base, prints: `${base}/runs/${run.id}/prints` };
}

async function actionsOf({ id: schemeId }: Scheme): Promise<string[]> {
  const entries = await AuditEntry.findAll({ where: { schemeId }, order: ['id'] });
  return entries.map(({ action }) => action).filter((action) => /layout|print/.test(action));
}

/** A print that nothing has begun yet. */
async function aWaitingPrint({ id: schemeId }: Scheme, runId: string): Promise<string> {
  const { database } = services();
  const [id, by] = [randomUUID(), (await aPerson()).id];
  await database.transaction((transaction) =>
    insertPrint(database, { id, schemeId, runId, name: 'A', layout: PLAN, by }, transaction),
  );
  return id;
}

const PLAN = aPlan([E, N]);
const SEEN = `west=${E - 100}&south=${N - 50}&east=${E + 50}&north=${N + 50}`;

describe('layouts', () => {
  test('are kept under names, changed, and removed; the trail tells it', async () => {
    const { scheme, agent, base } = await begin();
    const made = await agent.post(`${base}/layouts`).send({ name: ' Quay ', layout: PLAN });
    expect(made.status).toBe(201);
    const kept = layoutSchema.parse(made.body);
    expect(kept).toMatchObject({ name: 'Quay', version: 1, layout: PLAN });
    const taken = await agent.post(`${base}/layouts`).send({ name: 'QUAY', layout: PLAN });
    expect([taken.status, taken.body]).toMatchObject([
      409,
      { error: { code: 'already-exists', fields: [{ path: 'name' }] } },
    ]);
    const address = `${base}/layouts/${kept.id}`;
    const change = { version: 1, name: 'Harbour', layout: { ...PLAN, denominator: 1250 } };
    const changed = layoutSchema.parse((await agent.patch(address).send(change)).body);
    expect(changed).toMatchObject({ version: 2, layout: { denominator: 1250 } });
    expect((await agent.patch(address).send(change)).body).toMatchObject({
      error: { code: 'conflict' },
    });
    expect(layoutsSchema.parse((await agent.get(`${base}/layouts`)).body)).toEqual([changed]);
    expect((await agent.delete(address)).status).toBe(204);
    expect((await agent.delete(address)).status).toBe(404);
    expect((await agent.get(`${base}/layouts`)).body).toEqual([]);
    expect(await actionsOf(scheme)).toEqual(['create layout', 'change layout', 'remove layout']);
  });

  test('are refused with the field at fault', async () => {
    const { agent, base } = await begin();
    const bad = { name: 'A', layout: { ...PLAN, denominator: 1 } };
    const answer = await agent.post(`${base}/layouts`).send(bad);
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path: 'layout.denominator' }] } });
  });
});

describe('what plans are drawn from', () => {
  test('is what the run took to stand there, by reference, with its result', async () => {
    const { scheme, agent, base, run } = await begin();
    const { definition } = await crsOfScheme(scheme);
    const place = toLonLat(definition);
    const corners = ([[-90, 0], [-70, 0], [-70, 9], [-90, 0]] as const).map(([e, n]) => place([E + e, N + n])); // prettier-ignore
    const [lonLat] = corners;
    const [west = 0, south = 0] = lonLat ?? [];
    const box = { west, south, east: west + 0.001, north: south + 0.001 };
    const geometry = { type: 'Polygon', coordinates: [corners] };
    await BackgroundFeature.create({ schemeId: scheme.id, layer: 'water', name: 'Dock', geometry, ...box }); // prettier-ignore
    const answer = await agent.get(`${base}/runs/${run.id}/evidence?${SEEN}`);
    const { material } = planMaterialSchema.parse(answer.body);
    const references = material.buildings.map(({ reference }) => reference);
    expect(references.slice(0, 3)).toEqual(['T0-0', 'T0-1', 'T0-2']);
    expect(references).not.toContain('far');
    expect(material.buildings[0]?.result.category).not.toBeNull();
    expect(material.contours.length).toBeGreaterThan(0);
    const [dock] = material.background;
    expect(dock).toMatchObject({ layer: 'water', name: 'Dock', isArea: true });
    expect(dock?.lines[0]?.[0]?.[0]).toBeCloseTo(E - 90, 2);
    expect(dock?.lines[0]?.[0]?.[1]).toBeCloseTo(N, 2);
    const about = aboutSheetsSchema.parse((await agent.get(`${base}/runs/${run.id}/evidence/about`)).body); // prettier-ignore
    expect(about.scheme.crs.code).toBe(32631);
    expect(about.run.id).toBe(run.id);
    expect(about.keyGround).toMatchObject([{ name: 'Dock' }]);
  });

  test('wants ground, and of a run that is complete', async () => {
    const { agent, base, run } = await begin();
    const address = `${base}/runs/${run.id}/evidence`;
    const turned = `west=${E}&south=${N}&east=${E - 1}&north=${N + 1}`;
    expect((await agent.get(`${address}?${turned}`)).body).toMatchObject({
      error: { fields: [{ path: 'east' }] },
    });
    const unknown = `${base}/runs/${UNKNOWN_ID}/evidence`;
    expect((await agent.get(`${unknown}?${SEEN}`)).status).toBe(404);
    expect((await agent.get(`${unknown}/about`)).status).toBe(404);
    await RunState.update({ state: 'running' }, { where: { runId: run.id } });
    expect((await agent.get(`${address}?${SEEN}`)).status).toBe(409);
    expect((await agent.get(`${address}/about`)).status).toBe(409);
  });
});

describe('a print', () => {
  test('is drawn beside requests and sent as it was fingerprinted', async () => {
    const { scheme, agent, base, prints, run } = await begin();
    const answer = await agent.post(prints).send({ name: 'Quay', layout: PLAN });
    expect(answer.status).toBe(201);
    const asked = printSchema.parse(answer.body);
    expect(asked).toMatchObject({ number: 1, name: 'Quay', runNumber: 1, runId: run.id });
    await services().jobs.idle();
    const address = `${base}/prints/${asked.id}`;
    const done = printSchema.parse((await agent.get(address)).body);
    expect(done).toMatchObject({ state: 'done', fault: null });
    expect(done.sheets).toBeGreaterThan(0);
    const file = await agent.get(`${address}/file`).responseType('blob');
    expect(file.headers['content-disposition']).toContain('print-1-Quay-run-1.pdf');
    const bytes: unknown = file.body;
    if (!Buffer.isBuffer(bytes)) throw new Error('There is no file.');
    expect(bytes.length).toBe(done.bytes);
    expect(createHash('sha256').update(bytes).digest('hex')).toBe(done.fingerprint);
    expect(factsOfPdf(bytes)).toMatchObject({ Title: PLAN.fields.title, Author: scheme.name });
    expect(bookmarksOfPdf(bytes)).toHaveLength(done.sheets ?? 0);
    expect(printsSchema.parse((await agent.get(`${base}/prints`)).body)).toEqual([done]);
    expect(await actionsOf(scheme)).toEqual(['ask for print', 'finish print']);
    const late = await agent.post(`${address}/cancel`).send({});
    expect(late.status).toBe(409);
  });

  test('is refused where its layout makes no sheets', async () => {
    const { agent, prints, base } = await begin();
    const answer = await agent.post(prints).send({ name: 'A', layout: aStrip({ from: 5000 }) });
    expect([answer.status, answer.body]).toMatchObject([
      422,
      { error: { fields: [{ path: 'layout.from' }] } },
    ]);
    expect((await agent.get(`${base}/prints`)).body).toEqual([]);
  });

  test('wants a run that is there and complete', async () => {
    const { agent, prints, base, run } = await begin();
    const asked = { name: 'A', layout: PLAN };
    const foreign = (await begin()).run.id;
    for (const id of [UNKNOWN_ID, foreign]) {
      expect((await agent.post(`${base}/runs/${id}/prints`).send(asked)).status).toBe(404);
    }
    await RunState.update({ state: 'running' }, { where: { runId: run.id } });
    expect((await agent.post(prints).send(asked)).status).toBe(409);
    expect((await agent.get(`${base}/prints`)).body).toEqual([]);
  });

  test('that is cancelled has no file, and stays so', async () => {
    const { scheme, agent, base, run } = await begin();
    const id = await aWaitingPrint(scheme, run.id);
    const address = `${base}/prints/${id}`;
    const answer = await agent.post(`${address}/cancel`).send({});
    expect(printSchema.parse(answer.body).state).toBe('cancelled');
    expect(await actionsOf(scheme)).toEqual(['cancel print']);
    expect((await agent.get(`${address}/file`)).status).toBe(409);
    await recoverPrints(services());
    await services().jobs.idle();
    expect((await agent.get(address)).body).toMatchObject({ state: 'cancelled' });
    expect(existsSync(printFile(services().env, id))).toBe(false);
  });

  test('that is being drawn is stopped', async () => {
    const { agent, base, prints } = await begin();
    const long = aStrip({ denominator: 50, overlap: 1 });
    const asked = await agent.post(prints).send({ name: 'A', layout: long });
    const { id } = printSchema.parse(asked.body);
    const answer = await agent.post(`${base}/prints/${id}/cancel`).send({});
    expect(printSchema.parse(answer.body).state).toBe('cancelled');
    expect(readdirSync(services().env.PRINTS_FOLDER).filter((name) => name.includes(id))).toEqual(
      [],
    );
  });

  test('is refused where ten of the scheme wait already', async () => {
    const { scheme, agent, base, prints, run } = await begin();
    for (let k = 0; k < 10; k += 1) await aWaitingPrint(scheme, run.id);
    const asked = { name: 'One more', layout: PLAN };
    const answer = await agent.post(prints).send(asked);
    expect(answer.status).toBe(409);
    expect(answer.body).toMatchObject({ error: { message: expect.stringContaining('10 prints') as string } }); // prettier-ignore
    const [first] = printsSchema.parse((await agent.get(`${base}/prints`)).body);
    await agent.post(`${base}/prints/${first?.id}/cancel`).send({});
    expect((await agent.post(prints).send(asked)).status).toBe(201);
    await services().jobs.idle();
  });

  test('is not sent where its file is gone or another', async () => {
    const { agent, base, prints } = await begin();
    const asked = await agent.post(prints).send({ name: 'A', layout: PLAN });
    const { id } = printSchema.parse(asked.body);
    await services().jobs.idle();
    const [file, address] = [printFile(services().env, id), `${base}/prints/${id}/file`];
    appendFileSync(file, ' ');
    const changed = await agent.get(address);
    expect([changed.status, changed.body]).toMatchObject([
      409,
      { error: { message: expect.stringContaining('not what was printed') as string } },
    ]);
    rmSync(file);
    expect((await agent.get(address)).status).toBe(404);
  });

  test('that was stopped when its file was whole leaves none behind', async () => {
    const { scheme, agent, base, prints, run } = await begin();
    const [done, stopped] = [await agent.post(prints).send({ name: 'A', layout: PLAN }), await aWaitingPrint(scheme, run.id)]; // prettier-ignore
    await services().jobs.idle();
    await agent.post(`${base}/prints/${stopped}/cancel`).send({});
    const { env } = services();
    writeFileSync(printFile(env, stopped), 'whole');
    await recoverPrints(services());
    expect(existsSync(printFile(env, stopped))).toBe(false);
    expect(existsSync(printFile(env, printSchema.parse(done.body).id))).toBe(true);
  });

  test('that a server left half done is done again at the next start', async () => {
    const { scheme, agent, base, run } = await begin();
    const id = await aWaitingPrint(scheme, run.id);
    await beginPrint(services().database, id);
    const half = unfinishedFile(printFile(services().env, id));
    writeFileSync(half, 'half');
    await recoverPrints(services());
    await services().jobs.idle();
    expect((await agent.get(`${base}/prints/${id}`)).body).toMatchObject({ state: 'done' });
    expect(existsSync(half)).toBe(false);
  });
});

describe('who', () => {
  test('owners, strangers and nobody see and ask for nothing', async () => {
    const { scheme, base, prints, run } = await begin();
    const agents = [
      [await signIn(app(), await aMember(scheme, 'owner')), 403],
      [await signIn(app(), await aMember(await aScheme(), 'witness')), 404],
      [await visitor(app()), 401],
    ] as const;
    for (const [agent, status] of agents) {
      for (const address of ['layouts', 'prints', `runs/${run.id}/evidence/about`]) {
        expect((await agent.get(`${base}/${address}`)).status).toBe(status);
      }
      expect((await agent.post(prints).send({ name: 'A', layout: PLAN })).status).toBe(status);
      expect((await agent.post(`${base}/layouts`).send({ name: 'A', layout: PLAN })).status).toBe(status); // prettier-ignore
    }
    const administrator = await signIn(app(), await anAdministrator());
    expect((await administrator.get(`${base}/prints`)).body).toEqual([]);
  });

  test('a print of another scheme answers like one that is not there', async () => {
    const { agent, base } = await begin();
    const other = await begin();
    const { id } = printSchema.parse((await other.agent.post(other.prints).send({ name: 'A', layout: PLAN })).body); // prettier-ignore
    await services().jobs.idle();
    for (const print of [id, UNKNOWN_ID]) {
      expect((await agent.get(`${base}/prints/${print}`)).status).toBe(404);
      expect((await agent.get(`${base}/prints/${print}/file`)).status).toBe(404);
      expect((await agent.post(`${base}/prints/${print}/cancel`).send({})).status).toBe(404);
    }
  });
});
