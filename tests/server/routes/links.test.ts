import { describe, expect, test, vi } from 'vitest';
import { linkSchema } from '../../../shared/schemas/links.ts';
import { sessionSchema } from '../../../shared/schemas/session.ts';
import { linkTokenHash } from '../../../server/authentication/link-token.ts';
import { isRightPassword } from '../../../server/authentication/password-hash.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { SingleUseLink } from '../../../server/models/single-use-link.ts';
import { aLink, aPerson } from '../../support/factories.ts';
import { sessionsOf } from '../../support/sessions-of.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';
import { tokenOf } from '../../support/token-of.ts';

const { app, services, letters } = testApp();
const NEW = 'another wall at high tide';
const PAST = new Date(Date.now() - 1000);

function lettersTo(email: string) {
  return letters.filter(({ to }) => to === email);
}

describe('asking for a new password', () => {
  test('sends a link for an hour, of which only a hash is kept', async () => {
    const person = await aPerson();
    const agent = await visitor(app());
    const answer = await agent.post('/api/password-resets').send({ email: person.email });
    expect(answer.status).toBe(202);
    const [letter] = await vi.waitFor(() => {
      expect(lettersTo(person.email)).toHaveLength(1);
      return lettersTo(person.email);
    });
    const token = tokenOf(letter);
    const [link, ...others] = await SingleUseLink.findAll({ where: { personId: person.id } });
    expect(others).toEqual([]);
    expect(link).toMatchObject({ purpose: 'password-reset', tokenHash: linkTokenHash(token) });
    expect(JSON.stringify(link)).not.toContain(token);
    const life = (link?.expiresAt.getTime() ?? 0) - Date.now();
    expect(life).toBeGreaterThan(59 * 60_000);
    expect(life).toBeLessThanOrEqual(60 * 60_000);
    const entries = await AuditEntry.findAll({ where: { subjectId: person.id } });
    expect(entries).toMatchObject([{ action: 'ask for password reset', personId: null }]);
    expect((await agent.get(`/api/links/${token}`)).status).toBe(200);
  });

  test('answers alike for who is not known or has no password yet, and sends nothing', async () => {
    const known = await aPerson();
    const invited = await aPerson({ password: null });
    const agent = await visitor(app());
    const answers = [];
    for (const email of ['unknown@example.org', invited.email, known.email]) {
      const answer = await agent.post('/api/password-resets').send({ email });
      answers.push({ status: answer.status, body: answer.body as unknown });
    }
    expect(answers[0]).toEqual({ status: 202, body: {} });
    expect(new Set(answers.map((answer) => JSON.stringify(answer))).size).toBe(1);
    await vi.waitFor(() => {
      expect(lettersTo(known.email)).toHaveLength(1);
    });
    expect(lettersTo('unknown@example.org')).toEqual([]);
    expect(lettersTo(invited.email)).toEqual([]);
    expect(await SingleUseLink.count({ where: { personId: invited.id } })).toBe(0);
  });

  test('ends the link of before', async () => {
    const person = await aPerson();
    const token = await aLink(person);
    const agent = await visitor(app());
    await agent.post('/api/password-resets').send({ email: person.email });
    await vi.waitFor(() => {
      expect(lettersTo(person.email)).toHaveLength(1);
    });
    expect((await agent.get(`/api/links/${token}`)).status).toBe(410);
  });

  test('names what is wrong', async () => {
    const agent = await visitor(app());
    const answer = await agent.post('/api/password-resets').send({ email: 'a, b@example.org' });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path: 'email' }] } });
  });

  test('asks for the token of the session', async () => {
    const person = await aPerson();
    const agent = await visitor(app());
    agent.set('X-CSRF-Token', 'wrong');
    const answer = await agent.post('/api/password-resets').send({ email: person.email });
    expect(answer.status).toBe(403);
    expect(await SingleUseLink.count({ where: { personId: person.id } })).toBe(0);
  });
});

describe('opening a link', () => {
  test('says whose it is, without using it', async () => {
    const person = await aPerson({ name: 'Ada Lind', password: null });
    const token = await aLink(person, { purpose: 'invitation' });
    const agent = await visitor(app());
    await agent.get(`/api/links/${token}`);
    const answer = await agent.get(`/api/links/${token}`);
    expect(linkSchema.parse(answer.body)).toEqual({
      purpose: 'invitation',
      email: person.email,
      name: 'Ada Lind',
    });
  });

  test.each(['used', 'too old', 'unknown'])('is refused when it is %s', async (how) => {
    const person = await aPerson();
    const token = await aLink(person, how === 'used' ? { usedAt: PAST } : { expiresAt: PAST });
    const agent = await visitor(app());
    const path = `/api/links/${how === 'unknown' ? 'unknown' : token}`;
    for (const answer of [await agent.get(path), await agent.post(path).send({ password: NEW })]) {
      expect(answer.status).toBe(410);
      expect(answer.body).toMatchObject({ error: { code: 'link-spent' } });
      expect(JSON.stringify(answer.body)).not.toContain(person.email);
    }
    expect(await isRightPassword((await person.reload()).passwordHash, NEW)).toBe(false);
  });
});

