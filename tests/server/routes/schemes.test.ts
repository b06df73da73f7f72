import request from 'supertest';
import { beforeAll, describe, expect, test } from 'vitest';
import { newSchemeSchema, schemeSchema, schemesSchema } from '../../../shared/schemas/schemes.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Person } from '../../../server/models/person.ts';
import { SchemeRules } from '../../../server/models/scheme-rules.ts';
import { Scheme } from '../../../server/models/scheme.ts';
import { aMember, anAdministrator, aScheme } from '../../support/factories.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const { app } = testApp();
let administrator: Person;

beforeAll(async () => {
  administrator = await anAdministrator();
});

function asAdministrator() {
  return signIn(app(), administrator);
}

async function trailOf(scheme: { readonly id: string }) {
  return AuditEntry.findAll({ where: { schemeId: scheme.id }, order: ['id'] });
}

describe('reading schemes', () => {
  test('lists those that a person has a part in, by name, with roles and abilities', async () => {
    const scheme = await aScheme({ name: 'Østerled' });
    const member = await aMember(scheme, 'witness', 'designer');
    await aScheme();
    const answer = await (await signIn(app(), member)).get('/api/schemes');
    expect(answer.status).toBe(200);
    const [one, ...others] = schemesSchema.parse(answer.body);
    expect(others).toEqual([]);
    expect(one).toMatchObject({ id: scheme.id, crs: 32631, roles: ['designer', 'witness'] });
    expect(one?.abilities).toMatchObject({
      readRegister: true,
      updateBackground: true,
      updateScheme: false,
      readMembers: false,
    });
  });

  test('lists all to the administrator, in the order of the alphabet', async () => {
    const names = ['Zoll', 'öresund', 'Orkney'];
    for (const name of names) await aScheme({ name });
    const answer = await (await asAdministrator()).get('/api/schemes');
    const schemes = schemesSchema.parse(answer.body);
    expect(schemes).toHaveLength(await Scheme.count());
    const found = schemes.map(({ name }) => name).filter((name) => names.includes(name));
    expect(found).toEqual(['öresund', 'Orkney', 'Zoll']);
  });

  test('shows one to whoever has a part in it', async () => {
    const scheme = await aScheme();
    for (const role of ['designer', 'assessor', 'owner', 'witness'] as const) {
      const agent = await signIn(app(), await aMember(scheme, role));
      const answer = await agent.get(`/api/schemes/${scheme.id}`);
      expect(schemeSchema.parse(answer.body)).toMatchObject({ id: scheme.id, roles: [role] });
    }
  });

  test('shows none to somebody who is not signed in, or has no part in it', async () => {
    const scheme = await aScheme();
    expect((await request(app()).get('/api/schemes')).status).toBe(401);
    expect((await request(app()).get(`/api/schemes/${scheme.id}`)).status).toBe(401);
    const stranger = await signIn(app(), await aMember(await aScheme(), 'assessor'));
    const foreign = await stranger.get(`/api/schemes/${scheme.id}`);
    const unknown = await stranger.get(`/api/schemes/${UNKNOWN_ID}`);
    expect([foreign.status, unknown.status]).toEqual([404, 404]);
    expect(foreign.text).toBe(unknown.text);
    expect((await stranger.get('/api/schemes/not-an-id')).text).toBe(unknown.text);
  });
});

