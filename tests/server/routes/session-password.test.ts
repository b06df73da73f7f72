import * as argon2 from '@node-rs/argon2';
import { describe, expect, test, vi } from 'vitest';
import { isRightPassword } from '../../../server/authentication/password-hash.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import type { Person } from '../../../server/models/person.ts';
import { sessionSchema } from '../../../shared/schemas/session.ts';
import { aLink, aPerson, PASSWORD } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

vi.mock('@node-rs/argon2', { spy: true });

const { app } = testApp();
const NEW = 'another wall at high tide';

/** A gate that opens when two stand before it. */
function bothHaveCome(): () => Promise<void> {
  let open: () => void = () => undefined;
  const opened = new Promise<void>((resolve) => {
    open = resolve;
  });
  let waiting = 0;
  return () => {
    waiting += 1;
    if (waiting === 2) open();
    return opened;
  };
}

async function isPasswordOf(person: Person, password: string): Promise<boolean> {
  return isRightPassword((await person.reload()).passwordHash, password);
}

describe('changing the password', () => {
  test('keeps a hash of argon2id, and the person goes on with a new token', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    const answer = await agent
      .put('/api/session/password')
      .send({ currentPassword: PASSWORD, newPassword: NEW });
    expect(answer.status).toBe(200);
    const session = sessionSchema.parse(answer.body);
    expect(session.person?.id).toBe(person.id);
    expect(await isPasswordOf(person, NEW)).toBe(true);
    expect(person.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect((await agent.delete('/api/session')).status).toBe(403);
    agent.set('X-CSRF-Token', session.csrfToken);
    expect((await agent.delete('/api/session')).status).toBe(200);
  });

  test('ends the other sessions and open links', async () => {
    const person = await aPerson();
    const token = await aLink(person);
    const [here, there] = [await signIn(app(), person), await signIn(app(), person)];
    await here.put('/api/session/password').send({ currentPassword: PASSWORD, newPassword: NEW });
    expect((await here.get('/api/session')).body).toMatchObject({ person: { id: person.id } });
    expect((await there.get('/api/session')).body).toMatchObject({ person: null });
    expect((await here.get(`/api/links/${token}`)).status).toBe(410);
    await expect(signIn(app(), person, PASSWORD)).rejects.toThrow('401');
    await expect(signIn(app(), person, NEW)).resolves.toBeDefined();
  });

  test('is in the audit trail, the password is not', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    await agent.put('/api/session/password').send({ currentPassword: PASSWORD, newPassword: NEW });
    const entries = await AuditEntry.findAll({ where: { subjectId: person.id } });
    expect(entries).toMatchObject([
      { action: 'change password', personId: person.id, before: null, after: null },
    ]);
  });

  test.each([
    ['a wrong one', { currentPassword: 'not right', newPassword: NEW }, 'currentPassword'],
    ['a short one', { currentPassword: PASSWORD, newPassword: 'elevenchars' }, 'newPassword'],
    ['a long one', { currentPassword: PASSWORD, newPassword: 'x'.repeat(201) }, 'newPassword'],
    ['none', { currentPassword: PASSWORD }, 'newPassword'],
    [
      'the address',
      { currentPassword: PASSWORD, newPassword: 'Own-Address@example.org' },
      'newPassword',
    ],
  ])('does not take %s', async (_what, body, path) => {
    const person = await aPerson({ email: `own-address@example.org` });
    const agent = await signIn(app(), person);
    const answer = await agent.put('/api/session/password').send(body);
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { fields: [{ path }] } });
    expect(await isPasswordOf(person, PASSWORD)).toBe(true);
    expect((await agent.get('/api/session')).body).toMatchObject({ person: { id: person.id } });
    await person.destroy();
  });

  test.each([12, 200])('takes one of %i characters', async (length) => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    const newPassword = 'mølle og å, '.repeat(17).slice(0, length - 1) + 'ø';
    const answer = await agent
      .put('/api/session/password')
      .send({ currentPassword: PASSWORD, newPassword });
    expect(answer.status).toBe(200);
    expect(await isPasswordOf(person, newPassword)).toBe(true);
  });

  test.each([
    ['Password-2026', /one of the first/],
    [PASSWORD, /another one than you have/],
  ])('does not take "%s"', async (newPassword, words) => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    const answer = await agent
      .put('/api/session/password')
      .send({ currentPassword: PASSWORD, newPassword });
    const message = expect.stringMatching(words) as string;
    expect(answer.body).toMatchObject({ error: { fields: [{ path: 'newPassword', message }] } });
    expect(await isPasswordOf(person, PASSWORD)).toBe(true);
  });

  test('does not take the name of the e-mail address in it', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    const newPassword = `the gate of ${person.email.replace('@example.org', '')}`;
    const answer = await agent
      .put('/api/session/password')
      .send({ currentPassword: PASSWORD, newPassword });
    expect(answer.status).toBe(422);
  });

  test('is done by one of two at once', async () => {
    const person = await aPerson();
    const agents = [await signIn(app(), person), await signIn(app(), person)];
    const passed = bothHaveCome();
    const { hash } = await vi.importActual<typeof argon2>('@node-rs/argon2');
    vi.mocked(argon2.hash).mockImplementation(async (password, options) => {
      await passed();
      return hash(password, options);
    });
    const answers = await Promise.all(
      agents.map((agent, index) =>
        agent
          .put('/api/session/password')
          .send({ currentPassword: PASSWORD, newPassword: `${NEW} ${index}` }),
      ),
    );
    vi.mocked(argon2.hash).mockReset();
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const won = answers.findIndex(({ status }) => status === 200);
    expect(await isPasswordOf(person, `${NEW} ${won}`)).toBe(true);
  });

  test('asks for a person', async () => {
    const agent = await visitor(app());
    const answer = await agent
      .put('/api/session/password')
      .send({ currentPassword: PASSWORD, newPassword: NEW });
    expect(answer.status).toBe(401);
  });

  test('asks for the token', async () => {
    const person = await aPerson();
    const agent = await signIn(app(), person);
    agent.set('X-CSRF-Token', 'wrong');
    const answer = await agent
      .put('/api/session/password')
      .send({ currentPassword: PASSWORD, newPassword: NEW });
    expect(answer.status).toBe(403);
    expect(await isPasswordOf(person, PASSWORD)).toBe(true);
  });
});
