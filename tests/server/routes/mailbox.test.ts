import { beforeAll, describe, expect, test } from 'vitest';
import { z } from 'zod';
import { mailboxEntrySchema, mailboxLetterSchema } from '../../../shared/schemas/mailbox.ts';
import { MailboxLetter } from '../../../server/models/mailbox-letter.ts';
import { aMember, anAdministrator, aScheme } from '../../support/factories.ts';
import { signIn, visitor } from '../../support/sign-in.ts';
import { testApp } from '../../support/test-app.ts';

function aLetter(messageId: string): Promise<MailboxLetter> {
  return MailboxLetter.create({
    messageId,
    sender: 'groundsill@example.org',
    recipient: 'ada@example.org',
    subject: `Letter ${messageId}`,
    text: 'Words with a token',
    html: '<p>Words with a token</p>',
  });
}

describe('in the demo', () => {
  const { app } = testApp();
  let letter: MailboxLetter;

  beforeAll(async () => {
    await aLetter('<1>');
    letter = await aLetter('<2>');
  });

  test('the administrator reads what was sent, the newest first', async () => {
    const agent = await signIn(app(), await anAdministrator());
    const answer = await agent.get('/api/mailbox');
    const entries = z.array(mailboxEntrySchema).parse(answer.body);
    expect(entries.map(({ subject }) => subject)).toEqual(['Letter <2>', 'Letter <1>']);
    expect(answer.text).not.toContain('token');
  });

  test('the administrator opens a letter', async () => {
    const agent = await signIn(app(), await anAdministrator());
    const answer = await agent.get(`/api/mailbox/${letter.id}`);
    expect(mailboxLetterSchema.parse(answer.body)).toEqual({
      id: letter.id,
      receivedAt: letter.receivedAt.toISOString(),
      from: 'groundsill@example.org',
      to: 'ada@example.org',
      subject: 'Letter <2>',
      text: 'Words with a token',
      html: '<p>Words with a token</p>',
      attachments: [],
    });
  });

  test.each(['0', '999', '99999999999', 'x', '1.5'])('there is no letter %s', async (id) => {
    const agent = await signIn(app(), await anAdministrator());
    expect((await agent.get(`/api/mailbox/${id}`)).status).toBe(404);
  });

  test('others read nothing, not even their own letters', async () => {
    const person = await aMember(await aScheme(), 'designer', 'assessor', 'owner', 'witness');
    await person.update({ email: 'ada@example.org' });
    const agent = await signIn(app(), person);
    for (const path of ['/api/mailbox', `/api/mailbox/${letter.id}`, '/api/mailbox/999']) {
      expect((await agent.get(path)).status).toBe(403);
      expect((await (await visitor(app())).get(path)).status).toBe(401);
    }
  });
});

describe('outside the demo', () => {
  const { app } = testApp({ env: { DEMO: 'false' } });

  test('there is no mailbox', async () => {
    const letter = await aLetter('<3>');
    const agent = await signIn(app(), await anAdministrator());
    for (const path of ['/api/mailbox', `/api/mailbox/${letter.id}`]) {
      expect((await agent.get(path)).status).toBe(404);
    }
    expect((await agent.get('/api/session')).body).toMatchObject({ demo: false });
  });
});
