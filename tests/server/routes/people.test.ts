import { QueryTypes } from 'sequelize';
import { beforeAll, describe, expect, test, vi } from 'vitest';
import { z } from 'zod';
import { personSchema } from '../../../shared/schemas/people.ts';
import { linkTokenHash } from '../../../server/authentication/link-token.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Membership } from '../../../server/models/membership.ts';
import { Person } from '../../../server/models/person.ts';
import { SingleUseLink } from '../../../server/models/single-use-link.ts';
import type { Services } from '../../../server/services.ts';
import { aLink, aMember, anAdministrator, aPerson, aScheme } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { tokenOf } from '../../support/token-of.ts';

const { app, services, letters, outbox } = testApp();
const NOBODY = '3fa85f64-5717-4562-b3fc-2c963f66afa6';
let administrator: Person;

beforeAll(async () => {
  administrator = await anAdministrator();
});

/** How many in this database wait for somebody else's transaction. */
async function waitingForLocks({ database }: Services): Promise<number> {
  const [row] = await database.query<{ count: string }>(
    `select count(*) from pg_stat_activity where datname = current_database() and wait_event_type = 'Lock'`,
    { type: QueryTypes.SELECT },
  );
  return Number(row?.count);
}

function asAdministrator() {
  return signIn(app(), administrator);
}

describe('reading people', () => {
  test('shows everybody by name with roles and open invitation, and no hash', async () => {
    const scheme = await aScheme({ name: 'Port Dogger' });
    const assessor = await aMember(scheme, 'assessor', 'designer');
    const invited = await aPerson({ name: 'Øystein', password: null });
    await aPerson({ name: 'Oyster' });
    await aPerson({ name: 'Zoe' });
    await aLink(invited, { purpose: 'invitation' });
    const answer = await (await asAdministrator()).get('/api/people');
    expect(answer.status).toBe(200);
    const people = z.array(personSchema).parse(answer.body);
    const names = people.map(({ name }) => name);
    const some = names.filter((name) => ['Øystein', 'Oyster', 'Zoe'].includes(name));
    expect(some).toEqual(['Øystein', 'Oyster', 'Zoe']);
    expect(people.find(({ id }) => id === assessor.id)).toMatchObject({
      hasPassword: true,
      invitedUntil: null,
      memberships: [
        { schemeId: scheme.id, schemeName: 'Port Dogger', role: 'assessor' },
        { schemeId: scheme.id, schemeName: 'Port Dogger', role: 'designer' },
      ],
      abilities: { invite: false },
    });
    const found = people.find(({ id }) => id === invited.id);
    expect(found).toMatchObject({ hasPassword: false, abilities: { invite: true } });
    expect(found?.invitedUntil).not.toBeNull();
    expect(answer.text).not.toContain('argon2');
  });

  test('shows one', async () => {
    const person = await aPerson();
    const answer = await (await asAdministrator()).get(`/api/people/${person.id}`);
    expect(personSchema.parse(answer.body)).toMatchObject({ id: person.id, email: person.email });
  });
});

