import request from 'supertest';
import { describe, expect, test } from 'vitest';
import { sessionSchema } from '../../../shared/schemas/session.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Person } from '../../../server/models/person.ts';
import { cookieOf } from '../../support/cookie-of.ts';
import { anAdministrator, aPerson } from '../../support/factories.ts';
import { sessionsOf } from '../../support/sessions-of.ts';
import { signIn } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app, services } = testApp();

describe('signing out everywhere', () => {
  test('ends every session of the person, and of nobody else', async () => {
    const [person, other] = [await aPerson(), await aPerson()];
    const [here, there] = [await signIn(app(), person), await signIn(app(), person)];
    const others = await signIn(app(), other);
    const answer = await here.delete('/api/sessions');
    expect(answer.status).toBe(200);
    expect(sessionSchema.parse(answer.body).person).toBeNull();
    for (const agent of [here, there]) {
      expect((await agent.get('/api/session')).body).toMatchObject({ person: null });
      expect((await agent.get('/api/people')).status).toBe(401);
    }
    expect((await others.get('/api/session')).body).toMatchObject({ person: { id: other.id } });
  });

  test('moves the time from which sessions count, and is in the audit trail', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    const before = Date.now();
    await agent.delete('/api/sessions');
    const { sessionsValidFrom } = await person.reload();
    expect(sessionsValidFrom.getTime()).toBeGreaterThanOrEqual(before);
    const entries = await AuditEntry.findAll({ where: { subjectId: person.id } });
    expect(entries).toMatchObject([{ action: 'sign out everywhere', personId: person.id }]);
  });

  test('does not bar the way back', async () => {
    const person = await aPerson();
    await (await signIn(app(), person)).delete('/api/sessions');
    const agent = await signIn(app(), person);
    expect((await agent.get('/api/session')).body).toMatchObject({ person: { id: person.id } });
  });
});

describe('a session that goes on', () => {
  test('loses rights as soon as they are taken', async () => {
    const person = await anAdministrator();
    const agent = await signIn(app(), person);
    expect((await agent.get('/api/people')).status).toBe(200);
    await person.update({ isAdministrator: false });
    expect((await agent.get('/api/people')).status).toBe(403);
    await person.update({ isAdministrator: true });
    expect((await agent.get('/api/people')).status).toBe(200);
  });

  test('bears the name of now', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    await person.update({ name: 'Another' });
    expect((await agent.get('/api/session')).body).toMatchObject({ person: { name: 'Another' } });
  });

  test('is nobody’s when the person is gone', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    await Person.destroy({ where: { id: person.id } });
    expect((await agent.get('/api/session')).body).toMatchObject({ person: null });
  });

  test('is nobody’s without the time of signing in', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    await services().database.query(
      `update sessions set sess = (sess::jsonb - 'signedInAt')::json where sess #>> '{passport,user}' = $id`,
      { bind: { id: person.id } },
    );
    expect((await agent.get('/api/session')).body).toMatchObject({ person: null });
  });

  test('is nobody’s when its time is over', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    await services().database.query(
      `update sessions set expire = now() - interval '1 second' where sess #>> '{passport,user}' = $id`,
      { bind: { id: person.id } },
    );
    expect((await agent.get('/api/session')).body).toMatchObject({ person: null });
  });

  test('cannot be made up: the cookie is signed', async () => {
    const person = await aPerson();
    await signIn(app(), person);
    const [session] = await sessionsOf(services(), person);
    const forged = `groundsill=s%3A${session?.sid ?? ''}.${'A'.repeat(43)}`;
    const answer = await request(app()).get('/api/session').set('Cookie', forged);
    expect(answer.body).toMatchObject({ person: null });
    expect(cookieOf(answer)).not.toContain(session?.sid);
  });
});
