import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import type { OwnLetterText } from '../../../shared/schemas/own.ts';
import { Content } from '../../components/layout/content.tsx';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { homePath } from '../../config/paths.ts';
import { formatDay } from '../../lib/format-date.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { ownLetterQuery } from './api/get-own-letter.ts';
import { HaveTheLetter } from './components/have-the-letter.tsx';
import { useOwnZone } from './hooks/use-own-zone.ts';
import { OWNER_PAGE } from './owner-page-style.ts';

function Acknowledge({ letter }: { readonly letter: OwnLetterText }) {
  const zone = useOwnZone();
  const scheme = useScheme();
  const isOpen = letter.acknowledgedAt === null && can(scheme, 'answerAsOwner');
  return (
    <div className="mt-6 print:hidden">
      <p role="status" className="mb-2">
        {letter.acknowledgedAt !== null &&
          `Thank you. You told us on ${formatDay(letter.acknowledgedAt, zone)} that you have this letter.`}
      </p>
      {isOpen && <HaveTheLetter letterId={letter.id} onDone={() => undefined} />}
    </div>
  );
}

function LetterText({ letter }: { readonly letter: OwnLetterText }) {
  return (
    <article className="max-w-[38em] [&_p]:mb-3 [&_p]:break-words">
      <p className="text-lead text-ink-2">{formatDay(letter.sentAt, useOwnZone())}</p>
      <h1 className="mb-4 text-h1 leading-tight">{letter.subject}</h1>
      {letter.parts.map((part, k) =>
        typeof part === 'string' ? (
          <p key={k}>{part}</p>
        ) : (
          <ul key={k} className="mb-3 list-disc pl-5">
            {part.list.map((item, n) => (
              <li key={n}>{item}</li>
            ))}
          </ul>
        ),
      )}
    </article>
  );
}

/** A letter as it was sent. */
export function OwnLetterPage() {
  const scheme = useScheme();
  const { ownLetterId = '' } = useParams();
  const { data: letter, error, refetch } = useQuery(ownLetterQuery(scheme.id, ownLetterId));
  return (
    <Content>
      <PageTitle>{letter?.subject ?? 'A letter'}</PageTitle>
      <div className={OWNER_PAGE}>
        <p className="mb-4 print:hidden">
          <Link to={homePath(scheme.id)} className="inline-flex min-h-touch items-center">
            Back to my building
          </Link>
        </p>
        {error !== null && (
          <QueryError what="The letter" error={error} onRetry={() => void refetch()} />
        )}
        {letter === undefined && error === null && <LoadingRows what="the letter" />}
        {letter !== undefined && (
          <>
            <LetterText letter={letter} />
            <Acknowledge letter={letter} />
          </>
        )}
      </div>
    </Content>
  );
}
