import { QueryTypes } from 'sequelize';
import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { createMailer } from '../../../server/mail/mailer.ts';
import { sendWaiting } from '../../../server/mail/send-waiting.ts';
import { startSink, type Behaviour, type Sink } from '../../../server/mail/sink.ts';
import { MailboxLetter } from '../../../server/models/mailbox-letter.ts';
import { insertMails, insertTry } from '../../../server/models/outbox-mails.ts';
import type { Services } from '../../../server/services.ts';
import { SingleUseLink } from '../../../server/models/single-use-link.ts';
import { aPerson, aScheme } from '../../support/factories.ts';
import { testApp } from '../../support/test-app.ts';

const { services } = testApp();
let sink: Sink;
let behaviour: Behaviour = 'keep';

beforeAll(async () => {
  sink = await startSink({ ...services(), behave: () => behaviour });
});

beforeEach(() => {
  behaviour = 'keep';
});

afterAll(async () => {
  await sink.close();
});

function tools(url = sink.url): Services {
  return { ...services(), mailer: createMailer(url, services().env) };
}

async function aMail(recipient: string): Promise<string> {
  const id = crypto.randomUUID();
  const { id: schemeId } = await aScheme();
  const { database } = services();
  await database.transaction((transaction) =>
    insertMails(
      database,
      [{ id, schemeId, recipient, subject: 'About your home', parts: ['Some words.'] }],
      transaction,
    ),
  );
  return id;
}

type Row = {
  readonly state: string;
  readonly again: boolean;
  readonly refusals: number;
  readonly words: string | null;
  readonly later: boolean;
};

async function stateOf(id: string): Promise<Row | undefined> {
  const [row] = await services().database.query<Row>(
    `select state, was_sent_again as again, refusals, server_words as words,
       next_try_at > now() as later from outbox where id = $1`,
    { type: QueryTypes.SELECT, bind: [id] },
  );
  return row;
}

async function due(id: string): Promise<void> {
  await services().database.query('update outbox set next_try_at = now() where id = $1', {
    bind: [id],
  });
}

function inMailbox(recipient: string): Promise<number> {
  return MailboxLetter.count({ where: { recipient } });
}

test('a mail is handed over once, and a second call for it does nothing', async () => {
  const id = await aMail('once@example.org');
  expect(await sendWaiting(tools(), id)).toBeNull();
  expect(await sendWaiting(tools(), id)).toBeNull();
  expect(await stateOf(id)).toMatchObject({ state: 'sent', again: false });
  expect(await inMailbox('once@example.org')).toBe(1);
});

test('of two who have it in hand at once one sends', async () => {
  const id = await aMail('two@example.org');
  behaviour = { delay: 200 };
  await Promise.all([sendWaiting(tools(), id), sendWaiting(tools(), id)]);
  const [row] = await services().database.query<{ tries: number }>(
    'select count(*)::integer as tries from outbox_tries where mail_id = $1',
    { type: QueryTypes.SELECT, bind: [id] },
  );
  expect(row?.tries).toBe(1);
});

test('a try that a stop left without an answer is made again under its own number, and says so', async () => {
  const id = await aMail('stopped@example.org');
  await insertTry(services().database, id, 1);
  await sendWaiting(tools(), id);
  expect(await stateOf(id)).toMatchObject({ state: 'sent', again: true });
  const kept = await MailboxLetter.findOne({ where: { recipient: 'stopped@example.org' } });
  expect(kept?.messageId).toBe(`<${id}@example.org>`);
});

test('what the server took in before it hung up goes again and shows once', async () => {
  const id = await aMail('dropped@example.org');
  behaviour = 'drop';
  expect(await sendWaiting(tools(), id)).toHaveProperty('nextTryAt', expect.any(Date));
  expect(await stateOf(id)).toMatchObject({ state: 'waiting', later: true });
  behaviour = 'keep';
  await due(id);
  await sendWaiting(tools(), id);
  expect(await stateOf(id)).toMatchObject({ state: 'sent', again: true });
  expect(await inMailbox('dropped@example.org')).toBe(1);
});

test('a refusal for now is tried again later, not sooner, and at last given up with the server’s words', async () => {
  const id = await aMail('later@example.org');
  behaviour = { refuse: 451, words: 'Mailbox is busy' };
  expect(await sendWaiting(tools(), id)).toHaveProperty('nextTryAt', expect.any(Date));
  expect(await sendWaiting(tools(), id)).toBeNull();
  expect(await stateOf(id)).toMatchObject({ state: 'waiting', refusals: 1, later: true });
  for (let k = 0; k < 7; k += 1) {
    await due(id);
    await sendWaiting(tools(), id);
  }
  expect(await stateOf(id)).toMatchObject({ state: 'failed', again: false });
  expect((await stateOf(id))?.words).toContain('Mailbox is busy');
});

test('a refusal for good is shown with the server’s words at once', async () => {
  const id = await aMail('nobody@example.org');
  behaviour = { refuse: 550, words: 'No such mailbox here' };
  await sendWaiting(tools(), id);
  expect(await stateOf(id)).toMatchObject({ state: 'failed', words: '550 No such mailbox here' });
  expect(await inMailbox('nobody@example.org')).toBe(0);
});

test('a server that cannot be reached had nothing, so the mail is not told of as sent again', async () => {
  const id = await aMail('unreached@example.org');
  await sendWaiting(tools('smtp://127.0.0.1:1'), id);
  await due(id);
  await sendWaiting(tools(), id);
  expect(await stateOf(id)).toMatchObject({ state: 'sent', again: false });
});

test('tries and answers stay as they were written', async () => {
  const id = await aMail('kept@example.org');
  await sendWaiting(tools(), id);
  const { database } = services();
  for (const table of ['outbox_tries', 'outbox_answers']) {
    await expect(database.query(`delete from ${table}`)).rejects.toThrow();
  }
});

test('a letter of an account whose link has ended is not sent any more', async () => {
  const { database } = services();
  for (const over of [{ usedAt: new Date() }, { expiresAt: new Date(Date.now() - 1000) }]) {
    const { id: personId } = await aPerson();
    const expiresAt = new Date(Date.now() + 60_000);
    const ofLink = { personId, purpose: 'password-reset', expiresAt } as const;
    const link = await SingleUseLink.create({ ...ofLink, tokenHash: personId, ...over });
    const id = crypto.randomUUID();
    const mail = { id, schemeId: null, recipient: 'ended@example.org', linkId: link.id };
    await database.transaction((transaction) =>
      insertMails(database, [{ ...mail, subject: 'A new password', parts: ['Ada,'] }], transaction),
    );
    expect(await sendWaiting(tools(), id)).toBeNull();
    const words = 'Its link ended before it was sent.';
    expect(await stateOf(id)).toMatchObject({ state: 'failed', words });
  }
  expect(await inMailbox('ended@example.org')).toBe(0);
});

test('a mail of no scheme is of a link, and neither carries a letter nor concerns a party', async () => {
  const { database } = services();
  const mail = { id: crypto.randomUUID(), schemeId: null, recipient: 'none@example.org' };
  const put = database.transaction((transaction) =>
    insertMails(database, [{ ...mail, subject: 'No', parts: ['No.'] }], transaction),
  );
  await expect(put).rejects.toThrow();
});
