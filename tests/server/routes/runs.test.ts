import { describe, expect, test } from 'vitest';
import { centralSurface } from '../../../shared/assessment/central-surface.ts';
import { outcomesOfBuildings } from '../../../shared/assessment/outcomes-of-buildings.ts';
import { resultOfOutcome } from '../../../shared/assessment/result-of-outcome.ts';
import { assessmentRules, runInputs } from '../../../shared/assessment/run-inputs.ts';
import { FIELD } from '../../../shared/ground/kernel.ts';
import {
  runBuildingSchema,
  runDetailSchema,
  runProgressSchema,
  runSchema,
  runsSchema,
} from '../../../shared/schemas/runs.ts';
import { runContoursSchema, runMapSchema } from '../../../shared/schemas/run-map.ts';
import { defaultRules } from '../../../server/commands/default-rules.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Building } from '../../../server/models/building.ts';
import { RunState } from '../../../server/models/run-state.ts';
import { Run } from '../../../server/models/run.ts';
import { aMember, anAdministrator, anAlignment, aScheme } from '../../support/factories.ts';
import { change, registered } from '../../support/register.ts';
import { aRun, aTownToRun, someSchemeRules, UNDER_TOWN } from '../../support/runs.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID, UNKNOWN_NUMBER } from '../../support/unknown-ids.ts';

const tested = testApp();
const { app, runQueue } = tested;

async function anAssessor() {
  const { scheme, option } = await aTownToRun();
  const person = await aMember(scheme, 'assessor');
  const address = `/api/schemes/${scheme.id}/runs`;
  const asked = { alignmentId: option.id, alignmentVersion: option.version };
  return { scheme, option, person, address, asked, agent: await signIn(app(), person) };
}

/** What the core finds of a register, in one go. */
async function workedOut(runId: string) {
  const { design, rules } = await Run.findByPk(runId, { rejectOnEmpty: true });
  const rows = await Building.sequelize?.query(
    `select s.facts from run_buildings r join building_snapshots s using (building_id, version)
     where r.run_id = $1 order by building_id`,
    { bind: [runId] },
  );
  const facts = (rows?.[0] as { facts: never }[]).map((row) => row.facts);
  return outcomesOfBuildings(runInputs(design, rules), design.groundLevel, facts, []);
}

