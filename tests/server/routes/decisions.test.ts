import { describe, expect, test } from 'vitest';
import {
  decisionPreviewSchema,
  decisionsDoneSchema,
  waitingDecisionsAnswerSchema,
} from '../../../shared/schemas/decisions.ts';
import { funnelSchema } from '../../../shared/schemas/decision-answers.ts';
import { waitingSchema } from '../../../shared/schemas/waiting.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { decide, decisionsOn, rowsOf, twoAssessors } from '../../support/decisions.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const tested = testApp();
const { app, services } = tested;

const AT_ONE = { filter: { any: { stage: ['1'] } }, kind: 'let go at stage 1' } as const;

describe('decisions', () => {
  test('are prepared in bulk, one a building, and checked by somebody else', async () => {
    const office = await twoAssessors(tested);
    const { address, run, firstAgent, secondAgent, first, second, scheme } = office;
    const asked = { ...AT_ONE, runId: run.id };
    const preview = decisionPreviewSchema.parse(
      (await firstAgent.post(`${address}/decisions/preview`).send(asked)).body,
    );
    expect(preview).toMatchObject({ meant: 1, allowed: 1, refused: [] });
    expect(preview.settlement).toBeLessThan(0.01);
    const answer = await firstAgent.post(`${address}/decisions`).send({ ...asked, expected: 1 });
    expect(answer.status).toBe(201);
    expect(decisionsDoneSchema.parse(answer.body)).toMatchObject({ count: 1 });
    const far = (await rowsOf(firstAgent, address)).get('far');
    expect(far).toMatchObject({ state: 'waiting for check', decision: 'let go at stage 1' });
    const place = { runId: run.id, buildingId: far?.id ?? 0 };
    const own = await decisionsOn(firstAgent, address, place);
    expect(own.decisions).toMatchObject([
      {
        preparedBy: { id: first.id },
        abilities: { check: false, withdraw: true },
        mayNotCheck: 'You prepared this, so someone else checks it.',
      },
    ]);
    const theirs = await decisionsOn(secondAgent, address, place);
    expect(theirs.decisions[0]?.basis).toEqual(own.decisions[0]?.basis);
    const checked = await secondAgent
      .post(`${address}/decisions/checks`)
      .send({ filter: {}, verdict: 'checked', expected: 1 });
    expect(checked.status).toBe(200);
    const after = await decisionsOn(secondAgent, address, place);
    expect(after.decisions).toMatchObject([{ state: 'checked', checkedBy: { id: second.id } }]);
    const funnel = funnelSchema.parse((await firstAgent.get(`${address}/funnel`)).body);
    expect(funnel.stages[0]).toMatchObject({ buildings: 1, standings: { decided: 1 } });
    expect(funnel.kinds).toEqual([{ kind: 'let go at stage 1', count: 1 }]);
    const entries = await AuditEntry.findAll({ where: { schemeId: scheme.id }, order: ['id'] });
    expect(entries.map(({ action }) => action)).toEqual(
      expect.arrayContaining(['prepare decisions', 'check decisions']),
    );
  });

  test('are never checked by who prepared them, whatever way is tried', async () => {
    const office = await twoAssessors(tested);
    const { address, firstAgent, first } = office;
    const id = await decide(office, 'far', { kind: 'let go at stage 1' });
    const one = await firstAgent
      .post(`${address}/decisions/${id}/check`)
      .send({ verdict: 'checked' });
    expect(one.status).toBe(403);
    const many = await firstAgent
      .post(`${address}/decisions/checks`)
      .send({ filter: {}, verdict: 'checked', expected: 1 });
    expect(many.status).toBe(409);
    const waiting = await firstAgent.post(`${address}/decisions/waiting`).send({ filter: {} });
    expect(waitingDecisionsAnswerSchema.parse(waiting.body)).toMatchObject({ may: 0, own: 1 });
    const by = services().database.query(
      `update decisions set state = 'checked', checked_by = $2, checked_at = now() where id = $1`,
      { bind: [id, first.id] },
    );
    await expect(by).rejects.toThrow(/nobody_checks_their_own/);
  });

  test('are returned with a comment, prepared again, and supersede what was in force', async () => {
    const office = await twoAssessors(tested);
    const { address, secondAgent } = office;
    const first = await decide(office, 'far', { kind: 'let go at stage 1' });
    const silent = await secondAgent
      .post(`${address}/decisions/${first}/check`)
      .send({ verdict: 'returned' });
    expect(silent.status).toBe(422);
    await secondAgent
      .post(`${address}/decisions/${first}/check`)
      .send({ verdict: 'returned', comment: 'Look at the piles first.' });
    expect((await rowsOf(secondAgent, address)).get('far')).toMatchObject({ state: 'returned' });
    const again = await decide(office, 'far', { kind: 'let go at stage 1' });
    await secondAgent.post(`${address}/decisions/${again}/check`).send({ verdict: 'checked' });
    const later = await decide(office, 'far', { kind: 'go to stage 3', reason: 'A tank below.' });
    expect((await rowsOf(secondAgent, address)).get('far')).toMatchObject({
      state: 'waiting for check',
    });
    await secondAgent.post(`${address}/decisions/${later}/check`).send({ verdict: 'checked' });
    const { id } = (await rowsOf(secondAgent, address)).get('far') ?? { id: 0 };
    const { decisions } = await decisionsOn(secondAgent, address, {
      runId: office.run.id,
      buildingId: id,
    });
    expect(decisions.map(({ id: one, state }) => [one, state])).toEqual([
      [later, 'checked'],
      [again, 'superseded'],
      [first, 'returned'],
    ]);
    expect(decisions[2]).toMatchObject({ comment: 'Look at the piles first.' });
  });

  test('never change once they are prepared, and are never taken out', async () => {
    const office = await twoAssessors(tested);
    const id = await decide(office, 'far', { kind: 'let go at stage 1' });
    const { database } = services();
    const bind = [id];
    for (const change of [`reason = 'x'`, `kind = 'no measures'`, `basis = '{}'`]) {
      const query = database.query(`update decisions set ${change} where id = $1`, { bind });
      await expect(query).rejects.toThrow(/never changes/);
    }
    await office.secondAgent
      .post(`${office.address}/decisions/${id}/check`)
      .send({ verdict: 'checked' });
    const undo = database.query(
      `update decisions set state = 'waiting for check', checked_by = null, checked_at = null
       where id = $1`,
      { bind },
    );
    await expect(undo).rejects.toThrow(/stays so/);
    await expect(database.query('delete from decisions where id = $1', { bind })).rejects.toThrow();
  });

  test('are had only where figures and rules allow them, and say why not', async () => {
    const office = await twoAssessors(tested);
    const { address, run, firstAgent } = office;
    const preview = await firstAgent
      .post(`${address}/decisions/preview`)
      .send({ ...AT_ONE, filter: {}, runId: run.id });
    const found = decisionPreviewSchema.parse(preview.body);
    expect(found).toMatchObject({ meant: 23, allowed: 1 });
    expect(found.refused.reduce((sum, { count }) => sum + count, 0)).toBe(22);
    const piled = (await rowsOf(firstAgent, address)).get('piled');
    const one = await firstAgent.post(`${address}/decisions`).send({
      ...{ runId: run.id, kind: 'let go at stage 2', expected: 1 },
      filter: { ids: [piled?.id] },
    });
    expect(one.status).toBe(422);
    expect(one.body).toMatchObject({ error: { message: 'Held because: piled.' } });
    const silent = await firstAgent.post(`${address}/decisions`).send({
      ...{ runId: run.id, kind: 'adopt a category', category: 1, expected: 1 },
      filter: { ids: [piled?.id] },
    });
    expect(silent.status).toBe(422);
    const nothing = await firstAgent.post(`${address}/decisions`).send({ kind: 'let go' });
    expect(nothing.status).toBe(422);
  });

  test('wait once: a second one, another number, an older run or version are told', async () => {
    const office = await twoAssessors(tested);
    const { address, run, firstAgent, secondAgent } = office;
    await decide(office, 'far', { kind: 'let go at stage 1' });
    const far = (await rowsOf(firstAgent, address)).get('far');
    const asked = { ...AT_ONE, runId: run.id, filter: { ids: [far?.id] }, expected: 1 };
    expect((await secondAgent.post(`${address}/decisions`).send(asked)).status).toBe(422);
    await firstAgent.post(`${address}/decisions/withdrawals`).send({ filter: {}, expected: 1 });
    const older = { ...asked, version: 2 };
    expect((await secondAgent.post(`${address}/decisions`).send(older)).status).toBe(409);
    const more = { ...asked, filter: {}, expected: 2 };
    expect((await secondAgent.post(`${address}/decisions`).send(more)).status).toBe(409);
    const other = { ...asked, runId: UNKNOWN_ID };
    expect((await secondAgent.post(`${address}/decisions`).send(other)).status).toBe(409);
    expect((await secondAgent.post(`${address}/decisions`).send(asked)).status).toBe(201);
  });

  test('are withdrawn by who prepared them, while they wait', async () => {
    const office = await twoAssessors(tested);
    const { address, firstAgent, secondAgent } = office;
    const id = await decide(office, 'far', { kind: 'let go at stage 1' });
    const asked = { filter: {}, expected: 1 };
    const path = `${address}/decisions/withdrawals`;
    expect((await secondAgent.post(path).send(asked)).status).toBe(409);
    expect((await firstAgent.post(path).send(asked)).body).toMatchObject({ count: 1 });
    expect((await rowsOf(firstAgent, address)).get('far')).toMatchObject({ state: 'to decide' });
    expect((await firstAgent.post(path).send(asked)).status).toBe(409);
    const check = await secondAgent
      .post(`${address}/decisions/${id}/check`)
      .send({ verdict: 'checked' });
    expect(check.status).toBe(409);
  });

  test('are for assessors of the scheme alone', async () => {
    const office = await twoAssessors(tested);
    const { address, run, scheme } = office;
    const asked = { ...AT_ONE, runId: run.id, expected: 1 };
    const stranger = await visitor(app());
    expect((await stranger.post(`${address}/decisions`).send(asked)).status).toBe(401);
    for (const role of ['designer', 'witness', 'owner'] as const) {
      const agent = await signIn(app(), await aMember(scheme, role));
      expect((await agent.post(`${address}/decisions`).send(asked)).status).toBe(403);
    }
    const elsewhere = await signIn(app(), await aMember(await aScheme(), 'assessor'));
    expect((await elsewhere.post(`${address}/decisions`).send(asked)).status).toBe(404);
    const id = await decide(office, 'far', { kind: 'let go at stage 1' });
    const other = await aScheme();
    const agent = await signIn(app(), await aMember(other, 'assessor'));
    const path = `/api/schemes/${other.id}/decisions/${id}/check`;
    expect((await agent.post(path).send({ verdict: 'checked' })).status).toBe(404);
  });
});

