import nodemailer from 'nodemailer';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { createMailer, type Mailer } from '../../../server/mail/mailer.ts';
import { renderLetter } from '../../../server/mail/render-letter.ts';
import { startSink, type Sink } from '../../../server/mail/sink.ts';
import { MailboxLetter } from '../../../server/models/mailbox-letter.ts';
import { testApp } from '../../support/test-app.ts';

const { services } = testApp();
let sink: Sink;
let mailer: Mailer;

beforeAll(async () => {
  sink = await startSink(services());
  mailer = createMailer(sink.url, services().env);
});

afterAll(async () => {
  await sink.close();
});

function letter(id: string, subject = 'A letter', words = 'Some words, 4 °C, ≤ 5 mm.') {
  return renderLetter({ id, to: 'ada@example.org', subject }, [words]);
}

describe('the mailbox', () => {
  test('listens on this machine only', () => {
    expect(sink.url).toMatch(/^smtp:\/\/127\.0\.0\.1:\d+$/);
  });

  test('keeps what is sent', async () => {
    await mailer.send(letter('one'));
    const kept = await MailboxLetter.findOne({ where: { messageId: '<one@example.org>' } });
    expect(kept).toMatchObject({
      sender: '"Groundsill" <groundsill@example.org>',
      recipient: 'ada@example.org',
      subject: 'A letter',
      text: 'Some words, 4 °C, ≤ 5 mm.\n',
    });
    expect(kept?.html).toContain('<p>Some words, 4 °C, ≤ 5 mm.</p>');
  });

  test('drops a letter that comes again', async () => {
    await mailer.send(letter('twice', 'The first'));
    await mailer.send(letter('twice', 'The second'));
    const kept = await MailboxLetter.findAll({ where: { messageId: '<twice@example.org>' } });
    expect(kept.map(({ subject }) => subject)).toEqual(['The first']);
  });

  test('gets no header out of a name', async () => {
    const evil = 'Dogger\r\nBcc: eve@example.org\r\n\r\nHello';
    await mailer.send({ ...letter('evil'), subject: evil });
    const kept = await MailboxLetter.findOne({ where: { messageId: '<evil@example.org>' } });
    expect(kept?.subject).toContain('Dogger Bcc: eve@example.org');
    expect(kept?.recipient).toBe('ada@example.org');
    expect(kept?.text).not.toContain('Hello');
  });

  test('makes no second recipient out of an address', async () => {
    const to = 'ada@example.org, eve@example.org';
    await mailer.send({ ...letter('list'), to }).catch(() => undefined);
    const kept = await MailboxLetter.findOne({ where: { messageId: '<list@example.org>' } });
    expect(kept?.recipient ?? '').not.toMatch(/(^|[\s<])eve@example\.org/);
  });

  test('takes letters of others, without Message-ID and html', async () => {
    const transport = nodemailer.createTransport(sink.url);
    await transport.sendMail({
      envelope: { from: 'x@example.org', to: 'y@example.org' },
      raw: 'From: x@example.org\r\nTo: y@example.org\r\n\r\nBare words',
    });
    const kept = await MailboxLetter.findOne({ where: { sender: 'x@example.org' } });
    expect(kept).toMatchObject({ subject: '', text: 'Bare words\n', html: null });
  });

  test('refuses what is too large', async () => {
    const large = letter('large', 'Large', 'x'.repeat(3 * 1024 * 1024));
    await expect(mailer.send(large)).rejects.toThrow();
    expect(await MailboxLetter.count({ where: { subject: 'Large' } })).toBe(0);
  });
});
