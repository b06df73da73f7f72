import { expect, test } from 'vitest';
import { measureSchema, measuresSchema } from '../../../shared/schemas/measures.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { aBuilding, aMember, aScheme } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app } = testApp();

async function anOffice() {
  const scheme = await aScheme();
  const [one, other] = [await aBuilding(scheme), await aBuilding(scheme)];
  const agent = await signIn(app(), await aMember(scheme, 'assessor'));
  const address = `/api/schemes/${scheme.id}/measures`;
  return { scheme, one, other, agent, address };
}

function aMeasure(buildings: readonly number[]) {
  return {
    kind: 'at the tunnel',
    title: 'Volume loss kept to a limit',
    detail: 'Checked ring by ring.',
    state: 'proposed',
    responsible: 'Tunnel engineer',
    due: '2027-03-01',
    limit: { volumeLoss: 0.008, from: 120, to: 240 },
    buildings,
  };
}

test('a measure is added, read for its building and changed, and the trail keeps both', async () => {
  const { one, other, agent, address } = await anOffice();
  const added = await agent.post(address).send(aMeasure([one.id]));
  expect(added.status).toBe(201);
  const measure = measureSchema.parse(added.body);
  expect(measure).toMatchObject({ ...aMeasure([]), buildings: [{ id: one.id }], version: 1 });
  const of = async (building: number) =>
    measuresSchema.parse((await agent.get(`${address}?building=${building}`)).body);
  expect(await of(one.id)).toEqual([measure]);
  expect(await of(other.id)).toEqual([]);
  const values = { ...aMeasure([one.id, other.id]), state: 'agreed' };
  const changed = await agent.put(`${address}/${measure.id}`).send({ version: 1, values });
  expect(measureSchema.parse(changed.body)).toMatchObject({ state: 'agreed', version: 2 });
  expect(await of(other.id)).toHaveLength(1);
  const entries = await AuditEntry.findAll({ where: { subjectId: measure.id }, order: ['id'] });
  expect(entries).toMatchObject([
    { action: 'add measure', after: { state: 'proposed' } },
    {
      action: 'change measure',
      before: { state: 'proposed', buildings: [one.id] },
      after: { state: 'agreed', buildings: [one.id, other.id] },
    },
  ]);
});

test('the second to change it is told', async () => {
  const { one, agent, address } = await anOffice();
  const { id } = measureSchema.parse((await agent.post(address).send(aMeasure([one.id]))).body);
  const change = { version: 1, values: { ...aMeasure([one.id]), title: 'Grouting' } };
  expect((await agent.put(`${address}/${id}`).send(change)).status).toBe(200);
  expect((await agent.put(`${address}/${id}`).send(change)).status).toBe(409);
});

test.each([
  ['no buildings', { buildings: [] }],
  ['no title', { title: '  ' }],
  ['a limit that is none', { limit: { volumeLoss: 0.5, from: 0, to: 10 } }],
  ['a limit that ends before it begins', { limit: { volumeLoss: 0.01, from: 10, to: 0 } }],
  ['a limit in the ground', { kind: 'in the ground' }],
  ['no day', { due: 'soon' }],
])('is refused with %s', async (_, wrong) => {
  const { one, agent, address } = await anOffice();
  const answer = await agent.post(address).send({ ...aMeasure([one.id]), ...wrong });
  expect(answer.status).toBe(422);
});

test('protects buildings of its own scheme, and is for those who may', async () => {
  const { scheme, one, agent, address } = await anOffice();
  const elsewhere = await aBuilding(await aScheme());
  const answer = await agent.post(address).send(aMeasure([one.id, elsewhere.id]));
  expect(answer.status).toBe(422);
  expect(answer.body).toMatchObject({ error: { fields: [{ path: 'buildings' }] } });
  expect((await (await visitor(app())).get(address)).status).toBe(401);
  const witness = await signIn(app(), await aMember(scheme, 'witness'));
  expect((await witness.get(address)).status).toBe(200);
  expect((await witness.post(address).send(aMeasure([one.id]))).status).toBe(403);
  const owner = await signIn(app(), await aMember(scheme, 'owner'));
  expect((await owner.get(address)).status).toBe(403);
  const stranger = await signIn(app(), await aMember(await aScheme(), 'assessor'));
  expect((await stranger.get(address)).status).toBe(404);
});
