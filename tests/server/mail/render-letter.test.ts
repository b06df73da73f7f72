import { describe, expect, test } from 'vitest';
import { renderLetter } from '../../../server/mail/render-letter.ts';

const HEAD = { id: '1', to: 'a@example.org', subject: 'A subject' };
const HOSTILE = `<img src=x onerror="alert('1')">&lt;\r\nBcc: b@example.org\u2028\u202enoitatset`;
const IN_A_LINE = `<img src=x onerror="alert('1')">&lt; Bcc: b@example.org noitatset`;
const ESCAPED =
  '&lt;img src=x onerror=&quot;alert(&#39;1&#39;)&quot;&gt;&amp;lt; Bcc: b@example.org noitatset';

describe('renderLetter', () => {
  test('says the same as text and as html', () => {
    const { text, html } = renderLetter(HEAD, [
      'Some words.',
      { list: ['one', 'two'] },
      { label: 'Press', url: 'http://x.example.org/links/a?b=1&c=2' },
    ]);
    expect(text).toBe(
      'Some words.\n\n  - one\n  - two\n\nPress:\nhttp://x.example.org/links/a?b=1&c=2\n',
    );
    expect(html).toContain('<p>Some words.</p>');
    expect(html).toContain('<ul><li>one</li><li>two</li></ul>');
    expect(html).toContain('<a href="http://x.example.org/links/a?b=1&amp;c=2">Press</a>');
  });

  test.each([
    ['a paragraph', HOSTILE],
    ['a list', { list: [HOSTILE] }],
    ['a link', { label: HOSTILE, url: 'http://x.example.org/' }],
  ])('leaves no tag and no line break of others in %s', (_where, part) => {
    const { text, html } = renderLetter(HEAD, [part]);
    expect(text).toContain(IN_A_LINE);
    expect(html).toContain(ESCAPED);
    expect(html).not.toContain('<img');
  });

  test('keeps the subject in one line', () => {
    const { subject, html } = renderLetter({ ...HEAD, subject: HOSTILE }, []);
    expect(subject).toBe(IN_A_LINE);
    expect(html).toContain(`<title>${ESCAPED}</title>`);
  });

  test('leaves letters of all scripts as they are', () => {
    expect(renderLetter(HEAD, ['Øystein Ærø, Łódź, 東京, 👷🏽‍♀️']).text).toBe(
      'Øystein Ærø, Łódź, 東京, 👷🏽‍♀️\n',
    );
  });
});
