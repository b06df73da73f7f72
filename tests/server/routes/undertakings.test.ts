import { beforeEach, expect, test } from 'vitest';
import type TestAgent from 'supertest/lib/agent.js';
import { QueryTypes } from 'sequelize';
import { undertakingSchema, undertakingsSchema } from '../../../shared/schemas/undertakings.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Building } from '../../../server/models/building.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aBuilding, aMember, aScheme } from '../../support/factories.ts';
import { aParty } from '../../support/parties.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const { app, services } = testApp();

let scheme: Scheme;
let building: Building;
let assessor: TestAgent;
let address: string;

beforeEach(async () => {
  scheme = await aScheme();
  building = await aBuilding(scheme);
  assessor = await signIn(app(), await aMember(scheme, 'assessor'));
  address = `/api/schemes/${scheme.id}/undertakings`;
});

function anUndertaking(overrides: object = {}) {
  return {
    promise: 'No work at night.',
    madeTo: 'Harbour council',
    partyId: null,
    source: 'Hearing of 3 May, page 12',
    buildingId: building.id,
    stretch: null,
    due: '2027-03-01',
    responsible: 'Site manager',
    doneOn: null,
    evidence: '',
    ...overrides,
  };
}

async function add(overrides: object = {}) {
  const answer = await assessor.post(address).send(anUndertaking(overrides));
  expect(answer.status).toBe(201);
  return undertakingSchema.parse(answer.body);
}

test('is added, read for its building and done with evidence, and the trail keeps both', async () => {
  const added = await add();
  expect(added).toMatchObject({ number: 1, isOverdue: false, version: 1 });
  const of = async (id: number) =>
    undertakingsSchema.parse((await assessor.get(`${address}?building=${id}`)).body);
  expect(await of(building.id)).toEqual([added]);
  expect(await of((await aBuilding(scheme)).id)).toEqual([]);
  const values = anUndertaking({ doneOn: '2027-02-01', evidence: 'Letter of the council' });
  const done = await assessor.put(`${address}/${added.id}`).send({ version: 1, values });
  expect(done.body).toMatchObject({ doneOn: '2027-02-01', version: 2 });
  expect((await assessor.put(`${address}/${added.id}`).send({ version: 1, values })).status).toBe(409); // prettier-ignore
  const [row] = await services().database.query(
    'select done_on::text, evidence from undertakings where id = $1',
    { type: QueryTypes.SELECT, bind: [added.id] },
  );
  expect(row).toEqual({ done_on: '2027-02-01', evidence: 'Letter of the council' });
  const entries = await AuditEntry.findAll({ where: { subjectId: added.id }, order: ['id'] });
  expect(entries).toMatchObject([
    { action: 'add undertaking', after: { madeTo: 'Harbour council' } },
    { action: 'change undertaking', before: { doneOn: null }, after: { doneOn: '2027-02-01' } },
  ]);
});

test('stands overdue first, then by day, done last', async () => {
  await add({ promise: 'Done', due: '2020-01-01', doneOn: '2020-01-01', evidence: 'Seen' });
  await add({ promise: 'No day', due: null });
  await add({ promise: 'Later', due: '2999-01-01' });
  await add({ promise: 'Overdue', due: '2020-01-01', buildingId: null, stretch: { from: 10, to: 20 } }); // prettier-ignore
  const all = undertakingsSchema.parse((await assessor.get(address)).body);
  expect(all.map(({ promise }) => promise)).toEqual(['Overdue', 'Later', 'No day', 'Done']);
  expect(all.map(({ isOverdue }) => isOverdue)).toEqual([true, false, false, false]);
  expect(all[0]?.stretch).toEqual({ from: 10, to: 20 });
});

test.each([
  ['no promise', { promise: ' ' }],
  ['nobody', { madeTo: '' }],
  ['no source', { source: '' }],
  ['neither building nor stretch', { buildingId: null }],
  ['a stretch that ends before it begins', { stretch: { from: 20, to: 10 } }],
  ['a day without evidence', { doneOn: '2027-01-01' }],
  ['nobody who sees to it', { responsible: '' }],
  ['a party that is not there', { partyId: UNKNOWN_ID }],
  ['a building that is not there', { buildingId: 2_000_000_000 }],
])('is refused with %s', async (_, wrong) => {
  const answer = await assessor.post(address).send(anUndertaking(wrong));
  expect(answer.status).toBe(422);
});

test('made to a party does not tell its name to those who may not read parties', async () => {
  const party = await aParty(assessor, scheme, { name: 'Secret Person' });
  const { id, madeTo } = await add({ partyId: party.id, madeTo: 'Secret Person' });
  expect(madeTo).toBe('Secret Person');
  const witness = await signIn(app(), await aMember(scheme, 'witness'));
  const answer = await witness.get(address);
  expect(answer.status).toBe(200);
  expect(answer.text).not.toContain('Secret');
  expect(answer.body).toMatchObject([{ madeTo: null, partyId: null }]);
  const [row] = await services().database.query('select made_to from undertakings where id = $1', {
    type: QueryTypes.SELECT,
    bind: [id],
  });
  expect(row).toEqual({ made_to: '' });
  const entry = await AuditEntry.findOne({ where: { subjectId: id }, rejectOnEmpty: true });
  expect(JSON.stringify(entry.after)).not.toContain('Secret');
});

test('is for those who may, and of its own scheme', async () => {
  const { id } = await add();
  const change = { version: 1, values: anUndertaking() };
  expect((await (await visitor(app())).get(address)).status).toBe(401);
  const witness = await signIn(app(), await aMember(scheme, 'witness'));
  expect((await witness.post(address).send(anUndertaking())).status).toBe(403);
  expect((await witness.put(`${address}/${id}`).send(change)).status).toBe(403);
  const owner = await signIn(app(), await aMember(scheme, 'owner'));
  expect((await owner.get(address)).status).toBe(403);
  const other = await aScheme();
  const agent = await signIn(app(), await aMember(other, 'assessor'));
  const moved = `/api/schemes/${other.id}/undertakings/${id}`;
  expect((await agent.put(moved).send(change)).status).toBe(404);
  const elsewhere = (await aBuilding(other)).id;
  const answer = await assessor.post(address).send(anUndertaking({ buildingId: elsewhere }));
  expect(answer.status).toBe(422);
});
