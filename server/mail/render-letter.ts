import type { Letter } from './mailer.ts';

/** A paragraph, a list, or a link that is pressed. */
export type LetterPart =
  string | { readonly list: readonly string[] } | { readonly label: string; readonly url: string };

/** Stands for the address of a single-use link until the letter is sent: it is kept nowhere. */
export const LINK_LEFT_OPEN = 'link:';

/** Line breaks would make new headers and paragraphs, and marks of direction turn addresses round. */
const NOT_IN_A_LINE = /[\p{Cc}\p{Zl}\p{Zp}\u202a-\u202e\u2066-\u2069]+/gu;

function inOneLine(text: string): string {
  return text.replace(NOT_IN_A_LINE, ' ').trim();
}

const ESCAPES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function escaped(text: string): string {
  return inOneLine(text).replace(/[&<>"']/g, (character) => ESCAPES[character] ?? '');
}

function asText(part: LetterPart): string {
  if (typeof part === 'string') return inOneLine(part);
  if ('list' in part) return part.list.map((item) => `  - ${inOneLine(item)}`).join('\n');
  return `${inOneLine(part.label)}:\n${part.url}`;
}

function asHtml(part: LetterPart): string {
  if (typeof part === 'string') return `<p>${escaped(part)}</p>`;
  if ('list' in part) {
    return `<ul>${part.list.map((item) => `<li>${escaped(item)}</li>`).join('')}</ul>`;
  }
  const address = escaped(part.url);
  return `<p><a href="${address}">${escaped(part.label)}</a></p><p>${address}</p>`;
}

/** A letter as text and as html from the same parts, so that neither says more and nothing is left bare. */
export function renderLetter(
  head: { readonly id: string; readonly to: string; readonly subject: string },
  parts: readonly LetterPart[],
): Letter {
  const body = parts.map(asHtml).join('\n');
  return {
    ...head,
    subject: inOneLine(head.subject),
    text: `${parts.map(asText).join('\n\n')}\n`,
    html: `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><title>${escaped(head.subject)}</title></head>
<body style="max-width: 36em; font: 16px/1.5 'Noto Sans', sans-serif; color: #16202b">
${body}
</body>
</html>
`,
  };
}
