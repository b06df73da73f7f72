import { useMemo } from 'react';
import { letterDocument } from '../letter-document.ts';
import styleUrl from './letter.css?url';

/**
 * A letter as its receiver sees it. The frame runs no scripts; it counts as our own only so that it may
 * fetch its style sheet.
 */
export function LetterFrame({
  html,
  subject,
}: {
  readonly html: string;
  readonly subject: string;
}) {
  const page = useMemo(() => letterDocument(html, styleUrl), [html]);
  return (
    <iframe
      title={`Letter: ${subject}`}
      sandbox="allow-same-origin allow-popups allow-popups-to-escape-sandbox"
      srcDoc={page}
      className="block h-[min(560px,70vh)] w-full border border-rule bg-sheet"
    />
  );
}
