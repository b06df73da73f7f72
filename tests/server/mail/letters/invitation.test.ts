import { describe, expect, test } from 'vitest';
import {
  invitationMail,
  type InvitationFacts,
} from '../../../../server/mail/letters/invitation.ts';
import { renderLetter } from '../../../../server/mail/render-letter.ts';

const FACTS: InvitationFacts = {
  person: { name: 'Ada Lind', email: 'ada@example.org', isAdministrator: false },
  inviter: { name: 'Bo Berg', email: 'bo@example.org' },
  parts: [{ schemeName: 'Port Dogger', roles: ['designer', 'witness'] }],
  link: { id: '1', until: new Date('2026-12-08T14:05:00Z') },
};

function rendered(facts: InvitationFacts) {
  const { recipient, subject, parts } = invitationMail(facts);
  return renderLetter({ id: '1', to: recipient, subject }, parts);
}

describe('invitationMail', () => {
  test('goes to the person, about the scheme', () => {
    expect(invitationMail(FACTS)).toMatchObject({
      schemeId: null,
      linkId: '1',
      recipient: 'ada@example.org',
      subject: 'Invitation to Port Dogger',
    });
  });

  test.each(['text', 'html'] as const)(
    'says as %s who, what, until when and what if not',
    (kind) => {
      const words = rendered(FACTS)[kind];
      for (const part of [
        'Ada Lind,',
        'Bo Berg (bo@example.org) invites you',
        'Port Dogger, as designer and witness',
        'Choose a password to begin',
        'once, until 8 December 2026 at 14:05 UTC',
        'If you did not expect this letter, do nothing',
      ]) {
        expect(words).toContain(part);
      }
    },
  );

  test('names every scheme, and the administrator’s part', () => {
    const { text, subject } = rendered({
      ...FACTS,
      person: { ...FACTS.person, isAdministrator: true },
      parts: [...FACTS.parts, { schemeName: 'East Quay', roles: ['owner'] }],
    });
    expect(subject).toBe('Invitation to Groundsill');
    expect(text).toContain('  - East Quay, as owner\n  - all schemes, as administrator');
  });

  test('says nothing of parts where there are none', () => {
    expect(rendered({ ...FACTS, parts: [] }).text).not.toContain('You take part');
  });

  test('is not turned by names', () => {
    const evil = '</p><script>alert(1)</script>\r\nBcc: x@example.org';
    const { subject, html, text } = rendered({
      ...FACTS,
      inviter: { name: evil, email: 'bo@example.org' },
      person: { ...FACTS.person, name: evil },
      parts: [{ schemeName: evil, roles: ['owner'] }],
    });
    expect(subject).not.toMatch(/[\r\n]/);
    expect(html).not.toContain('<script');
    expect(text).not.toMatch(/^Bcc/m);
  });
});
