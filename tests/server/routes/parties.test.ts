import { randomUUID } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import { describe, expect, test } from 'vitest';
import { z } from 'zod';
import { partySchema } from '../../../shared/schemas/parties.ts';
import {
  likelySameSchema,
  partiesSchema,
  partyDetailSchema,
} from '../../../shared/schemas/party-answers.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Membership } from '../../../server/models/membership.ts';
import { aBuilding, aMember, anAdministrator, aPerson, aScheme } from '../../support/factories.ts';
import { aParty, partyValues } from '../../support/parties.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const { app, services } = testApp();

const refusal = z.object({ error: z.object({ fields: z.array(z.object({ path: z.string() })) }) });

async function anOffice() {
  const scheme = await aScheme();
  const building = await aBuilding(scheme, { address: '12 Fishgate' });
  const agent = await signIn(app(), await aMember(scheme, 'assessor'));
  const address = `/api/schemes/${scheme.id}/parties`;
  return { scheme, building, agent, address };
}

function rowsOf(sql: string, ...bind: unknown[]): Promise<Record<string, unknown>[]> {
  return services().database.query(sql, { type: QueryTypes.SELECT, bind });
}

function interest(buildingId: number, overrides = {}) {
  return { buildingId, kind: 'leaseholder', from: null, to: null, ...overrides } as const;
}

test('a party is added, read, changed, and the history keeps both', async () => {
  const { scheme, building, agent, address } = await anOffice();
  const other = await aBuilding(scheme);
  const interests = [interest(building.id, { from: '2019-04-01' })];
  const party = await aParty(agent, scheme, { interests });
  expect(party).toMatchObject({
    name: 'Leaseholder of 12 Fishgate',
    address: ['12 Fishgate', 'Port Dogger'],
    interests: [{ building: { id: building.id, address: '12 Fishgate' }, from: '2019-04-01' }],
    ...{ person: null, representedBy: null, mergedInto: null, erasedAt: null, version: 1 },
  });
  const [row] = await rowsOf('select scheme_id, address from parties where id = $1', party.id);
  expect(row).toEqual({ scheme_id: scheme.id, address: '12 Fishgate\nPort Dogger' });
  const values = partyValues({ channel: 'post', interests: [...interests, interest(other.id)] });
  const changed = await agent.put(`${address}/${party.id}`).send({ version: 1, values });
  expect(partySchema.parse(changed.body)).toMatchObject({ channel: 'post', version: 2 });
  const kept = await rowsOf('select id from interests where party_id = $1', party.id);
  expect(kept.map(({ id }) => id)).toContain(party.interests[0]?.id);
  const detail = partyDetailSchema.parse((await agent.get(`${address}/${party.id}`)).body);
  expect(detail.history).toMatchObject([
    { action: 'changed', before: { channel: 'e-mail' }, after: { channel: 'post' } },
    { action: 'added', before: null },
  ]);
  const entries = await AuditEntry.findAll({ where: { subjectId: party.id }, order: ['id'] });
  expect(entries).toMatchObject([
    { action: 'add party' },
    { action: 'change party', after: { changed: ['channel', 'interests'] } },
  ]);
});

test('the trail holds nothing personal, for it stays when that is erased', async () => {
  const { scheme, agent, address } = await anOffice();
  const party = await aParty(agent, scheme);
  const values = partyValues({ name: 'Somebody Else' });
  await agent.put(`${address}/${party.id}`).send({ version: 1, values });
  const entries = await AuditEntry.findAll({ where: { subjectId: party.id } });
  expect(JSON.stringify(entries)).not.toMatch(/Leaseholder of|Somebody Else|leaseholder@/);
});

test('the second to change it is told', async () => {
  const { scheme, agent, address } = await anOffice();
  const { id } = await aParty(agent, scheme);
  const change = { version: 1, values: partyValues({ name: 'Another' }) };
  const both = await Promise.all([
    agent.put(`${address}/${id}`).send(change),
    agent.put(`${address}/${id}`).send(change),
  ]);
  expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
});

const HOSTILE = [
  'שָׁלוֹם מחזיק הקרקע',
  'مالك العقار',
  '🏚️🧱👷🏽‍♀️',
  '=HYPERLINK("https://example.org","x")',
  'Robert"); drop table parties;--',
  '<img src=x onerror=alert(1)>',
  '本'.repeat(300),
  '🧱'.repeat(300),
];

