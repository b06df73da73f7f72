import { fireEvent, screen } from '@testing-library/react';
import { Route, Routes } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { MailboxPage } from '../../../../src/app/routes/mailbox.tsx';
import { letterDocument } from '../../../../src/features/mailbox/letter-document.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const ENVELOPE = {
  id: 7,
  receivedAt: '2026-05-21T09:00:00.000Z',
  from: 'groundsill@example.org',
  to: 'clerk@example.org',
  subject: 'Invitation to Port Dogger crossing',
};

function openMailbox(path: string) {
  const page = <Route path="/mailbox/:letterId?" element={<MailboxPage />} />;
  return renderPage(<Routes>{page}</Routes>, path);
}

function bodyOf(html: string): string {
  const page = new DOMParser().parseFromString(letterDocument(html, '/letter.css'), 'text/html');
  return page.body.innerHTML;
}

describe('letterDocument', () => {
  it('keeps words, lists and links', () => {
    expect(bodyOf('<p>Go <a href="https://example.org/x">here</a></p>')).toBe(
      '<p>Go <a href="https://example.org/x" target="_blank" rel="noopener noreferrer">here</a></p>',
    );
  });

  it.each([
    ['<script>alert(1)</script>', ''],
    ['<style>p { color: red }</style><p>x</p>', '<p>x</p>'],
    ['<p style="color: red" onclick="alert(1)" class="y">x</p>', '<p>x</p>'],
    ['<img src="https://example.org/spy.png" alt="">', '<img>'],
    ['<form action="https://example.org"><input></form>', ''],
    ['<iframe src="https://example.org"></iframe>', ''],
  ])('leaves out what acts or fetches: %s', (html, left) => {
    expect(bodyOf(html)).toBe(left);
  });

  it('takes no address that runs something', () => {
    expect(bodyOf('<a href="javascript:alert(1)">x</a>')).not.toContain('javascript');
    expect(bodyOf('<a href=" JaVaScRiPt:alert(1)">x</a>')).not.toContain('href');
  });

  it('has our style and the language of the letter', () => {
    const page = letterDocument('<html lang="cy"><body>x</body></html>', '/letter.css');
    expect(page).toContain('<html lang="cy">');
    expect(page).toMatch(/<link rel="stylesheet" href="http[^"]*\/letter\.css">/);
  });
});

describe('the mailbox', () => {
  it('says what comes here while it is empty', async () => {
    fakeApi({ 'GET /api/mailbox': [] });
    openMailbox('/mailbox');
    expect(await screen.findByText(/^No letters yet/)).toBeTruthy();
  });

  it('shows a letter as text with its addresses to press, and as it looks', async () => {
    const text = 'Choose a password:\nhttps://example.org/links/token\n\nBye';
    const html = '<p>Choose a password</p>';
    fakeApi({
      'GET /api/mailbox': [ENVELOPE],
      'GET /api/mailbox/7': { ...ENVELOPE, text, html, attachments: ['letter.pdf'] },
    });
    openMailbox('/mailbox');
    fireEvent.click(await screen.findByText(ENVELOPE.subject));
    const words = await screen.findByRole('region', { name: 'The letter as text' });
    expect(words.textContent).toBe(text);
    expect(screen.getByText('letter.pdf')).toBeTruthy();
    expect(words.querySelector('a')?.getAttribute('href')).toBe('https://example.org/links/token');
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'As it looks' }));
    const frame = screen.getByTitle(`Letter: ${ENVELOPE.subject}`);
    expect(frame.getAttribute('sandbox')).not.toContain('allow-scripts');
    expect(frame.getAttribute('srcdoc')).toContain(html);
  });

  it('shows a letter without html as text alone', async () => {
    fakeApi({
      'GET /api/mailbox': [ENVELOPE],
      'GET /api/mailbox/7': { ...ENVELOPE, text: 'Bye', html: null, attachments: [] },
    });
    openMailbox('/mailbox/7');
    expect(await screen.findByText('Bye')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'As it looks' })).toBeNull();
  });
});
