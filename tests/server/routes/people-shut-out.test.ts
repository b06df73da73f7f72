import { beforeAll, describe, expect, test } from 'vitest';
import { personSchema } from '../../../shared/schemas/people.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { findInvitedOutside } from '../../../server/models/find-scheme-states.ts';
import { Membership } from '../../../server/models/membership.ts';
import { Person } from '../../../server/models/person.ts';
import { SingleUseLink } from '../../../server/models/single-use-link.ts';
import {
  aLink,
  aMember,
  anAdministrator,
  aPerson,
  aScheme,
  PASSWORD,
} from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { UNKNOWN_ID } from '../../support/unknown-ids.ts';

const { app, services, letters } = testApp();
let administrator: Person;

beforeAll(async () => {
  administrator = await anAdministrator();
});

function asAdministrator() {
  return signIn(app(), administrator);
}

async function setShutOut(person: Person, shutOut: unknown) {
  return (await asAdministrator()).put(`/api/people/${person.id}/shut-out`).send({ shutOut });
}

async function openLinks({ id }: Person): Promise<number> {
  return SingleUseLink.count({ where: { personId: id, usedAt: null } });
}

async function actionsOn({ id }: Person): Promise<string[]> {
  const entries = await AuditEntry.findAll({ where: { subjectId: id }, order: ['id'] });
  return entries.map(({ action }) => action);
}

describe('shutting a person out', () => {
  test('ends sessions and links, keeps them from coming in and leaves what they are', async () => {
    const person = await aMember(await aScheme(), 'assessor');
    const token = await aLink(person);
    const agent = await signIn(app(), person);
    const answer = await setShutOut(person, true);
    expect(answer.status).toBe(200);
    expect(personSchema.parse(answer.body)).toMatchObject({
      memberships: [{ role: 'assessor' }],
      abilities: { shutOut: false, readmit: true },
    });
    expect((await person.reload()).shutOutAt).not.toBeNull();
    expect((await agent.get('/api/schemes')).status).toBe(401);
    const again = await visitor(app());
    const credentials = { email: person.email, password: PASSWORD };
    expect((await again.post('/api/session').send(credentials)).status).toBe(401);
    expect((await again.get(`/api/links/${token}`)).status).toBe(410);
    await again.post('/api/password-resets').send({ email: person.email });
    await setShutOut(await aPerson(), true);
    expect(letters.filter(({ to }) => to === person.email)).toEqual([]);
    expect(await openLinks(person)).toBe(0);
    expect(await Membership.count({ where: { personId: person.id } })).toBe(1);
    expect(await actionsOn(person)).toEqual(['shut out person']);
  });

  test('is undone by readmitting, which brings no old session back', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    await setShutOut(person, true);
    expect((await setShutOut(person, false)).status).toBe(200);
    expect((await person.reload()).shutOutAt).toBeNull();
    expect((await agent.get('/api/schemes')).status).toBe(401);
    expect((await (await signIn(app(), person)).get('/api/schemes')).status).toBe(200);
    expect(await actionsOn(person)).toEqual(['shut out person', 'readmit person']);
  });

  test('twice is once', async () => {
    const person = await aPerson();
    await setShutOut(person, true);
    expect((await setShutOut(person, true)).status).toBe(200);
    expect(await actionsOn(person)).toHaveLength(1);
  });

  test('is not for oneself, nor for the last administrator who can sign in', async () => {
    expect((await setShutOut(administrator, true)).status).toBe(409);
    const other = await anAdministrator();
    expect((await setShutOut(administrator, true)).status).toBe(409);
    expect((await setShutOut(other, true)).status).toBe(200);
    const agent = await asAdministrator();
    const mine = await agent
      .patch(`/api/people/${administrator.id}`)
      .send({ isAdministrator: false });
    expect(mine.status).toBe(409);
    expect(await administrator.reload()).toMatchObject({ isAdministrator: true, shutOutAt: null });
  });

  test.each([undefined, 'yes', null])('does not take %j', async (shutOut) => {
    const person = await aPerson();
    expect((await setShutOut(person, shutOut)).status).toBe(422);
    expect((await person.reload()).shutOutAt).toBeNull();
  });
});

describe('withdrawing an invitation', () => {
  test('ends its link and tells the trail', async () => {
    const person = await aPerson({ password: null });
    const token = await aLink(person, { purpose: 'invitation' });
    const { invited: before } = await findInvitedOutside(services().database);
    const answer = await (await asAdministrator()).delete(`/api/people/${person.id}/invitations`);
    expect(answer.status).toBe(200);
    expect(personSchema.parse(answer.body)).toMatchObject({
      invitedUntil: null,
      abilities: { invite: true, withdraw: false },
    });
    expect((await (await visitor(app())).get(`/api/links/${token}`)).status).toBe(410);
    expect(await openLinks(person)).toBe(0);
    expect(await findInvitedOutside(services().database)).toMatchObject({ invited: before - 1 });
    expect(await actionsOn(person)).toEqual(['withdraw invitation']);
  });

  test('comes too late once it has been accepted', async () => {
    const person = await aPerson();
    const answer = await (await asAdministrator()).delete(`/api/people/${person.id}/invitations`);
    expect(answer.body).toMatchObject({ error: { code: 'conflict' } });
    expect(await actionsOn(person)).toEqual([]);
  });
});

describe('the address of somebody who has not accepted', () => {
  test('is corrected, and the link that went to the wrong one ends', async () => {
    const person = await aPerson({ password: null });
    await aLink(person, { purpose: 'invitation' });
    const from = person.email;
    const answer = await (
      await asAdministrator()
    )
      .patch(`/api/people/${person.id}`)
      .send({ email: ' Right@Example.org ' });
    expect(personSchema.parse(answer.body)).toMatchObject({ email: 'right@example.org' });
    expect(await openLinks(person)).toBe(0);
    const [entry] = await AuditEntry.findAll({ where: { subjectId: person.id } });
    expect(entry).toMatchObject({ before: { email: from }, after: { email: 'right@example.org' } });
  });

  test('is not somebody else’s', async () => {
    const [person, other] = [await aPerson({ password: null }), await aPerson()];
    const answer = await (
      await asAdministrator()
    )
      .patch(`/api/people/${person.id}`)
      .send({ email: other.email.toUpperCase() });
    expect(answer.body).toMatchObject({
      error: { code: 'already-exists', fields: [{ path: 'email' }] },
    });
    expect(await Person.findByPk(person.id)).toMatchObject({ email: person.email });
  });
});

describe.each([
  ['put', '/api/people/ID/shut-out', { shutOut: true }],
  ['delete', '/api/people/ID/invitations', {}],
] as const)('%s %s', (method, path, body) => {
  test('asks for a person, and an administrator', async () => {
    const person = await aPerson({ password: null });
    await aLink(person, { purpose: 'invitation' });
    const address = path.replace('ID', person.id);
    expect((await (await visitor(app()))[method](address).send(body)).status).toBe(401);
    const member = await signIn(app(), await aMember(await aScheme(), 'designer', 'assessor'));
    expect((await member[method](address).send(body)).status).toBe(403);
    expect(await person.reload()).toMatchObject({ shutOutAt: null });
    expect(await openLinks(person)).toBe(1);
  });

  test.each([UNKNOWN_ID, 'not-an-id'])('does not find the person %s', async (id) => {
    const answer = await (await asAdministrator())[method](path.replace('ID', id)).send(body);
    expect(answer.status).toBe(404);
  });
});