describe('creating a scheme', () => {
  test('keeps it with the default rules as version 1, and tells the trail', async () => {
    const answer = await (
      await asAdministrator()
    )
      .post('/api/schemes')
      .send({ name: ' Port Dogger ', description: 'Under the harbour.', crs: 32631 });
    expect(answer.status).toBe(201);
    const scheme = schemeSchema.parse(answer.body);
    expect(scheme).toMatchObject({ name: 'Port Dogger', version: 1, roles: [], archivedAt: null });
    expect(await Scheme.findByPk(scheme.id)).toMatchObject({ name: 'Port Dogger', crs: 32631 });
    const rules = await SchemeRules.findAll({ where: { schemeId: scheme.id } });
    expect(rules).toMatchObject([{ version: 1, createdBy: administrator.id }]);
    expect(await trailOf(scheme)).toMatchObject([
      {
        action: 'create scheme',
        personId: administrator.id,
        subjectId: scheme.id,
        before: null,
        after: { name: 'Port Dogger', description: 'Under the harbour.', crs: 32631 },
      },
    ]);
  });

  test.each([
    [27700, 'British National Grid'],
    [31467, 'DHDN in Germany'],
    [2056, 'CH1903+'],
  ])('takes EPSG:%d, %s', async (crs) => {
    const agent = await asAdministrator();
    const answer = await agent.post('/api/schemes').send({ name: `On ${crs}`, crs });
    expect(answer.status).toBe(201);
  });

  test('refuses a name that another one has, whatever its capitals', async () => {
    const agent = await asAdministrator();
    const { name } = await aScheme({ name: 'Nørre Havn' });
    for (const given of [name, 'NØRRE HAVN', ` ${name} `]) {
      const answer = await agent.post('/api/schemes').send({ name: given, crs: 32631 });
      expect(answer.body).toMatchObject({
        error: { code: 'already-exists', fields: [{ path: 'name' }] },
      });
    }
    expect(await Scheme.count({ where: { name } })).toBe(1);
  });

  test('takes the name of an archived one, which is then not brought back', async () => {
    const agent = await asAdministrator();
    const old = await aScheme({ name: 'Old Harbour', archivedAt: new Date() });
    const answer = await agent.post('/api/schemes').send({ name: 'Old Harbour', crs: 32631 });
    expect(answer.status).toBe(201);
    const back = await agent
      .put(`/api/schemes/${old.id}/archived`)
      .send({ archived: false, version: 1 });
    expect(back.body).toMatchObject({ error: { code: 'already-exists' } });
    expect((await old.reload()).archivedAt).not.toBeNull();
  });

  test('refuses to be renamed to another one', async () => {
    const [one, other] = [await aScheme(), await aScheme()];
    const agent = await asAdministrator();
    const answer = await agent
      .patch(`/api/schemes/${one.id}`)
      .send({ version: 1, name: other.name });
    expect(answer.status).toBe(409);
    expect(await one.reload()).toMatchObject({ version: 1 });
  });

  test.each([
    [4326, /is not a projected system/],
    [2225, /is in US survey foot/],
    [5513, /axes .* do not run east and north/],
    [6244, /cannot be laid on the map/],
    [2000, /cannot be laid on the map/],
    [9999, /There is no system EPSG:9999/],
    [3857, /Lengths on .* are not those on the ground/],
  ])('refuses EPSG:%d in words', async (crs, words) => {
    const before = await Scheme.count();
    const agent = await asAdministrator();
    const answer = await agent.post('/api/schemes').send({ name: 'Elsewhere', crs });
    expect(answer.status).toBe(422);
    const field = { path: 'crs', message: expect.stringMatching(words) as string };
    expect(answer.body).toMatchObject({ error: { code: 'invalid-input', fields: [field] } });
    expect(await Scheme.count()).toBe(before);
  });

  test('refuses a form without a name', async () => {
    const agent = await asAdministrator();
    const answer = await agent.post('/api/schemes').send({ name: '  ', crs: 32631 });
    expect(answer.status).toBe(422);
    const fields = [{ path: 'name', message: 'Give it a name.' }];
    expect(answer.body).toMatchObject({ error: { code: 'invalid-input', fields } });
    for (const form of [
      { name: 'A\0' },
      { name: 'A', description: '\0' },
      { name: 'A', rules: {} },
    ]) {
      expect(newSchemeSchema.safeParse({ crs: 32631, ...form }).success).toBe(false);
    }
    const lines = { name: 'A', description: 'One line.\nAnother.', crs: 32631 };
    expect(newSchemeSchema.safeParse(lines).success).toBe(true);
  });

  test('is for the administrator', async () => {
    const form = { name: 'Mine', crs: 32631 };
    const agent = await signIn(app(), await aMember(await aScheme(), 'designer', 'assessor'));
    expect((await agent.post('/api/schemes').send(form)).status).toBe(403);
    expect(await Scheme.count({ where: { name: 'Mine' } })).toBe(0);
  });
});

