import { expect, test } from 'vitest';
import { passwordResetLetter } from '../../../../server/mail/letters/password-reset.ts';

const LINK = {
  id: '1',
  url: 'http://127.0.0.1:4600/links/abc',
  until: new Date('2026-06-01T09:05:00Z'),
};

test.each(['text', 'html'] as const)(
  'says as %s what to do, until when and what if not',
  (kind) => {
    const letter = passwordResetLetter({ name: '<b>Ada', email: 'ada@example.org' }, LINK);
    expect(letter).toMatchObject({
      to: 'ada@example.org',
      subject: 'A new password for Groundsill',
    });
    for (const part of [
      LINK.url,
      'once, until 1 June 2026 at 09:05 UTC',
      'If it was not you, do nothing',
    ]) {
      expect(letter[kind]).toContain(part);
    }
    expect(letter.html).not.toContain('<b>');
  },
);