test.each(HOSTILE)('carries the name %s', async (name) => {
  const { scheme, agent, address } = await anOffice();
  const party = await aParty(agent, scheme, { name });
  expect(party.name).toBe(name);
  const { parties } = partiesSchema.parse((await agent.get(address)).body);
  expect(parties.map((one) => one.name)).toEqual([name]);
});

test.each([
  ['a name that turns letters round', { name: 'Owner \u202Eetaluco' }, 'name'],
  ['a name with isolates', { name: 'Owner \u2066x\u2069' }, 'name'],
  ['a name of two lines', { name: 'Owner\r\nBcc: all@example.org' }, 'name'],
  ['a name with a zero', { name: 'Owner\0' }, 'name'],
  ['a name too long', { name: 'n'.repeat(301) }, 'name'],
  ['no name', { name: '  ' }, 'name'],
  ['no address', { address: ['', ' '] }, 'address'],
  ['nine lines of address', { address: Array<string>(9).fill('x') }, 'address'],
  ['no e-mail address', { email: 'somebody' }, 'email'],
  ['letters by e-mail to nowhere', { email: null }, 'email'],
  ['an unknown kind of interest', { interests: [{ buildingId: 1, kind: 'squatter' }] }, 'interests.0.kind'],
  ['an interest that ends first', { interests: [interest(1, { from: '2020-01-02', to: '2020-01-01' })] }, 'interests.0.to'],
  ['a building that is not there', { interests: [interest(2_000_000_000)] }, 'interests'],
  ['a representative who is not there', { representedBy: UNKNOWN_ID }, 'representedBy'],
])('is refused with %s', async (_, wrong, path) => {
  const { agent, address } = await anOffice();
  const answer = await agent.post(address).send({ ...partyValues(), ...wrong });
  expect(answer.status).toBe(422);
  const { fields } = refusal.parse(answer.body).error;
  expect(fields.map((field) => field.path)).toContain(path);
}); // prettier-ignore

test('nobody represents themselves, nor is represented twice over', async () => {
  const { scheme, agent, address } = await anOffice();
  const agency = await aParty(agent, scheme, { name: 'Agency' });
  const client = await aParty(agent, scheme, { name: 'Client', representedBy: agency.id });
  expect(client.representedBy).toEqual({ id: agency.id, name: 'Agency' });
  const put = (id: string, representedBy: string) =>
    agent.put(`${address}/${id}`).send({ version: 1, values: partyValues({ representedBy }) });
  expect((await put(client.id, client.id)).status).toBe(422);
  expect((await put(agency.id, client.id)).status).toBe(422);
  const third = await agent.post(address).send(partyValues({ representedBy: client.id }));
  expect(third.status).toBe(422);
});

