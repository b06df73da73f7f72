import { readdirSync } from 'node:fs';
import { QueryTypes } from 'sequelize';
import { expect, test } from 'vitest';
import type TestAgent from 'supertest/lib/agent.js';
import {
  partyImportRowsSchema,
  partyImportSchema,
  type PartyImport,
} from '../../../shared/schemas/party-imports.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Building } from '../../../server/models/building.ts';
import { aBuilding, aMember, aScheme } from '../../support/factories.ts';
import { aParty } from '../../support/parties.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app, services } = testApp();

async function anOffice() {
  const scheme = await aScheme();
  const first = await aBuilding(scheme, { reference: 'B1', address: '12 Fishgate' });
  const second = await aBuilding(scheme, { reference: 'B2', address: '14 Fishgate' });
  await aBuilding(scheme, { reference: 'B3', address: 'Rear of 14 Fishgate' });
  await aBuilding(scheme, { reference: 'B4', address: 'Rear of 14 Fishgate' });
  const agent = await signIn(app(), await aMember(scheme, 'assessor'));
  const address = `/api/schemes/${scheme.id}/party-imports`;
  return { scheme, first, second, agent, address };
}

const HEADING =
  'Building reference,Building address,Interest,Name,Kind of party,Postal address,E-mail,Letters by,Represented by,From,To';

function csv(...lines: readonly string[]): Buffer {
  return Buffer.from([HEADING, ...lines].join('\n'));
}

const TRUST = 'Harbour Terraces Trust,organisation,"Quay House, Port Dogger",trust@example.org';
const ROWS = [
  `B1,,freeholder,${TRUST},,,2001-05-01,`,
  `,14 fishgate,Freehold,${TRUST},,,,`,
  'B1,,tenant,Tenant of 12 Fishgate,,"12 Fishgate, Port Dogger",,,Harbour Terraces Trust,1.4.2019,',
];

async function send(agent: TestAgent, address: string, file: Buffer): Promise<PartyImport> {
  const answer = await agent.post(address).attach('file', file, 'parties.csv');
  if (answer.status !== 201) throw new Error(`${answer.status}: ${answer.text}`);
  return partyImportSchema.parse(answer.body);
}

async function report(agent: TestAgent, address: string, { id }: PartyImport, only = '') {
  const query = only === '' ? '' : `?only=${encodeURIComponent(only)}`;
  return partyImportRowsSchema.parse((await agent.get(`${address}/${id}/rows${query}`)).body);
}

function takeOver(agent: TestAgent, address: string, { id, counts }: PartyImport) {
  return agent.post(`${address}/${id}/take-over`).send({ counts });
}

function partiesOf(schemeId: string) {
  return services().database.query<Record<string, unknown>>(
    `select p.name, p.kind, p.address, p.email, p.channel, r.name as agent, (
       select json_agg(json_build_array(b.reference, i.kind, i.from_day) order by b.reference)
       from interests i join buildings b on b.id = i.building_id where i.party_id = p.id) as holds
     from parties p left join parties r on r.id = p.represented_by
     where p.scheme_id = $1 order by p.name`,
    { type: QueryTypes.SELECT, bind: [schemeId] },
  );
}

test('a file is checked, then taken over: rows of one party are one, agents and days come along', async () => {
  const { scheme, agent, address } = await anOffice();
  const found = await send(agent, address, csv(...ROWS));
  expect(found).toMatchObject({
    state: 'checked',
    columns: { reference: 'Building reference', name: 'Name', address: 'Postal address' },
    counts: { rows: 3, 'new party': 2, 'new interest': 1, problem: 0, partiesAdded: 2, noted: 0 },
  });
  expect(await partiesOf(scheme.id)).toEqual([]);
  const taken = partyImportSchema.parse((await takeOver(agent, address, found)).body);
  expect(taken).toMatchObject({ state: 'taken over', fileColumns: [] });
  expect(await partiesOf(scheme.id)).toEqual([
    {
      ...{ name: 'Harbour Terraces Trust', kind: 'organisation', email: 'trust@example.org' },
      ...{ address: 'Quay House\nPort Dogger', channel: 'e-mail', agent: null },
      holds: [['B1', 'freeholder', '2001-05-01'], ['B2', 'freeholder', null]], // prettier-ignore
    },
    {
      ...{ name: 'Tenant of 12 Fishgate', kind: 'person', email: null, channel: 'post' },
      ...{ address: '12 Fishgate\nPort Dogger', agent: 'Harbour Terraces Trust' },
      holds: [['B1', 'tenant', '2019-04-01']],
    },
  ]);
  expect((await takeOver(agent, address, found)).status).toBe(409);
  const entries = await AuditEntry.findAll({ where: { subjectId: found.id }, order: ['id'] });
  const actions = entries.map(({ action }) => action);
  expect(actions).toEqual(['check party import', 'take over party import']);
  expect(readdirSync(services().env.UPLOADS_FOLDER)).toEqual([]);
});