test('what waits for whom is told where the schemes are listed', async () => {
  const office = await twoAssessors(tested);
  const { address, firstAgent, secondAgent } = office;
  const kinds = async (agent: typeof firstAgent) =>
    waitingSchema
      .parse((await agent.get('/api/waiting')).body)
      .schemes.flatMap(({ waiting }) => waiting)
      .flatMap(({ kind, count }) => (kind.startsWith('decisions') ? [`${kind} ${count}`] : []));
  const id = await decide(office, 'far', { kind: 'let go at stage 1' });
  expect(await kinds(firstAgent)).toEqual([]);
  expect(await kinds(secondAgent)).toEqual(['decisions-to-check 1']);
  await secondAgent
    .post(`${address}/decisions/${id}/check`)
    .send({ verdict: 'returned', comment: 'Not yet.' });
  expect(await kinds(firstAgent)).toEqual(['decisions-returned 1']);
  expect(await kinds(secondAgent)).toEqual([]);
});

describe('assignments', () => {
  test('give buildings to an assessor, who finds them as hers', async () => {
    const office = await twoAssessors(tested);
    const { address, firstAgent, secondAgent, second } = office;
    const given = { filter: { any: { stage: ['1'] } }, expected: 1, personId: second.id };
    expect((await firstAgent.post(`${address}/assignments`).send(given)).status).toBe(200);
    expect((await rowsOf(firstAgent, address)).get('far')).toMatchObject({
      assignedTo: second.name,
    });
    expect((await secondAgent.get(`${address}/funnel`)).body).toMatchObject({ mine: 1 });
    const assessors = await firstAgent.get(`${address}/assessors`);
    expect(assessors.body).toHaveLength(2);
    const back = { ...given, personId: null };
    await firstAgent.post(`${address}/assignments`).send(back);
    expect((await secondAgent.get(`${address}/funnel`)).body).toMatchObject({ mine: 0 });
    const nobody = { ...given, personId: UNKNOWN_ID };
    expect((await firstAgent.post(`${address}/assignments`).send(nobody)).status).toBe(422);
  });
});