describe('changing a scheme', () => {
  test('keeps the change, a new version and the trail', async () => {
    const scheme = await aScheme({ name: 'Before', description: 'Old.' });
    const answer = await (
      await asAdministrator()
    )
      .patch(`/api/schemes/${scheme.id}`)
      .send({ version: 1, name: 'After' });
    expect(schemeSchema.parse(answer.body)).toMatchObject({ name: 'After', version: 2 });
    await scheme.reload();
    expect(scheme).toMatchObject({ name: 'After', description: 'Old.', version: 2 });
    expect(await trailOf(scheme)).toMatchObject([
      {
        action: 'change scheme',
        before: { name: 'Before', description: 'Old.' },
        after: { name: 'After', description: 'Old.' },
      },
    ]);
  });

  test('refuses one that was begun on an older version', async () => {
    const scheme = await aScheme();
    const agent = await asAdministrator();
    const address = `/api/schemes/${scheme.id}`;
    await agent.patch(address).send({ version: 1, name: 'First' });
    const answer = await agent.patch(address).send({ version: 1, name: 'Second' });
    expect(answer.status).toBe(409);
    expect(answer.body).toMatchObject({ error: { code: 'conflict' } });
    await scheme.reload();
    expect(scheme.name).toBe('First');
  });

  test('lets one of two through who change at once', async () => {
    const scheme = await aScheme();
    const agent = await asAdministrator();
    const answers = await Promise.all(
      ['One', 'Other'].map((name) =>
        agent.patch(`/api/schemes/${scheme.id}`).send({ version: 1, name }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
  });

  test('is for the administrator, and for nobody without the CSRF token', async () => {
    const scheme = await aScheme();
    const address = `/api/schemes/${scheme.id}`;
    const assessor = await signIn(app(), await aMember(scheme, 'assessor'));
    const change = { version: 1, name: 'Changed' };
    expect((await assessor.patch(address).send(change)).status).toBe(403);
    const agent = await asAdministrator();
    const withoutToken = await agent.patch(address).set('X-CSRF-Token', 'guess').send(change);
    expect(withoutToken.body).toMatchObject({ error: { code: 'csrf-failed' } });
    expect((await agent.patch(`/api/schemes/${UNKNOWN_ID}`).send(change)).status).toBe(404);
    await scheme.reload();
    expect(scheme.version).toBe(1);
  });
});

describe('archiving a scheme', () => {
  test('makes it readable only, until it is brought back', async () => {
    const scheme = await aScheme();
    const agent = await asAdministrator();
    const address = `/api/schemes/${scheme.id}`;
    const archived = await agent.put(`${address}/archived`).send({ archived: true, version: 1 });
    const answer = schemeSchema.parse(archived.body);
    expect(answer.archivedAt).not.toBeNull();
    expect(answer.abilities).toMatchObject({
      readScheme: true,
      readMembers: true,
      archiveScheme: true,
      updateScheme: false,
      manageMembers: false,
      updateRules: false,
      updateBackground: false,
    });
    expect((await agent.get(address)).status).toBe(200);
    const change = { version: answer.version, name: 'Changed' };
    const refused = await agent.patch(address).send(change);
    expect(refused.status).toBe(409);
    expect(refused.body).toMatchObject({ error: { code: 'archived' } });

    const back = { archived: false, version: answer.version };
    expect((await agent.put(`${address}/archived`).send(back)).status).toBe(200);
    const changed = await agent.patch(address).send({ ...change, version: answer.version + 1 });
    expect(changed.status).toBe(200);
    const actions = (await trailOf(scheme)).map(({ action }) => action);
    expect(actions).toEqual(['archive scheme', 'bring back scheme', 'change scheme']);
  });

  test('changes nothing where it is archived already, and refuses an older version', async () => {
    const scheme = await aScheme({ archivedAt: new Date() });
    const address = `/api/schemes/${scheme.id}/archived`;
    const agent = await asAdministrator();
    const again = await agent.put(address).send({ archived: true, version: 1 });
    expect(schemeSchema.parse(again.body).version).toBe(1);
    expect((await agent.put(address).send({ archived: false, version: 7 })).status).toBe(409);
    expect((await agent.put(address).send({ archived: 'yes', version: 1 })).status).toBe(422);
    expect(await trailOf(scheme)).toEqual([]);
  });

  test('is for the administrator', async () => {
    const scheme = await aScheme();
    const agent = await signIn(app(), await aMember(scheme, 'designer', 'assessor', 'witness'));
    const address = `/api/schemes/${scheme.id}/archived`;
    expect((await agent.put(address).send({ archived: true, version: 1 })).status).toBe(403);
  });
});