test('rows with problems say what is wrong and are left out', async () => {
  const { scheme, agent, address } = await anOffice();
  const found = await send(
    agent,
    address,
    csv(
      ...ROWS,
      'B99,,tenant,Tenant A,,Somewhere,,,,,',
      ',Rear of 14 Fishgate,tenant,Tenant B,,Somewhere,,,,,',
      'B1,,tenant,Tenant C,,Somewhere,,e-mail,,,',
      'B1,,squatter,Tenant D,,Somewhere,,,,,',
      'B1,,tenant,,,Somewhere,not mail,,,31.2.2020,',
      'B2,14 Fishgate,,,,,,,,,',
      ',,tenant,Tenant F,,Somewhere,,,Nobody,,',
      'B1,,tenant,Tenant G,,Somewhere,,,Nobody,,',
    ),
  );
  const { rows } = await report(agent, address, found, 'problem');
  const said = rows.map(({ row, remarks }) => `${row} ${remarks.join(' ')}`);
  expect(said).toEqual([
    expect.stringMatching(/^5 No building has the reference B99\./),
    expect.stringMatching(/^6 2 buildings have the address Rear of 14 Fishgate\./),
    expect.stringMatching(/^7 Letters by e-mail need an e-mail address\./),
    expect.stringMatching(/^8 squatter is no interest that is known\./),
    expect.stringMatching(/^9 From: 31\.2\.2020 is no day.*E-mail: .*Name: Write the name\./),
    expect.stringMatching(/^11 It names no building\./),
  ]);
  const noted = await report(agent, address, found, 'noted');
  expect(noted.rows.at(-1)).toMatchObject({ row: 12, outcome: 'new party', remarks: [expect.stringMatching(/^Who represents/)] }); // prettier-ignore
  expect((await takeOver(agent, address, found)).status).toBe(200);
  expect((await partiesOf(scheme.id)).map(({ name }) => name)).toEqual([
    'Harbour Terraces Trust',
    'Tenant G',
    'Tenant of 12 Fishgate',
  ]);
  const after = await report(agent, address, found);
  expect(after.rows.map(({ name }) => name).join('')).toBe('');
  expect(after.found).toBe(10);
});

test('what is there stays: it gets what it lacks, and what differs is said', async () => {
  const { scheme, first, agent, address } = await anOffice();
  const party = await aParty(agent, scheme, {
    ...{ name: 'Harbour Terraces Trust', address: ['Quay House', 'Port Dogger'] },
    ...{ kind: 'organisation', email: null, channel: 'post' },
    interests: [{ buildingId: first.id, kind: 'freeholder', from: '2001-05-01', to: null }],
  });
  const before = await send(agent, address, csv(...ROWS));
  expect(before.counts).toMatchObject({ 'there already': 1, 'new interest': 1, 'new party': 1 });
  await takeOver(agent, address, before);
  const kept = (await partiesOf(scheme.id)).find(({ name }) => name === party.name);
  expect(kept).toMatchObject({ email: 'trust@example.org', channel: 'post' });
  expect(kept?.holds).toHaveLength(2);
  const again = await send(agent, address, csv(...ROWS));
  expect(again.counts).toMatchObject({ 'there already': 3, partiesAdded: 0, partiesCompleted: 0 });
  const other = ROWS.map((row) => row.replace('trust@example.org', 'other@example.org'));
  const differing = await send(agent, address, csv(...other));
  expect(differing.counts).toMatchObject({ 'there already': 3, noted: 2 });
  const moved = ROWS.map((row) => row.replace('Quay House', 'Mill House'));
  expect((await send(agent, address, csv(...moved))).counts).toMatchObject({ noted: 2 });
});

test('a party that was merged away does not come back by its old name', async () => {
  const { scheme, agent, address } = await anOffice();
  const stays = await aParty(agent, scheme, { name: 'Trust, merged' });
  const found = await send(agent, address, csv(...ROWS));
  await takeOver(agent, address, found);
  const [row] = await services().database.query<{ id: string; version: number }>(
    `select id, version from parties where scheme_id = $1 and name = 'Harbour Terraces Trust'`,
    { type: QueryTypes.SELECT, bind: [scheme.id] },
  );
  const body = { version: 1, other: row };
  const merge = `/api/schemes/${scheme.id}/parties/${stays.id}/merge`;
  expect((await agent.post(merge).send(body)).status).toBe(200);
  const again = await send(agent, address, csv(...ROWS));
  expect(again.counts).toMatchObject({ partiesAdded: 0, 'there already': 3 });
});

test('what would come out differently by now is refused, and nothing is written', async () => {
  const { scheme, first, agent, address } = await anOffice();
  const found = await send(agent, address, csv(...ROWS));
  await Building.update({ removedAt: new Date() }, { where: { id: first.id } });
  const refused = await takeOver(agent, address, found);
  expect([refused.status, refused.text]).toEqual([409, expect.stringContaining('Check it again')]);
  expect(await partiesOf(scheme.id)).toEqual([]);
  const columns = { columns: found.columns };
  const checked = await agent.put(`${address}/${found.id}/columns`).send(columns);
  const anew = partyImportSchema.parse(checked.body);
  expect(anew.counts).toMatchObject({ problem: 2, 'new party': 1 });
  expect((await takeOver(agent, address, anew)).status).toBe(200);
});