describe('the list', () => {
  test('is searched by name, address, e-mail and building, and read in pages', async () => {
    const { scheme, building, agent, address } = await anOffice();
    await aParty(agent, scheme, { name: 'Zoë Trust', email: null, channel: 'post' });
    await aParty(agent, scheme, { name: 'Harbour Terraces', interests: [interest(building.id)] });
    const names = async (query: string) =>
      partiesSchema
        .parse((await agent.get(`${address}?${query}`)).body)
        .parties.map(({ name }) => name);
    expect(await names('')).toEqual(['Harbour Terraces', 'Zoë Trust']);
    expect(await names('search=zoe')).toEqual(['Zoë Trust']);
    expect(await names('search=leaseholder')).toEqual(['Harbour Terraces']);
    expect(await names(`search=harb ${building.reference}`)).toEqual(['Harbour Terraces']);
    expect(await names('search=trust nowhere')).toEqual([]);
    expect(await names(`building=${building.id}`)).toEqual(['Harbour Terraces']);
    const page = partiesSchema.parse((await agent.get(`${address}?offset=1&limit=1`)).body);
    expect(page).toMatchObject({ found: 2, parties: [{ name: 'Zoë Trust', interestCount: 0 }] });
    expect((await agent.get(`${address}?limit=100000`)).status).toBe(422);
  });

  test('is taken along as a table in which no formula runs', async () => {
    const { scheme, building, agent, address } = await anOffice();
    const name = '=cmd|calc';
    await aParty(agent, scheme, { name, interests: [interest(building.id)] });
    const csv = await agent.get(`${address}/export?format=csv`);
    expect(csv.text).toContain(`${building.reference},12 Fishgate,leaseholder,'=cmd|calc,person,`);
    expect(csv.text).not.toMatch(/(^|,|")=cmd/m);
    const xlsx = await agent.get(`${address}/export?format=xlsx`);
    expect([xlsx.status, xlsx.headers['content-type']]).toEqual([
      200,
      expect.stringMatching(/sheet/),
    ]);
    const form = await agent.get(`${address}/form?format=csv`);
    expect(form.text.split('\r\n').slice(0, 2)).toEqual([
      expect.stringMatching(/Building reference,Building address,Interest,Name/),
      `${building.reference},12 Fishgate,,,,,,,,,`,
    ]);
  });
});

describe('merging', () => {
  test('keeps one with what both held; the other points to it', async () => {
    const { scheme, building, agent, address } = await anOffice();
    const second = await aBuilding(scheme);
    const held = [interest(building.id)];
    const stays = await aParty(agent, scheme, { interests: held });
    const goes = await aParty(agent, scheme, { interests: [...held, interest(second.id)] });
    const client = await aParty(agent, scheme, { name: 'Client', representedBy: goes.id });
    const likely = likelySameSchema.parse((await agent.get(`${address}/likely-same`)).body);
    const ids = likely.map(({ parties }) => parties.map(({ id }) => id));
    expect(ids.flat()).toEqual(expect.arrayContaining([stays.id, goes.id]));
    const body = { version: 1, other: { id: goes.id, version: 1 } };
    const merged = await agent.post(`${address}/${stays.id}/merge`).send(body);
    expect(merged.status).toBe(200);
    const buildings = partySchema.parse(merged.body).interests.map((one) => one.building.id);
    expect(buildings.sort()).toEqual([building.id, second.id].sort());
    const rows = await rowsOf(
      'select id, merged_into, represented_by from parties where id = any($1)',
      [goes.id, client.id],
    );
    expect(rows).toContainEqual({ id: goes.id, merged_into: stays.id, represented_by: null });
    expect(rows).toContainEqual({ id: client.id, merged_into: null, represented_by: stays.id });
    expect(await rowsOf('select 1 from interests where party_id = $1', goes.id)).toEqual([]);
    expect((await agent.post(`${address}/${stays.id}/merge`).send(body)).status).toBe(409);
    const late = { version: 2, values: partyValues() };
    expect((await agent.put(`${address}/${goes.id}`).send(late)).status).toBe(409);
    expect(partiesSchema.parse((await agent.get(address)).body).found).toBe(2);
  });

  test('is refused with itself, and with a party of another scheme', async () => {
    const { scheme, agent, address } = await anOffice();
    const party = await aParty(agent, scheme);
    const there = await anOffice();
    const foreign = await aParty(there.agent, there.scheme);
    const merge = (id: string) =>
      agent.post(`${address}/${party.id}/merge`).send({ version: 1, other: { id, version: 1 } });
    expect((await merge(party.id)).status).toBe(422);
    expect((await merge(foreign.id)).status).toBe(404);
  });

  test('hands over who signs in', async () => {
    const { scheme, agent, address } = await anOffice();
    const [stays, goes] = [await aParty(agent, scheme), await aParty(agent, scheme)];
    const owner = await aMember(scheme, 'owner');
    await services().database.query('update parties set person_id = $2 where id = $1', {
      bind: [goes.id, owner.id],
    });
    const body = { version: 1, other: { id: goes.id, version: 1 } };
    const merged = await agent.post(`${address}/${stays.id}/merge`).send(body);
    expect(partySchema.parse(merged.body).person).toMatchObject({ email: owner.email });
    expect(await Membership.count({ where: { personId: owner.id } })).toBe(1);
  });
});

describe('personal data', () => {
  test('are handed over whole', async () => {
    const { scheme, building, agent, address } = await anOffice();
    const party = await aParty(agent, scheme, { interests: [interest(building.id)] });
    const author = await aPerson();
    await services().database.query(
      `insert into matters (id, scheme_id, number, kind, party_id, building_id, title, due, opened_by)
       values ($1, $2, 1, 'question', $3, $4, 'When does it begin?', '2027-01-01', $5)`,
      { bind: [randomUUID(), scheme.id, party.id, building.id, author.id] },
    );
    const answer = await agent.get(`${address}/${party.id}/personal-data`);
    expect(answer.headers['content-disposition']).toContain('personal-data.json');
    expect(JSON.parse(answer.text)).toMatchObject({
      party: { name: party.name, interests: [{ kind: 'leaseholder' }] },
      history: [{ action: 'added' }],
      matters: [{ title: 'When does it begin?', building: building.reference }],
      letters: [],
    });
  });

  test('are erased by the administrator: record, history, interests, sign-in, merged ones', async () => {
    const { scheme, building, agent, address } = await anOffice();
    const owner = await aMember(scheme, 'owner');
    const party = await aParty(agent, scheme, { interests: [interest(building.id)] });
    const twin = await aParty(agent, scheme);
    const merge = { version: 1, other: { id: twin.id, version: 1 } };
    await agent.post(`${address}/${party.id}/merge`).send(merge);
    await services().database.query('update parties set person_id = $2 where id = $1', {
      bind: [party.id, owner.id],
    });
    const ownerAgent = await signIn(app(), owner);
    const administrator = await signIn(app(), await anAdministrator());
    const asked = { ground: 'Asked by the person', askedOn: '2026-11-20' };
    const erase = (version: number) =>
      administrator.post(`${address}/${party.id}/erase`).send({ version, ...asked });
    expect((await erase(1)).status).toBe(409);
    const answer = await erase(2);
    expect(partySchema.parse(answer.body)).toMatchObject({
      ...{ name: '', address: [], email: null, person: null, interests: [] },
    });
    expect(partySchema.parse(answer.body).erasedAt).not.toBeNull();
    const kept = await rowsOf(
      `select to_jsonb(p) as party, (select jsonb_agg(c) from party_changes c where c.party_id = p.id) as history
       from parties p where id = any($1)`,
      [party.id, twin.id],
    );
    expect(kept).toHaveLength(2);
    expect(JSON.stringify(kept)).not.toMatch(/Fishgate|leaseholder/i);
    const erasures = await rowsOf('select ground, asked_on::text from party_erasures where party_id = $1', party.id);
    expect(erasures).toEqual([{ ground: asked.ground, asked_on: asked.askedOn }]);
    expect(await Membership.count({ where: { personId: owner.id } })).toBe(0);
    expect((await ownerAgent.get('/api/session')).body).toMatchObject({ person: null });
    const late = await agent.put(`${address}/${party.id}`).send({ version: 3, values: partyValues() });
    expect(late.status).toBe(409);
  }); // prettier-ignore

  test('leave an owner who signs in for another party of the scheme', async () => {
    const { scheme, agent, address } = await anOffice();
    const owner = await aMember(scheme, 'owner');
    const both = [await aParty(agent, scheme), await aParty(agent, scheme, { name: 'Other' })];
    await services().database.query('update parties set person_id = $2 where id = any($1)', {
      bind: [both.map(({ id }) => id), owner.id],
    });
    const administrator = await signIn(app(), await anAdministrator());
    const asked = { version: 1, ground: 'Asked', askedOn: '2026-11-20' };
    await administrator.post(`${address}/${both[0]?.id ?? ''}/erase`).send(asked);
    expect(await Membership.count({ where: { personId: owner.id } })).toBe(1);
  });
});

test('are for those who may', async () => {
  const { scheme, agent, address } = await anOffice();
  const party = await aParty(agent, scheme);
  const asked = { version: 1, ground: 'Asked', askedOn: '2026-11-20' };
  expect((await (await visitor(app())).get(address)).status).toBe(401);
  const stranger = await signIn(app(), await aMember(await aScheme(), 'assessor'));
  expect((await stranger.get(`${address}/${party.id}`)).status).toBe(404);
  for (const role of ['witness', 'designer', 'owner'] as const) {
    const other = await signIn(app(), await aMember(scheme, role));
    expect((await other.get(address)).status).toBe(403);
    expect((await other.post(address).send(partyValues())).status).toBe(403);
  }
  expect((await agent.post(`${address}/${party.id}/erase`).send(asked)).status).toBe(403);
  const there = await anOffice();
  expect((await there.agent.get(`${there.address}/${party.id}`)).status).toBe(404);
  const administrator = await signIn(app(), await anAdministrator());
  expect((await administrator.get(address)).status).toBe(200);
  expect((await administrator.post(address).send(partyValues())).status).toBe(403);
  expect((await administrator.post(`${there.address}/${party.id}/erase`).send(asked)).status).toBe(404);
}); // prettier-ignore
