import { expect, test } from 'vitest';
import { passwordResetMail } from '../../../../server/mail/letters/password-reset.ts';
import { renderLetter } from '../../../../server/mail/render-letter.ts';

const LINK = { id: '1', until: new Date('2026-06-01T09:05:00Z') };

test.each(['text', 'html'] as const)(
  'says as %s what to do, until when and what if not',
  (kind) => {
    const mail = passwordResetMail({ name: '<b>Ada', email: 'ada@example.org' }, LINK);
    const { recipient: to, subject, parts } = mail;
    const letter = renderLetter({ id: '1', to, subject }, parts);
    expect(letter).toMatchObject({
      to: 'ada@example.org',
      subject: 'A new password for Groundsill',
    });
    for (const part of [
      'Choose a new password',
      'once, until 1 June 2026 at 09:05 UTC',
      'If it was not you, do nothing',
    ]) {
      expect(letter[kind]).toContain(part);
    }
    expect(letter.html).not.toContain('<b>');
  },
);
