import { readdirSync } from 'node:fs';
import { beforeAll, describe, expect, test } from 'vitest';
import type TestAgent from 'supertest/lib/agent.js';
import { importListSchema, importSchema, mendSchema } from '../../../shared/schemas/imports.ts';
import { recoverImports } from '../../../server/commands/recover-imports.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { BuildingFootprint } from '../../../server/models/building-footprint.ts';
import { Building } from '../../../server/models/building.ts';
import { RegisterImport } from '../../../server/models/register-import.ts';
import type { Scheme } from '../../../server/models/scheme.ts';
import { aMember, aScheme } from '../../support/factories.ts';
import { bowTie, feature, geojson, houses, rectangle } from '../../support/import-files.ts';
import { importSession } from '../../support/import-session.ts';
import { readTile } from '../../support/read-tile.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const { app, services } = testApp();
let scheme: Scheme;
let assessor: TestAgent;

beforeAll(async () => {
  scheme = await aScheme();
  assessor = await signIn(app(), await aMember(scheme, 'assessor'));
});

async function begin(overrides: { crs?: number } = {}) {
  const own = await aScheme(overrides);
  const person = await aMember(own, 'assessor');
  const agent = await signIn(app(), person);
  return { own, agent, person, session: importSession(agent, own, services()) };
}

function buildingsOf({ id }: Scheme) {
  return Building.findAll({ where: { schemeId: id, removedAt: null }, order: ['reference'] });
}

describe('sending a file', () => {
  test('reads it, guesses its columns, checks it and asks', async () => {
    const { own, session, person } = await begin();
    const answer = await session.send(geojson(houses(3)), 'Gebäude.geojson');
    expect(answer).toMatchObject({
      state: 'asking',
      version: 1,
      fileName: 'Gebäude.geojson',
      format: 'geojson',
      kind: 'footprints',
      by: person.name,
      progress: { done: 3, of: 3 },
      missing: [],
      remembered: null,
      layers: [],
      fault: null,
    });
    expect(answer.columns).toContainEqual({
      name: 'name',
      filled: 3,
      samples: ['House 1', 'House 2', 'House 3'],
    });
    expect(answer.options.columns).toEqual({ reference: 'ref', name: 'name', storeys: 'floors' });
    expect(answer.place).toMatchObject({ crs: 32631, from: 'the file', accuracy: 0 });
    expect(answer.counts).toMatchObject({ rows: 3, new: 3, refused: 0, absent: 0, area: 240 });
    expect(answer.bounds?.[0]).toBeCloseTo(3, 3);
    expect(await buildingsOf(own)).toEqual([]);
    const [entry] = await AuditEntry.findAll({ where: { schemeId: own.id } });
    expect(entry).toMatchObject({ action: 'start import', after: { fileName: 'Gebäude.geojson' } });
    expect(readdirSync(services().env.UPLOADS_FOLDER)).toEqual([]);
  });

  test('fails with a sentence where it is no such file', async () => {
    const { session } = await begin();
    const answer = await session.send('<html>not found</html>', 'town.geojson');
    expect(answer.state).toBe('failed');
    expect(answer.fault).toMatch(/\w+.*\.$/);
  });

  test('wants one file, of one who may', async () => {
    const address = `/api/schemes/${scheme.id}/imports`;
    expect((await assessor.post(address)).status).toBe(415);
    expect((await assessor.post(address).field('note', 'no file')).status).toBe(422);
    const witness = await signIn(app(), await aMember(scheme, 'witness'));
    expect((await witness.post(address).attach('file', Buffer.from('{}'), 'a')).status).toBe(403);
    const stranger = await signIn(app(), await aMember(await aScheme(), 'assessor'));
    expect((await stranger.post(address).attach('file', Buffer.from('{}'), 'a')).status).toBe(404);
    const nobody = await visitor(app());
    expect((await nobody.post(address).attach('file', Buffer.from('{}'), 'a')).status).toBe(401);
    expect(await RegisterImport.count({ where: { schemeId: scheme.id } })).toBe(0);
  });
});