describe('using a link', () => {
  test('sets the password, signs in, and is done once', async () => {
    const person = await aPerson({ password: null });
    const token = await aLink(person, { purpose: 'invitation' });
    const agent = await visitor(app());
    const answer = await agent.post(`/api/links/${token}`).send({ password: NEW });
    expect(answer.status).toBe(200);
    const { csrfToken, person: signedIn } = sessionSchema.parse(answer.body);
    expect(signedIn?.id).toBe(person.id);
    expect(await isRightPassword((await person.reload()).passwordHash, NEW)).toBe(true);
    const [link] = await SingleUseLink.findAll({ where: { personId: person.id } });
    expect(link?.usedAt).toBeInstanceOf(Date);
    agent.set('X-CSRF-Token', csrfToken);
    const again = await agent.post(`/api/links/${token}`).send({ password: `${NEW} again` });
    expect(again.status).toBe(410);
    expect(await isRightPassword((await person.reload()).passwordHash, NEW)).toBe(true);
  });

  test.each([
    ['invitation', 'accept invitation'],
    ['password-reset', 'reset password'],
  ] as const)('of %s is in the audit trail, the password is not', async (purpose, action) => {
    const person = await aPerson();
    const token = await aLink(person, { purpose });
    await (await visitor(app())).post(`/api/links/${token}`).send({ password: NEW });
    const entries = await AuditEntry.findAll({ where: { subjectId: person.id } });
    expect(entries).toMatchObject([{ action, personId: person.id, before: null, after: null }]);
  });

  test('ends the sessions and other links of before', async () => {
    const person = await aPerson();
    const there = await signIn(app(), person);
    const [token, other] = [await aLink(person), await aLink(person, { purpose: 'invitation' })];
    const here = await visitor(app());
    await here.post(`/api/links/${token}`).send({ password: NEW });
    expect((await here.get('/api/session')).body).toMatchObject({ person: { id: person.id } });
    expect((await there.get('/api/session')).body).toMatchObject({ person: null });
    expect((await here.get(`/api/links/${other}`)).status).toBe(410);
  });

  test('signs in whose link it is, whoever was signed in', async () => {
    const [person, other] = [await aPerson(), await aPerson()];
    const agent = await signIn(app(), other);
    const answer = await agent.post(`/api/links/${await aLink(person)}`).send({ password: NEW });
    expect(answer.body).toMatchObject({ person: { id: person.id } });
    expect(await sessionsOf(services(), other)).toEqual([]);
  });

  test('by two at once is won by one', async () => {
    const person = await aPerson();
    const token = await aLink(person);
    const agents = await Promise.all(Array.from({ length: 4 }, () => visitor(app())));
    const answers = await Promise.all(
      agents.map((agent, index) =>
        agent.post(`/api/links/${token}`).send({ password: `${NEW} ${index}` }),
      ),
    );
    const won = answers.findIndex(({ status }) => status === 200);
    const statuses = answers.map(({ status }) => status).sort();
    expect(statuses).toEqual([200, 410, 410, 410]);
    expect(await isRightPassword((await person.reload()).passwordHash, `${NEW} ${won}`)).toBe(true);
    expect(await AuditEntry.count({ where: { subjectId: person.id } })).toBe(1);
  });

  test.each([
    ['a short password', 'elevenchars'],
    ['a long password', 'x'.repeat(201)],
    ['the address', ' Own-Address@example.org'],
    ['none', undefined],
  ])('does not take %s, and the link stays', async (_what, password) => {
    const person = await aPerson({ email: 'own-address@example.org' });
    const token = await aLink(person);
    const agent = await visitor(app());
    const answer = await agent.post(`/api/links/${token}`).send({ password });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path: 'password' }] } });
    expect((await agent.get(`/api/links/${token}`)).status).toBe(200);
    await SingleUseLink.destroy({ where: { personId: person.id } });
    await person.destroy();
  });

  test('asks for the token of the session', async () => {
    const token = await aLink(await aPerson());
    const agent = await visitor(app());
    agent.set('X-CSRF-Token', 'wrong');
    expect((await agent.post(`/api/links/${token}`).send({ password: NEW })).status).toBe(403);
    expect((await agent.get(`/api/links/${token}`)).status).toBe(200);
  });
});
