import { literal } from 'sequelize';
import { beforeEach, expect, test, vi } from 'vitest';
import { inviteFirstAdministrator } from '../../../server/commands/invite-first-administrator.ts';
import { AuditEntry } from '../../../server/models/audit-entry.ts';
import { Person } from '../../../server/models/person.ts';
import { aPerson, anAdministrator } from '../../support/factories.ts';
import { visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

const { app, services, letters, outbox } = testApp();
const CHIEF = { email: 'chief@example.org', name: 'Chief' };

/** Whoever is there from the tests before is nobody: what the audit trail names cannot be taken away. */
beforeEach(async () => {
  await Person.update({ isAdministrator: false }, { where: {} });
  await Person.update({ email: literal(`id || '@example.org'`) }, { where: {} });
});

function chiefs(): Promise<number> {
  return Person.count({ where: { isAdministrator: true } });
}

async function invitedAt(): Promise<string> {
  const invited = await inviteFirstAdministrator(services(), CHIEF);
  if (invited.state !== 'invited') throw new Error(`Nobody was invited: ${invited.state}`);
  return new URL(invited.url).pathname;
}

async function statusOf(path: string): Promise<number> {
  return (await (await visitor(app())).get(`/api${path}`)).status;
}

test('asks somebody in, who chooses a password and is administrator', async () => {
  const path = await invitedAt();
  await outbox().idle();
  expect(letters.at(-1)).toMatchObject({ to: CHIEF.email, subject: 'Invitation to Groundsill' });
  expect(letters.at(-1)?.text).toContain(path);
  const [entry] = await AuditEntry.findAll({ order: [['id', 'desc']], limit: 1 });
  expect(entry).toMatchObject({ action: 'invite person', personId: null });
  const agent = await visitor(app());
  const answer = await agent.post(`/api${path}`).send({ password: 'the sea at half past four' });
  expect(answer.body).toMatchObject({ person: { ...CHIEF, isAdministrator: true } });
  expect(await inviteFirstAdministrator(services(), CHIEF)).toEqual({ state: 'there' });
});

test('makes a new link when asked again, and the old one ends', async () => {
  const [first, second] = [await invitedAt(), await invitedAt()];
  expect([await statusOf(first), await statusOf(second)]).toEqual([410, 200]);
  expect(await chiefs()).toBe(1);
  expect(await inviteFirstAdministrator(services())).toEqual({
    state: 'awaited',
    email: CHIEF.email,
  });
});

test('of two at once makes one person', async () => {
  await Promise.all([invitedAt(), invitedAt()]);
  expect(await chiefs()).toBe(1);
});

test('says so where nobody is there and nobody is named', async () => {
  expect(await inviteFirstAdministrator(services())).toEqual({ state: 'missing' });
  await aPerson();
  expect(await inviteFirstAdministrator(services())).toEqual({ state: 'missing' });
});

test('leaves everything alone where an administrator can sign in', async () => {
  await anAdministrator();
  expect(await inviteFirstAdministrator(services(), CHIEF)).toEqual({ state: 'there' });
  expect(await chiefs()).toBe(1);
});

test('gives somebody who is there the rights', async () => {
  const person = await aPerson({ email: 'Chief@example.org' });
  const done = await inviteFirstAdministrator(services(), CHIEF);
  expect(done).toEqual({ state: 'promoted', email: 'Chief@example.org' });
  expect(await person.reload()).toMatchObject({ isAdministrator: true });
});

test('gives the link where the letter cannot be sent yet', async () => {
  vi.spyOn(services().mailer, 'send').mockRejectedValueOnce(new Error('no mail server'));
  const invited = await inviteFirstAdministrator(services(), CHIEF);
  await outbox().idle();
  expect(invited).toMatchObject({ state: 'invited', email: CHIEF.email });
  expect(invited).toHaveProperty('url', expect.stringContaining('/links/'));
});