describe('choosing', () => {
  test('asks for the system where nobody says it, and takes it from the person', async () => {
    const { session } = await begin();
    const asked = await session.send(geojson(houses(2), null));
    expect(asked).toMatchObject({ state: 'asking', missing: ['crs'], counts: null });
    expect(asked.place).toMatchObject({ crs: null, from: 'nobody' });
    const place = { ...asked.options.place, crs: 32631 };
    const chosen = await session.choose(asked, { place });
    expect(chosen).toMatchObject({ version: 2, missing: [], counts: { new: 2 } });
    expect(chosen.place).toMatchObject({ crs: 32631, from: 'the person' });
  });

  test('shifts, maps and numbers as wanted', async () => {
    const { own, session } = await begin();
    const first = await session.send(geojson(houses(2)));
    const chosen = await session.choose(first, {
      place: { ...first.options.place, shift: [1.5, -2] },
      columns: { address: 'name' },
      prefix: 'Q',
    });
    expect((await session.rows(chosen)).map(({ reference }) => reference)).toEqual(['Q0001', 'Q0002']); // prettier-ignore
    await session.confirm(chosen);
    const [building] = await buildingsOf(own);
    expect(building).toMatchObject({ reference: 'Q0001', name: null, address: 'House 1' });
    const kept = await BuildingFootprint.findByPk(building?.id ?? 0);
    expect(kept?.footprint[0]?.[0]?.[0]).toEqual([500_001.5, 6_079_998]);
    const again = await session.send(geojson(houses(3)));
    expect(again.remembered).toMatchObject({ fileName: 'town.geojson' });
    expect(again.remembered?.at).toMatch(/^\d{4}-\d\d-\d\dT/);
    expect(again.options).toMatchObject({ prefix: 'Q', columns: { address: 'name' } });
    expect(again.counts).toMatchObject({ new: 1, same: 2 });
  });

  test('refuses columns and systems that are not there, and an old version', async () => {
    const { agent, session } = await begin();
    const row = await session.send(geojson(houses(1)));
    const address = `${session.base}/${row.id}`;
    const wrong = { ...row.options, columns: { name: 'nobody' } };
    const refused = await agent.patch(address).send({ version: 1, options: wrong });
    expect(refused.status).toBe(422);
    expect(refused.body).toMatchObject({ error: { fields: [{ path: 'options.columns.name' }] } });
    const place = { ...row.options.place, crs: 4807 };
    const unplaced = await agent.patch(address).send({ version: 1, options: { ...row.options, place } }); // prettier-ignore
    expect(unplaced.body).toMatchObject({ error: { fields: [{ path: 'options.place.crs' }] } });
    await session.choose(row, { prefix: 'C' });
    const late = await agent.patch(address).send({ version: 1, options: row.options });
    expect(late.status).toBe(409);
    expect((await RegisterImport.findByPk(row.id))?.options.prefix).toBe('C');
  });

  test('of two at once takes one', async () => {
    const { agent, session } = await begin();
    const row = await session.send(geojson(houses(300)));
    const address = `${session.base}/${row.id}`;
    const answers = await Promise.all(
      ['X', 'Y'].map((prefix) =>
        agent.patch(address).send({ version: 1, options: { ...row.options, prefix } }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(await session.settled(row.id)).toMatchObject({ version: 2, state: 'asking' });
  });
});

describe('confirming', () => {
  test('takes everything over in one change and keeps what had a remark', async () => {
    const { own, agent, session } = await begin();
    const bad = feature({ ref: 'bow' }, bowTie(0, 500));
    const row = await session.send(geojson([...houses(4), bad]));
    expect(row.counts).toMatchObject({ new: 4, refused: 1, noted: 1, mendable: 1 });
    const done = await session.confirm(row);
    expect(done).toMatchObject({ state: 'done', fault: null });
    expect(done.changeId).not.toBeNull();
    const [first, ...others] = await buildingsOf(own);
    expect(others).toHaveLength(3);
    expect(first).toMatchObject({ reference: 'H-1', name: 'House 1', storeys: 2, area: 80 });
    expect(first?.imported).toMatchObject({ name: 'House 1', storeys: 2 });
    expect((await session.rows(done)).map(({ reference }) => reference)).toEqual(['bow']);
    const entries = await AuditEntry.findAll({ where: { schemeId: own.id, action: 'change register' } }); // prettier-ignore
    expect(entries).toHaveLength(1);
    const again = await agent.post(`${session.base}/${row.id}/confirm`).send({ version: 1 });
    expect(again.status).toBe(409);
  });

  test('wants the version that was seen and something to take over', async () => {
    const { agent, session } = await begin();
    const row = await session.send(geojson([feature({ ref: 'bow' }, bowTie(0, 0))]));
    const address = `${session.base}/${row.id}/confirm`;
    expect((await agent.post(address).send({ version: 7 })).status).toBe(409);
    expect((await agent.post(address).send({ version: 1 })).status).toBe(422);
    expect((await agent.post(address).send({})).status).toBe(422);
  });

  test('checks again where somebody took the reference meanwhile', async () => {
    const { own, session } = await begin();
    const [one, two] = [await session.send(geojson(houses(2))), await session.send(geojson(houses(2)))]; // prettier-ignore
    await session.confirm(one);
    const back = await session.confirm(two);
    expect(back).toMatchObject({ state: 'asking', version: 2, counts: { same: 2, new: 0 } });
    expect(back.fault).toMatch(/Nothing was taken over/);
    expect(await buildingsOf(own)).toHaveLength(2);
  });

  test('brings 2,000 rows in', async () => {
    const { own, session } = await begin();
    const done = await session.confirm(await session.send(geojson(houses(2000))));
    expect(done).toMatchObject({ state: 'done', counts: { rows: 2000, new: 2000, refused: 0 } });
    expect(await Building.count({ where: { schemeId: own.id } })).toBe(2000);
    expect(done.counts?.area).toBeCloseTo(160_000, 3);
  });
});

describe('importing again', () => {
  function town(...changes: Record<string, unknown>[]) {
    const features = ['a', 'b', 'c'].map((ref, at) =>
      feature({ ref, name: `Name ${ref}`, use: 'shop', ...changes[at] }, rectangle(30 * at, 0)),
    );
    return geojson(features);
  }

  test('changes by reference, keeps hand edits and asks where both changed', async () => {
    const { own, agent, session } = await begin();
    await session.confirm(await session.send(town()));
    await Building.update({ name: 'By hand', version: 2 }, { where: { schemeId: own.id, reference: 'a' } }); // prettier-ignore
    await Building.update({ use: 'bank', version: 2 }, { where: { schemeId: own.id, reference: 'b' } }); // prettier-ignore
    const row = await session.send(town({}, { use: 'inn' }, { name: 'New c' }));
    expect(row.counts).toMatchObject({ same: 1, conflict: 1, changed: 1, new: 0, absent: 0 });
    expect(row.missing).toEqual(['settle']);
    const [kept] = await session.rows(row, 'same');
    expect(kept?.changes).toEqual([
      { field: 'name', ours: 'By hand', theirs: 'Name a', isConflict: false, isKept: true },
    ]);
    const [conflict] = await session.rows(row, 'conflict');
    expect(conflict?.changes[0]).toMatchObject({ field: 'use', ours: 'bank', theirs: 'inn', isConflict: true }); // prettier-ignore
    const refused = await agent.post(`${session.base}/${row.id}/confirm`).send({ version: 1 });
    expect(refused.status).toBe(422);
    const settle = { others: 'ask' as const, rows: { b: 'take theirs' as const } };
    const settled = await session.choose(row, { settle });
    expect(settled.missing).toEqual([]);
    await session.confirm(settled);
    const buildings = await buildingsOf(own);
    expect(buildings.map(({ name, use }) => [name, use])).toEqual([
      ['By hand', 'shop'],
      ['Name b', 'inn'],
      ['New c', 'shop'],
    ]);
    const same = await session.send(town({}, { use: 'inn' }, { name: 'New c' }));
    expect(same.counts).toMatchObject({ same: 3, conflict: 0, changed: 0 });
  });

  test('moves a footprint, and counts who is not spoken of', async () => {
    const { own, session } = await begin();
    await session.confirm(await session.send(town()));
    const moved = geojson([feature({ ref: 'a', name: 'Name a', use: 'shop' }, rectangle(0, 0, 12))]); // prettier-ignore
    const row = await session.send(moved);
    expect(row.counts).toMatchObject({ changed: 1, absent: 2 });
    const [change] = (await session.rows(row, 'changed')).flatMap(({ changes }) => changes);
    expect(change).toMatchObject({ field: 'footprint', ours: 80, theirs: 96 });
    await session.confirm(row);
    expect((await buildingsOf(own)).map(({ area }) => area)).toEqual([96, 80, 80]);
  });

  test('joins values without footprints by reference', async () => {
    const { own, session } = await begin();
    await session.confirm(await session.send(town()));
    const csv = 'Building ref;Listed;Ground level\na;ja;"3,5 m"\nz;nein;4\nb;;n/a\n';
    const row = await session.send(csv, 'listing.csv');
    expect(row).toMatchObject({ kind: 'values', missing: [], counts: { changed: 1, same: 1, refused: 1 } }); // prettier-ignore
    await session.confirm(row);
    const [a] = await buildingsOf(own);
    expect(a).toMatchObject({ listedGrade: 'listed', groundLevel: 3.5, groundLevelFrom: 'file', area: 80 }); // prettier-ignore
  });

  test('asks which column joins values', async () => {
    const { session } = await begin();
    const row = await session.send('Qwert;Asdf\n1;2\n', 'listing.csv');
    expect(row).toMatchObject({ state: 'asking', missing: ['reference', 'columns'] });
  });
});

describe('cancelling', () => {
  test('drops what is being done, and what is staged', async () => {
    const { own, agent, session } = await begin();
    const row = await session.sent(geojson(houses(2000)));
    const answer = await agent.delete(`${session.base}/${row.id}`);
    expect(importSchema.parse(answer.body).state).toBe('cancelled');
    expect(await session.settled(row.id)).toMatchObject({ state: 'cancelled' });
    expect(await session.rows(row)).toEqual([]);
    expect(await buildingsOf(own)).toEqual([]);
    expect((await agent.delete(`${session.base}/${row.id}`)).status).toBe(409);
    const entries = await AuditEntry.findAll({ where: { schemeId: own.id, action: 'cancel import' } }); // prettier-ignore
    expect(entries).toHaveLength(1);
  });

  test('rolls back what is being taken over', async () => {
    const { own, agent, session } = await begin();
    const row = await session.send(geojson(houses(2000)));
    await agent.post(`${session.base}/${row.id}/confirm`).send({ version: row.version });
    const answer = await agent.delete(`${session.base}/${row.id}`);
    expect(importSchema.parse(answer.body).state).toBe('cancelled');
    expect(await buildingsOf(own)).toEqual([]);
  });

  test('is for those who may', async () => {
    const { own, session } = await begin();
    const row = await session.send(geojson(houses(1)));
    const address = `${session.base}/${row.id}`;
    const witness = await signIn(app(), await aMember(own, 'witness'));
    expect((await witness.delete(address)).status).toBe(403);
    expect((await witness.get(address)).status).toBe(200);
    expect((await assessor.delete(address)).status).toBe(404);
    expect((await (await visitor(app())).delete(address)).status).toBe(401);
  });
});

describe('after a stop of the server', () => {
  test('what was half read has failed, what was being checked is checked', async () => {
    const { own, session } = await begin();
    const [read, checked, taken] = [
      await session.send(geojson(houses(2))),
      await session.send(geojson(houses(2))),
      await session.send(geojson(houses(2))),
    ];
    await RegisterImport.update({ state: 'reading' }, { where: { id: read.id } });
    await RegisterImport.update({ state: 'checking' }, { where: { id: checked.id } });
    await RegisterImport.update({ state: 'importing' }, { where: { id: taken.id } });
    await recoverImports(services());
    const failed = await session.settled(read.id);
    expect(failed.state).toBe('failed');
    expect(failed.fault).toBe('The server stopped while reading. Send the file again.');
    expect(await session.rows(read)).toEqual([]);
    expect(await session.settled(checked.id)).toMatchObject({ state: 'asking', counts: { new: 2 } }); // prettier-ignore
    const back = await session.settled(taken.id);
    expect(back).toMatchObject({ state: 'asking', version: 2 });
    expect(back.fault).toMatch(/Nothing was taken over/);
    expect(await buildingsOf(own)).toEqual([]);
  });

  test('what asks for more than a fortnight is dropped with words', async () => {
    const { own, session } = await begin();
    const [old, young] = [await session.send(geojson(houses(2))), await session.send(geojson(houses(2)))]; // prettier-ignore
    const day = 24 * 60 * 60 * 1000;
    const sent = (days: number) => ({ at: new Date(Date.now() - days * day) });
    await RegisterImport.update(sent(14.1), { where: { id: old.id } });
    await RegisterImport.update(sent(13.9), { where: { id: young.id } });
    await recoverImports(services());
    const dropped = await session.settled(old.id);
    expect(dropped.state).toBe('cancelled');
    expect(dropped.fault).toMatch(/14 days/);
    expect(await session.rows(old)).toEqual([]);
    expect((await session.settled(young.id)).state).toBe('asking');
    expect(await session.rows(young)).toHaveLength(2);
    const entries = await AuditEntry.findAll({ where: { schemeId: own.id, action: 'cancel import' } }); // prettier-ignore
    expect(entries).toMatchObject([{ subjectId: old.id, personId: null }]);
  });
});

describe('reading about imports', () => {
  test('lists them, the newest first', async () => {
    const { agent, session, person } = await begin();
    const [one, two] = [await session.send(geojson(houses(1)), 'a.json'), await session.send(geojson(houses(2)), 'b.json')]; // prettier-ignore
    const list = importListSchema.parse((await agent.get(session.base)).body);
    expect(list.map(({ id, fileName, by }) => [id, fileName, by])).toEqual([
      [two.id, 'b.json', person.name],
      [one.id, 'a.json', person.name],
    ]);
    expect((await assessor.get(session.base)).status).toBe(404);
  });

  test('of another scheme are not there', async () => {
    const { session } = await begin();
    const { id } = await session.send(geojson([feature({ ref: 'x' }, bowTie(0, 0))]));
    for (const rest of ['', '/rows', '/rows/1/mend', '/report.csv']) {
      const foreign = await assessor.get(`/api/schemes/${scheme.id}/imports/${id}${rest}`);
      const unknown = await assessor.get(`/api/schemes/${scheme.id}/imports/${UNKNOWN_ID}${rest}`);
      expect([rest, foreign.status, foreign.text]).toEqual([rest, 404, unknown.text]);
    }
    const options = { version: 1 };
    const confirm = `/api/schemes/${scheme.id}/imports/${id}/confirm`;
    expect((await assessor.post(confirm).send(options)).status).toBe(404);
    const tile = `/api/schemes/${scheme.id}/tiles/imports/${id}/1/14/8328/5190.pbf`;
    expect((await assessor.get(tile)).status).toBe(404);
  });

  test('pages rows by what becomes of them', async () => {
    const { agent, session } = await begin();
    const row = await session.send(geojson([...houses(5), feature({ ref: '' }, rectangle(0, 300))])); // prettier-ignore
    expect(await session.rows(row, 'refused')).toMatchObject([{ row: 6, outcome: 'refused' }]);
    expect(await session.rows(row, 'noted')).toHaveLength(1);
    const page = await agent.get(`${session.base}/${row.id}/rows?offset=1&limit=2`);
    expect(page.body).toMatchObject({ found: 6, rows: [{ row: 2 }, { row: 3 }] });
    expect((await agent.get(`${session.base}/${row.id}/rows?limit=999`)).status).toBe(422);
  });

  test('shows a crossing ring before and after, and mends it when wanted', async () => {
    const { own, agent, session } = await begin();
    const row = await session.send(geojson([feature({ ref: 'bow' }, bowTie(0, 0)), ...houses(1)]));
    const shown = mendSchema.parse((await agent.get(`${session.base}/${row.id}/rows/1/mend`)).body);
    expect(shown.before[0]).toHaveLength(1);
    expect(shown.after).toHaveLength(2);
    expect((await agent.get(`${session.base}/${row.id}/rows/2/mend`)).status).toBe(404);
    const mended = await session.choose(row, { mend: true });
    expect(mended.counts).toMatchObject({ new: 2, refused: 0, mendable: 1 });
    await session.confirm(mended);
    expect((await buildingsOf(own)).find(({ reference }) => reference === 'bow')?.area).toBeCloseTo(50); // prettier-ignore
  });

  test('gives a report without formulas', async () => {
    const { agent, session } = await begin();
    const row = await session.send(
      geojson([feature({ ref: '=1+1', floors: 'many' }, rectangle(0, 300)), ...houses(1)]),
    );
    const report = await agent.get(`${session.base}/${row.id}/report.csv`);
    expect(report.headers['content-disposition']).toContain('attachment');
    const [heading, line, ...others] = report.text.trimEnd().split('\r\n');
    expect(heading).toBe('\uFEFFRow,Reference,Outcome,Area m²,Remarks,Changes');
    expect(line).toContain("1,'=1+1,new,80");
    expect(line).toContain('“many” is no number');
    expect(others).toEqual([]);
  });

  test('draws its rows in tiles of its version', async () => {
    const { own, agent, session } = await begin();
    const row = await session.send(geojson(houses(2)));
    const tile = (version: number) =>
      `/api/schemes/${own.id}/tiles/imports/${row.id}/${version}/14/8328/5190.pbf`;
    expect((await agent.get(tile(9)).redirects(0)).status).toBe(307);
    const [west = 0, south = 0] = row.bounds ?? [];
    const x = Math.floor(((west + 180) / 360) * 2 ** 14);
    const sine = Math.asinh(Math.tan((south * Math.PI) / 180));
    const y = Math.floor(((1 - sine / Math.PI) / 2) * 2 ** 14);
    const address = `/api/schemes/${own.id}/tiles/imports/${row.id}/1/14/${x}/${y}.pbf`;
    const answer = await agent
      .get(address)
      .buffer()
      .parse((res, done) => {
        const chunks: Buffer[] = [];
        res.on('data', (chunk: Buffer) => chunks.push(chunk));
        res.on('end', () => {
          done(null, Buffer.concat(chunks));
        });
      });
    expect(answer.status).toBe(200);
    const { rows } = readTile(answer.body);
    expect(rows?.map(({ id, properties }) => [id, properties])).toContainEqual([1, { outcome: 'new', reference: 'H-1' }]); // prettier-ignore
    await session.confirm(row);
    expect((await agent.get(address)).status).toBe(204);
  });
});
