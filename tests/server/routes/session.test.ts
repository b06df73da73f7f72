import * as argon2 from '@node-rs/argon2';
import request from 'supertest';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import { sessionSchema } from '../../../shared/schemas/session.ts';
import { cookieOf } from '../../support/cookie-of.ts';
import { aPerson, PASSWORD } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { sessionsOf } from '../../support/sessions-of.ts';
import { testApp } from '../../support/test-app.ts';

vi.mock('@node-rs/argon2', { spy: true });

const { app, services } = testApp();

beforeEach(() => {
  vi.clearAllMocks();
});

describe('reading the session', () => {
  test('a visitor gets a token and nobody', async () => {
    const answer = await request(app()).get('/api/session');
    expect(answer.status).toBe(200);
    expect(sessionSchema.parse(answer.body)).toMatchObject({ person: null, demo: true });
  });

  test('the token stays the same while nobody signs in', async () => {
    const agent = await visitor(app());
    const [first, second] = [await agent.get('/api/session'), await agent.get('/api/session')];
    expect(first.body).toEqual(second.body);
  });

  test('a person gets who they are, and no more', async () => {
    const person = await aPerson({ name: 'Ada Lind', isAdministrator: true });
    const agent = await signIn(app(), person);
    const answer = await agent.get('/api/session');
    const { id, email } = person;
    expect(sessionSchema.parse(answer.body).person).toEqual({
      id,
      email,
      name: 'Ada Lind',
      isAdministrator: true,
    });
  });

  test('is kept from caches of others by a cookie out of reach of scripts', async () => {
    const answer = await request(app()).get('/api/session');
    expect(cookieOf(answer)).toMatch(/^groundsill-visitor=.*HttpOnly; SameSite=Lax$/);
    expect(answer.headers['cache-control']).toBe('no-store');
  });

  test('leaves nothing behind for who is not signed in', async () => {
    const count = 'select count(*)::int as rows from sessions';
    const [before] = await services().database.query(count);
    await request(app()).get('/api/session');
    await visitor(app());
    expect(await services().database.query(count)).toMatchObject([before, {}]);
  });

  test('gives a visitor one token, and no other visitor the same', async () => {
    const [one, other] = [request.agent(app()), request.agent(app())];
    const tokens = [];
    for (const agent of [one, one, other]) {
      tokens.push(sessionSchema.parse((await agent.get('/api/session')).body).csrfToken);
    }
    expect(tokens[0]).toBe(tokens[1]);
    expect(tokens[0]).not.toBe(tokens[2]);
    const body = { email: 'nobody@example.org', password: 'x' };
    const forged = await one
      .post('/api/session')
      .set('X-CSRF-Token', tokens[2] ?? '')
      .send(body);
    expect(forged.body).toMatchObject({ error: { code: 'csrf-failed' } });
  });
});