test('columns can be chosen; one that is not in the file or chosen twice is refused', async () => {
  const { agent, address } = await anOffice();
  const file = Buffer.from('Haus;Art;Wer;Strasse;Ort\nB1;owner;Eva 🧱;Kai 1;Port Dogger\n');
  const found = await send(agent, address, file);
  expect(found.counts).toMatchObject({ rows: 0 });
  const put = (columns: object) => agent.put(`${address}/${found.id}/columns`).send({ columns });
  const columns = { reference: 'Haus', interest: 'Art', name: 'Wer', street: 'Strasse', place: 'Ort' }; // prettier-ignore
  expect(partyImportSchema.parse((await put(columns)).body).counts).toMatchObject({ 'new party': 1 });
  expect((await put({ ...columns, email: 'Mail' })).status).toBe(422);
  expect((await put({ ...columns, email: 'Ort' })).status).toBe(422);
}); // prettier-ignore

test('an import that is given up forgets its file', async () => {
  const { scheme, agent, address } = await anOffice();
  const found = await send(agent, address, csv(...ROWS));
  const given = await agent.delete(`${address}/${found.id}`);
  expect(partyImportSchema.parse(given.body).state).toBe('given up');
  const [row] = await services().database.query<{ rows: unknown }>(
    'select rows from party_imports where id = $1',
    { type: QueryTypes.SELECT, bind: [found.id] },
  );
  expect(row?.rows).toBeNull();
  expect((await takeOver(agent, address, found)).status).toBe(409);
  expect(await partiesOf(scheme.id)).toEqual([]);
  expect((await report(agent, address, found)).found).toBe(0);
});

test('what the report and the list hold runs in no spreadsheet, and comes in again as it was', async () => {
  const { scheme, agent, address } = await anOffice();
  const name = '=HYPERLINK(1)';
  const found = await send(agent, address, csv(`B1,,owner,${name},,Somewhere,,,,,`));
  const told = await agent.get(`${address}/${found.id}/report.csv`);
  expect(told.text).toContain(`2,B1,'${name},new party,`);
  await takeOver(agent, address, found);
  const list = await agent.get(`/api/schemes/${scheme.id}/parties/export?format=csv`);
  expect(list.text).toContain(`'${name}`);
  const again = await send(agent, address, Buffer.from(list.text));
  expect(again.counts).toMatchObject({ rows: 1, 'there already': 1, noted: 0 });
  const xlsx = await agent
    .get(`/api/schemes/${scheme.id}/parties/export?format=xlsx`)
    .buffer()
    .parse((res, done) => {
      const parts: Buffer[] = [];
      res.on('data', (part: Buffer) => parts.push(part));
      res.on('end', () => {
        done(null, Buffer.concat(parts));
      });
    });
  const book = await send(agent, address, xlsx.body as Buffer);
  expect(book.counts).toMatchObject({ rows: 1, 'there already': 1, noted: 0 });
});

test.each([
  ['no table', '{"type":"FeatureCollection","features":[]}'],
  ['an empty file', ''],
  ['a picture', '\u0089PNG\r\n'],
])('%s is refused and leaves nothing behind', async (_, text) => {
  const { agent, address } = await anOffice();
  const answer = await agent.post(address).attach('file', Buffer.from(text), 'parties.csv');
  expect(answer.status).toBe(422);
  expect((await agent.get(address)).body).toEqual([]);
  expect(readdirSync(services().env.UPLOADS_FOLDER)).toEqual([]);
});

test('more rows than are taken are refused', async () => {
  const { agent, address } = await anOffice();
  const file = csv(...Array<string>(50_001).fill('B1,,owner,A,,B,,,,,'));
  const answer = await agent.post(address).attach('file', file, 'parties.csv');
  expect([answer.status, answer.text]).toEqual([413, expect.stringContaining('50,000 rows')]);
});

test('is for those who may, in their own scheme', async () => {
  const { scheme, agent, address } = await anOffice();
  const found = await send(agent, address, csv(...ROWS));
  const one = `${address}/${found.id}`;
  expect((await (await visitor(app())).get(one)).status).toBe(401);
  const witness = await signIn(app(), await aMember(scheme, 'witness'));
  expect((await witness.get(one)).status).toBe(403);
  expect((await witness.post(address).attach('file', csv(...ROWS), 'a.csv')).status).toBe(403);
  const there = await anOffice();
  const foreign = `${there.address}/${found.id}`;
  for (const path of [one, foreign]) expect((await there.agent.get(path)).status).toBe(404);
  expect((await there.agent.get(`${foreign}/rows`)).status).toBe(404);
  expect((await there.agent.get(`${foreign}/report.csv`)).status).toBe(404);
  expect((await there.agent.delete(foreign)).status).toBe(404);
  expect((await takeOver(there.agent, there.address, found)).status).toBe(404);
});