describe('a run', () => {
  test('is started, worked out part by part and read with all that was put in', async () => {
    const { scheme, option, person, address, asked, agent } = await anAssessor();
    const answer = await agent.post(address).send(asked);
    expect(answer.status).toBe(201);
    const started = runSchema.parse(answer.body);
    expect(started).toMatchObject({
      ...{ number: 1, startedBy: person.name, buildings: 23, methodVersion: '1.1.0' },
      option: { id: option.id, name: option.name, version: 1 },
      since: { register: false, option: false, rules: false },
    });
    await runQueue().idle();
    const detail = runDetailSchema.parse((await agent.get(`${address}/${started.id}`)).body);
    expect(detail).toMatchObject({ state: 'complete', done: 23, design: UNDER_TOWN });
    expect(detail).toMatchObject({ rules: defaultRules('2026-12-01'), isShown: true });
    const { counts } = detail;
    expect(counts?.stages.reduce((sum, count) => sum + count)).toBe(23);
    expect(counts).toMatchObject({ held: 1, assumed: 23, faults: 0 });
    expect(counts?.stages[0]).toBe(1);
    const entries = await AuditEntry.findAll({
      where: { schemeId: scheme.id, action: 'start run' },
    });
    expect(entries).toMatchObject([{ personId: person.id, after: { number: 1 } }]);
  });

  test('finds what the core finds in one go, to the bit, however it is cut', async () => {
    const { scheme, option, address, agent } = await anAssessor();
    const run = await aRun(tested, scheme, option);
    const outcomes = await workedOut(run.id);
    expect(outcomes).toHaveLength(23);
    for (const { id, outcome } of outcomes) {
      const answer = await agent.get(`${address}/${run.id}/buildings/${id}`);
      expect(runBuildingSchema.parse(answer.body).result).toStrictEqual(resultOfOutcome(outcome));
    }
    const strained = outcomes.filter(({ outcome }) => outcome.strain?.governing?.isRow === true);
    expect(strained.length).toBeGreaterThan(0);
  });

  test('colours the map and draws contours that lie on their level', async () => {
    const { scheme, option, address, agent } = await anAssessor();
    const run = await aRun(tested, scheme, option);
    const figures = runMapSchema.parse((await agent.get(`${address}/${run.id}/map`)).body);
    expect(figures.ids).toEqual(
      (await registered(scheme)).map(({ id }) => id).sort((a, b) => a - b),
    );
    expect(new Set(figures.low).has(-1)).toBe(true);
    expect(Math.max(...figures.settlement)).toBeGreaterThan(0.01);
    const answer = await agent.get(`${address}/${run.id}/contours`);
    expect(answer.headers['cache-control']).toContain('immutable');
    const contours = runContoursSchema.parse(answer.body);
    const surface = centralSurface(UNDER_TOWN, assessmentRules(defaultRules('2026-12-01')));
    for (const { level, line } of contours) {
      for (const point of line) {
        const settlement = surface.at(point)?.[FIELD.settlement] ?? NaN;
        expect(Math.abs(settlement - level)).toBeLessThanOrEqual(Math.max(0.02 * level, 1e-4));
      }
    }
    expect(new Set(contours.map(({ level }) => level)).has(0.01)).toBe(true);
  });

  test('keeps what it went by when register, option and rules change, and says so', async () => {
    const { scheme, option, address, agent } = await anAssessor();
    const run = await aRun(tested, scheme, option);
    const [one] = (await registered(scheme)).filter(({ reference }) => reference === 'near');
    const at = `${address}/${run.id}/buildings/${one?.id ?? 0}`;
    const before = runBuildingSchema.parse((await agent.get(at)).body);
    expect(before).toMatchObject({ changedSince: false, facts: { storeys: null } });
    const edit = { id: one?.id ?? 0, version: 1, attributes: { storeys: 9 } };
    await change(scheme, { changed: [edit] });
    // a name and shafts are nothing that a run takes
    const shafts = [{ name: 'East shaft', east: 600, north: 5, source: 'Drawing 12' }];
    await option.update({ version: 2, name: 'Another name', shafts });
    const [named] = runsSchema.parse((await agent.get(address)).body);
    expect(named?.since).toEqual({ register: true, option: false, rules: false });
    await option.update({ version: 3, design: { ...option.design, groundLevel: 4.5 } });
    const after = runBuildingSchema.parse((await agent.get(at)).body);
    expect(after).toEqual({ ...before, changedSince: true });
    const [listed] = runsSchema.parse((await agent.get(address)).body);
    expect(listed?.since).toEqual({ register: true, option: true, rules: false });
    await aRun(tested, scheme, option);
    const [second, first] = runsSchema.parse((await agent.get(address)).body);
    expect([second?.number, second?.isShown]).toEqual([2, true]);
    expect([first?.number, first?.isShown]).toEqual([1, false]);
    expect(runBuildingSchema.parse((await agent.get(at)).body)).toEqual(after);
  });

  test('tells how far it is until it has ended', async () => {
    const { address, asked, agent } = await anAssessor();
    runQueue().hold(true);
    const { id } = runSchema.parse((await agent.post(address).send(asked)).body);
    const following = agent.get(`${address}/${id}/progress`).then((answer) => answer);
    runQueue().hold(false);
    const answer = await following;
    expect(answer.headers['content-type']).toContain('text/event-stream');
    const told = answer.text.trim().split('\n\n').map((event) => runProgressSchema.parse(JSON.parse(event.replace('data: ', '')))); // prettier-ignore
    expect(told.at(-1)).toEqual({ state: 'complete', done: 23, buildings: 23, fault: null });
  });

  test('is cancelled, keeps the earlier one standing, and goes on from where it stopped', async () => {
    const { scheme, option, address, asked, agent } = await anAssessor();
    await aRun(tested, scheme, option);
    runQueue().hold(true);
    const { id } = runSchema.parse((await agent.post(address).send(asked)).body);
    const cancelled = await agent.post(`${address}/${id}/cancel`).send({});
    expect(runSchema.parse(cancelled.body)).toMatchObject({ state: 'cancelled', done: 0 });
    runQueue().hold(false);
    await runQueue().idle();
    expect(await RunState.findByPk(id)).toMatchObject({ state: 'cancelled' });
    const part = await agent.get(`${address}/${id}/map`);
    expect(part.status).toBe(409);
    const [second, first] = runsSchema.parse((await agent.get(address)).body);
    expect([second?.isShown, first?.isShown]).toEqual([false, true]);
    expect((await agent.post(`${address}/${id}/resume`).send({})).status).toBe(200);
    await runQueue().idle();
    expect(await RunState.findByPk(id)).toMatchObject({ state: 'complete', fault: null });
    const again = runSchema.parse((await agent.post(`${address}/${id}/cancel`).send({})).body);
    expect(again).toMatchObject({ state: 'complete', done: 23 });
    const entries = await AuditEntry.findAll({ where: { schemeId: scheme.id }, order: ['id'] });
    const runs = entries.map(({ action }) => action).filter((action) => action.endsWith(' run'));
    expect(runs).toEqual(['start run', 'start run', 'cancel run', 'resume run']);
  });

  test('fails with the reason where it cannot be worked out, and another can be started', async () => {
    const { scheme, option, address, asked, agent } = await anAssessor();
    runQueue().hold(true);
    const { id } = runSchema.parse((await agent.post(address).send(asked)).body);
    await scheme.update({ crs: 4326 });
    runQueue().hold(false);
    await runQueue().idle();
    const [failed] = runsSchema.parse((await agent.get(address)).body);
    expect(failed).toMatchObject({ id, state: 'failed', done: 0, isShown: false });
    expect(failed?.fault).not.toBeNull();
    await scheme.update({ crs: 32631 });
    expect(await RunState.findByPk((await aRun(tested, scheme, option)).id)).toMatchObject({
      state: 'complete',
    });
  });

  test('is refused of an option that changed meanwhile, and over an empty register', async () => {
    const { option, address, asked, agent } = await anAssessor();
    await option.update({ version: 2 });
    expect((await agent.post(address).send(asked)).status).toBe(409);
    expect((await agent.post(address).send({})).status).toBe(422);
    const empty = await aScheme();
    const person = await aMember(empty, 'designer');
    await someSchemeRules(empty, person.id);
    const drawn = await anAlignment(empty);
    const designer = await signIn(app(), person);
    const refused = await designer
      .post(`/api/schemes/${empty.id}/runs`)
      .send({ alignmentId: drawn.id, alignmentVersion: 1 });
    expect(refused.status).toBe(422);
    expect(refused.body).toMatchObject({ error: { message: expect.stringContaining('footprints') as string } }); // prettier-ignore
    expect(await Run.count({ where: { schemeId: empty.id } })).toBe(0);
  });

  test('is read by witnesses and administrators, started by neither, and not seen by owners', async () => {
    const { scheme, option, address, asked } = await anAssessor();
    const { id } = await aRun(tested, scheme, option);
    for (const person of [await aMember(scheme, 'witness'), await anAdministrator()]) {
      const agent = await signIn(app(), person);
      expect((await agent.get(`${address}/${id}`)).status).toBe(200);
      expect((await agent.post(address).send(asked)).status).toBe(403);
      expect((await agent.post(`${address}/${id}/cancel`).send({})).status).toBe(403);
    }
    const owner = await signIn(app(), await aMember(scheme, 'owner'));
    expect((await owner.get(`${address}/${id}/map`)).status).toBe(403);
    expect((await (await visitor(app())).get(address)).status).toBe(401);
  });

  test('of another scheme answers like one that is not there', async () => {
    const { scheme, option } = await anAssessor();
    const foreign = await aRun(tested, scheme, option);
    const { address, agent } = await anAssessor();
    for (const id of [foreign.id, UNKNOWN_ID, 'x']) {
      for (const part of [
        '',
        '/map',
        '/contours',
        '/progress',
        '/buildings/1',
        '/buildings/1/case',
      ])
        expect((await agent.get(`${address}/${id}${part}`)).status).toBe(404);
      expect((await agent.post(`${address}/${id}/resume`).send({})).status).toBe(404);
    }
    const own = await aMember(scheme, 'assessor');
    const reader = await signIn(app(), own);
    const at = `/api/schemes/${scheme.id}/runs/${foreign.id}/buildings/${UNKNOWN_NUMBER}`;
    expect((await reader.get(at)).status).toBe(404);
  });
});

test('the database refuses to change what was put in or found', async () => {
  const { scheme, option } = await anAssessor();
  const { id } = await aRun(tested, scheme, option);
  const { database } = tested.services();
  for (const table of [
    'runs',
    'run_results',
    'run_buildings',
    'building_snapshots',
    'run_contours',
  ]) {
    await expect(database.query(`delete from ${table}`)).rejects.toThrow('permission denied');
  }
  await expect(Run.update({ number: 7 }, { where: { id } })).rejects.toThrow('permission denied');
});
