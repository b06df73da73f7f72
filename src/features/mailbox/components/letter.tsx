import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Facts } from '../../../components/ui/facts.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { Segments } from '../../../components/ui/segments.tsx';
import { PATHS } from '../../../config/paths.ts';
import { formatMoment } from '../../../lib/format-date.ts';
import { letterQuery } from '../api/get-letter.ts';
import { LetterFrame } from './letter-frame.tsx';
import { LetterText } from './letter-text.tsx';

const WAYS = [
  { value: 'text', label: 'As text' },
  { value: 'sent', label: 'As it looks' },
] as const;

/** One letter: to whom, when, and what it says. */
export function Letter({ letterId }: { readonly letterId: string }) {
  const { data: letter, error, refetch } = useQuery(letterQuery(letterId));
  const [way, setWay] = useState<(typeof WAYS)[number]['value']>('text');
  if (letter === undefined) {
    if (error === null) return <LoadingRows what="the letter" />;
    return <QueryError what="The letter" error={error} onRetry={() => void refetch()} />;
  }
  const html = way === 'sent' ? letter.html : null;
  return (
    <article>
      <Link
        to={PATHS.mailbox}
        className="mb-2 inline-block py-2 text-small max-sm:py-3.5 lg:hidden"
      >
        All letters
      </Link>
      <h2 className="mb-2 text-h2 break-words">{letter.subject}</h2>
      <div className="border-y border-hairline">
        <Facts
          facts={[
            ['To', letter.to],
            ['From', letter.from],
            ['Sent', formatMoment(letter.receivedAt)],
            ...(letter.attachments.length === 0
              ? []
              : [['With it', letter.attachments.join(', ')] as const]),
          ]}
        />
      </div>
      {letter.html !== null && (
        <div className="my-3">
          <Segments label="Show the letter" segments={WAYS} value={way} onChange={setWay} />
        </div>
      )}
      {html === null ? (
        <LetterText text={letter.text} />
      ) : (
        <LetterFrame html={html} subject={letter.subject} />
      )}
    </article>
  );
}