describe('signing in', () => {
  test('keeps who it is in the database', async () => {
    const person = await aPerson();
    const before = Date.now();
    await signIn(app(), person);
    const [session, ...others] = await sessionsOf(services(), person);
    expect(others).toEqual([]);
    expect(session?.sess.signedInAt).toBeGreaterThanOrEqual(before);
  });

  test('takes capitals in the address for small letters', async () => {
    const person = await aPerson({ email: 'mixed@example.org' });
    await expect(signIn(app(), { email: ' Mixed@Example.ORG ' })).resolves.toBeDefined();
    expect(await sessionsOf(services(), person)).toHaveLength(1);
  });

  test.each([
    [{ email: 'nobody', password: PASSWORD }, 'email'],
    [{ email: 'a@example.org', password: '' }, 'password'],
    [{ email: 'a@example.org', password: 'x'.repeat(201) }, 'password'],
    [{ email: 'a@example.org', password: ['x'] }, 'password'],
    [{ email: 'a@example.org' }, 'password'],
  ])('names what is wrong in %j', async (body, path) => {
    const agent = await visitor(app());
    const answer = await agent.post('/api/session').send(body);
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { code: 'invalid-input', fields: [{ path }] } });
    expect(argon2.verify).not.toHaveBeenCalled();
  });

  test('answers alike and works as hard whatever is wrong', async () => {
    const { email } = await aPerson();
    const { email: invited } = await aPerson({ password: null });
    const answers = [];
    for (const wrong of [email, invited, 'unknown@example.org']) {
      vi.mocked(argon2.verify).mockClear();
      const agent = await visitor(app());
      const answer = await agent.post('/api/session').send({ email: wrong, password: 'not right' });
      expect(argon2.verify).toHaveBeenCalledTimes(1);
      answers.push({ status: answer.status, body: answer.body as unknown });
    }
    expect(answers[0]).toMatchObject({
      status: 401,
      body: { error: { code: 'wrong-credentials', fields: [] } },
    });
    expect(answers[1]).toEqual(answers[0]);
    expect(answers[2]).toEqual(answers[0]);
  });

  test.each(['unknown@example.org', 'invited@example.org'])(
    'checks a hash of full cost that nobody knows for %s',
    async (email) => {
      if (email.startsWith('invited')) await aPerson({ email, password: null });
      const agent = await visitor(app());
      await agent.post('/api/session').send({ email, password: PASSWORD });
      const [hash] = vi.mocked(argon2.verify).mock.calls[0] ?? [];
      expect(hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    },
  );

  test('lets nobody in by the hash that stands in', async () => {
    const { email } = await aPerson({ password: null });
    for (const known of [email, 'unknown@example.org']) {
      vi.mocked(argon2.verify).mockResolvedValueOnce(true);
      const agent = await visitor(app());
      const answer = await agent.post('/api/session').send({ email: known, password: PASSWORD });
      expect(answer.status).toBe(401);
    }
  });

  test('begins a new session: one planted beforehand stays nobody’s', async () => {
    const person = await aPerson();
    const planted = await request(app()).get('/api/session');
    const { csrfToken } = sessionSchema.parse(planted.body);
    const answer = await request(app())
      .post('/api/session')
      .set('Cookie', cookieOf(planted))
      .set('X-CSRF-Token', csrfToken)
      .send({ email: person.email, password: PASSWORD });
    expect(answer.status).toBe(200);
    expect(sessionSchema.parse(answer.body).csrfToken).not.toBe(csrfToken);
    expect(cookieOf(answer).split(';')[0]).not.toBe(cookieOf(planted).split(';')[0]);
    const planter = await request(app()).get('/api/session').set('Cookie', cookieOf(planted));
    expect(planter.body).toMatchObject({ person: null });
  });

  test('renews the token: the old one is refused', async () => {
    const person = await aPerson();
    const agent = await visitor(app());
    await agent.post('/api/session').send({ email: person.email, password: PASSWORD });
    expect((await agent.delete('/api/session')).status).toBe(403);
    expect(await sessionsOf(services(), person)).toHaveLength(1);
  });

  test.each([undefined, '', 'wrong', 'x'.repeat(32)])(
    'is refused with the token %j',
    async (token) => {
      const person = await aPerson();
      const begun = await request(app()).get('/api/session');
      const tried = request(app()).post('/api/session').set('Cookie', cookieOf(begun));
      if (token !== undefined) void tried.set('X-CSRF-Token', token);
      const answer = await tried.send({ email: person.email, password: PASSWORD });
      expect(answer.status).toBe(403);
      expect(answer.body).toMatchObject({ error: { code: 'csrf-failed' } });
      expect(argon2.verify).not.toHaveBeenCalled();
      expect(await sessionsOf(services(), person)).toEqual([]);
    },
  );

  test('is refused without a session to hold the token against', async () => {
    const answer = await request(app()).post('/api/session').set('X-CSRF-Token', 'undefined');
    expect(answer.status).toBe(403);
  });
});

describe('signing out', () => {
  test('ends the session in the database, and the cookie is nobody’s', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    const cookie = cookieOf(await agent.get('/api/session'));
    const answer = await agent.delete('/api/session');
    expect(answer.status).toBe(200);
    expect(sessionSchema.parse(answer.body).person).toBeNull();
    expect(await sessionsOf(services(), person)).toEqual([]);
    const again = await request(app()).get('/api/session').set('Cookie', cookie);
    expect(again.body).toMatchObject({ person: null });
  });

  test('leaves the other sessions', async () => {
    const person = await aPerson();
    const [here, there] = [await signIn(app(), person), await signIn(app(), person)];
    await here.delete('/api/session');
    expect((await there.get('/api/session')).body).toMatchObject({ person: { id: person.id } });
  });

  test.each(['/api/session', '/api/sessions'])('asks for a person at %s', async (path) => {
    const agent = await visitor(app());
    expect((await agent.delete(path)).status).toBe(401);
  });
});