describe('inviting a person', () => {
  test('keeps them, their roles and a hash of the link, sends the letter, and tells the trail', async () => {
    const scheme = await aScheme({ name: 'North Mole' });
    const agent = await asAdministrator();
    const answer = await agent.post('/api/people').send({
      name: ' Ada Lind ',
      email: 'Ada@Example.org',
      memberships: [
        { schemeId: scheme.id, role: 'witness' },
        { schemeId: scheme.id, role: 'assessor' },
        { schemeId: scheme.id, role: 'witness' },
      ],
    });
    expect(answer.status).toBe(201);
    const person = personSchema.parse(answer.body);
    await outbox().idle();
    const { letter: fares } = personSchema.parse(
      (await agent.get(`/api/people/${person.id}`)).body,
    );
    expect(fares).toEqual({ state: 'sent', serverWords: '250 taken in' });
    const kept = await Person.findByPk(person.id);
    expect(kept).toMatchObject({
      name: 'Ada Lind',
      email: 'ada@example.org',
      isAdministrator: false,
      passwordHash: null,
    });
    const roles = await Membership.findAll({ where: { personId: person.id }, order: ['role'] });
    expect(roles.map(({ role }) => role)).toEqual(['assessor', 'witness']);
    const letter = letters.find(({ to }) => to === 'ada@example.org');
    const [link] = await SingleUseLink.findAll({ where: { personId: person.id } });
    expect(link).toMatchObject({
      purpose: 'invitation',
      tokenHash: linkTokenHash(tokenOf(letter)),
    });
    const week = 7 * 24 * 3_600_000;
    expect(Math.abs((link?.expiresAt.getTime() ?? 0) - Date.now() - week)).toBeLessThan(60_000);
    const entries = await AuditEntry.findAll({
      where: { subjectId: person.id },
      order: ['id'],
    });
    expect(entries).toMatchObject([
      {
        action: 'invite person',
        personId: administrator.id,
        after: { name: 'Ada Lind', email: 'ada@example.org', isAdministrator: false },
      },
      {
        action: 'change roles',
        schemeId: scheme.id,
        before: { roles: [] },
        after: { roles: ['assessor', 'witness'] },
      },
    ]);
  });

  test('ends in them being signed in', async () => {
    const agent = await asAdministrator();
    const email = 'newcomer@example.org';
    await agent.post('/api/people').send({ name: 'New', email, isAdministrator: true });
    await outbox().idle();
    const token = tokenOf(letters.find(({ to }) => to === email));
    const newcomer = await visitor(app());
    await newcomer.post(`/api/links/${token}`).send({ password: 'a wall of my own choice' });
    expect((await newcomer.get('/api/people')).status).toBe(200);
    const again = await signIn(app(), { email }, 'a wall of my own choice');
    expect((await again.get('/api/session')).body).toMatchObject({ person: { email } });
  });

  test.each([
    [{ name: '', email: 'a@example.org' }, 'name'],
    [{ name: 'x'.repeat(121), email: 'a@example.org' }, 'name'],
    [{ name: 'A\r\nBcc: b@example.org', email: 'a@example.org' }, 'name'],
    [{ name: 'A', email: 'a@example.org\r\nBcc: b@example.org' }, 'email'],
    [{ name: 'A', email: 'a@example.org, b@example.org' }, 'email'],
    [{ name: 'A' }, 'email'],
    [
      { name: 'A', email: 'a@example.org', memberships: [{ schemeId: NOBODY, role: 'king' }] },
      'memberships.0.role',
    ],
    [
      { name: 'A', email: 'a@example.org', memberships: [{ schemeId: NOBODY, role: 'owner' }] },
      'memberships.0.schemeId',
    ],
    [{ name: 'A', email: 'a@example.org', passwordHash: 'x' }, ''],
  ])('names what is wrong in %j', async (body, path) => {
    const agent = await asAdministrator();
    const [people, sent] = [await Person.count(), letters.length];
    const answer = await agent.post('/api/people').send(body);
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path }] } });
    expect([await Person.count(), letters.length]).toEqual([people, sent]);
  });

  test('does not add to an archived scheme', async () => {
    const scheme = await aScheme({ archivedAt: new Date() });
    const answer = await (await asAdministrator()).post('/api/people').send({
      name: 'Late',
      email: 'late@example.org',
      memberships: [{ schemeId: scheme.id, role: 'owner' }],
    });
    expect(answer.status).toBe(409);
    expect(answer.body).toMatchObject({ error: { code: 'archived' } });
    expect(await Person.count({ where: { name: 'Late' } })).toBe(0);
  });

  test('does not add to a scheme that is being archived meanwhile', async () => {
    const [agent, scheme] = [await asAdministrator(), await aScheme()];
    const form = { name: 'Later', email: 'later@example.org' };
    const memberships = [{ schemeId: scheme.id, role: 'owner' }];
    const answer = await services().database.transaction(async (transaction) => {
      await scheme.update({ archivedAt: new Date() }, { transaction });
      const asked = agent.post('/api/people').send({ ...form, memberships });
      const waiting = asked.then((answered) => answered);
      await expect.poll(() => waitingForLocks(services()), { timeout: 10_000 }).toBe(1);
      return () => waiting;
    });
    expect(await answer()).toMatchObject({ status: 409, body: { error: { code: 'archived' } } });
    expect(await Person.count({ where: form })).toBe(0);
  });

  test('stands where the letter cannot be sent, and says so', async () => {
    const { mailer } = services();
    const refusal = Object.assign(new Error('refused'), {
      ...{ responseCode: 550, response: '550 No such mailbox' },
    });
    vi.spyOn(mailer, 'send').mockRejectedValueOnce(refusal);
    const agent = await asAdministrator();
    const form = { name: 'Unsent', email: 'unsent@example.org' };
    const answer = await agent.post('/api/people').send(form);
    expect(answer.status).toBe(201);
    const { id } = personSchema.parse(answer.body);
    await outbox().idle();
    const { abilities, letter } = personSchema.parse((await agent.get(`/api/people/${id}`)).body);
    expect(letter).toEqual({ state: 'failed', serverWords: '550 No such mailbox' });
    expect(abilities.invite).toBe(true);
    expect(await Person.count({ where: form })).toBe(1);
  });

  test('holds neither the link nor, once it is sent, the person in the outbox', async () => {
    const agent = await asAdministrator();
    const form = { name: 'Held Somebody', email: 'held@example.org' };
    const { mailer, database } = services();
    const rowOf = async (token: string) => {
      const [found] = await database.query<{ row: string }>(
        `select row_to_json(o)::text as row from outbox o
         where link_id = (select id from single_use_links where token_hash = $1)`,
        { type: QueryTypes.SELECT, bind: [linkTokenHash(token)] },
      );
      return found?.row;
    };
    const seen: { token: string; waiting: string | undefined }[] = [];
    vi.spyOn(mailer, 'send').mockImplementationOnce(async (letter) => {
      const token = tokenOf(letter);
      seen.push({ token, waiting: await rowOf(token) });
      return '250 taken in';
    });
    await agent.post('/api/people').send(form).expect(201);
    await outbox().idle();
    const [{ token, waiting } = { token: '', waiting: '' }] = seen;
    expect(waiting).toContain(form.email);
    expect(waiting).not.toContain(token);
    const sent = await rowOf(token);
    expect(sent).toContain('"state":"sent"');
    expect(sent).not.toMatch(/held@example.org|Held Somebody/);
  });

  test('does not take an address twice, whatever its capitals', async () => {
    const { email } = await aPerson({ email: 'Taken@example.org' });
    const agent = await asAdministrator();
    const answer = await agent.post('/api/people').send({ name: 'A', email: email.toLowerCase() });
    expect(answer.status).toBe(409);
    expect(answer.body).toMatchObject({
      error: { code: 'already-exists', fields: [{ path: 'email' }] },
    });
  });
});

describe('inviting again', () => {
  test('sends a new link and ends the old one', async () => {
    const person = await aPerson({ password: null });
    const old = await aLink(person, { purpose: 'invitation' });
    const agent = await asAdministrator();
    const answer = await agent.post(`/api/people/${person.id}/invitations`);
    expect(answer.status).toBe(201);
    expect(personSchema.parse(answer.body).invitedUntil).not.toBeNull();
    await outbox().idle();
    const token = tokenOf(letters.find(({ to }) => to === person.email));
    expect((await agent.get(`/api/links/${old}`)).status).toBe(410);
    expect((await agent.get(`/api/links/${token}`)).status).toBe(200);
    const entries = await AuditEntry.findAll({ where: { subjectId: person.id } });
    expect(entries).toMatchObject([{ action: 'renew invitation', personId: administrator.id }]);
    expect(JSON.stringify(entries)).not.toContain(token);
  });

  test('is not for who has a password', async () => {
    const person = await aPerson();
    const agent = await asAdministrator();
    const answer = await agent.post(`/api/people/${person.id}/invitations`);
    expect(answer.status).toBe(409);
    expect(await SingleUseLink.count({ where: { personId: person.id } })).toBe(0);
  });
});

describe.each([
  ['get', '/api/people'],
  ['post', '/api/people'],
  ['get', '/api/people/ID'],
  ['patch', '/api/people/ID'],
  ['post', '/api/people/ID/invitations'],
] as const)('%s %s', (method, path) => {
  const body = { name: 'Changed', email: 'changed@example.org' };

  test('asks for a person', async () => {
    const person = await aPerson({ password: null });
    const agent = await visitor(app());
    const answer = await agent[method](path.replace('ID', person.id)).send(body);
    expect(answer.status).toBe(401);
  });

  test('is not for who is no administrator, whoever it is about', async () => {
    const person = await aMember(await aScheme(), 'designer', 'assessor', 'owner', 'witness');
    const agent = await signIn(app(), person);
    for (const id of [person.id, NOBODY]) {
      const answer = await agent[method](path.replace('ID', id)).send(body);
      expect(answer.status).toBe(403);
    }
    expect(await Person.count({ where: { name: 'Changed' } })).toBe(0);
  });
});

describe.each([
  ['get', '/api/people/ID'],
  ['patch', '/api/people/ID'],
  ['post', '/api/people/ID/invitations'],
] as const)('%s %s', (method, path) => {
  test.each([NOBODY, 'not-an-id'])('does not find the person %s', async (id) => {
    const agent = await asAdministrator();
    const answer = await agent[method](path.replace('ID', id)).send({ name: 'Changed' });
    expect(answer.status).toBe(404);
  });
});
