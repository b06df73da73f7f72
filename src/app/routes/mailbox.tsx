import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { Button } from '../../components/ui/button.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { lettersQuery } from '../../features/mailbox/api/list-letters.ts';
import { Letter } from '../../features/mailbox/components/letter.tsx';
import { LetterList } from '../../features/mailbox/components/letter-list.tsx';
import { classNames } from '../../lib/class-names.ts';

function Letters() {
  const { data: letters, error, isFetching, refetch } = useQuery(lettersQuery);
  return (
    <>
      <div className="flex items-start justify-between gap-3 px-4 pt-[22px] pb-3 max-sm:pt-4">
        <div>
          <p aria-hidden="true" className="text-h1 leading-tight font-semibold max-sm:text-h2">
            Mailbox
          </p>
          <p className="text-small text-ink-2">
            In the demo every letter ends here and goes no further.
          </p>
        </div>
        <Button busy={isFetching} onClick={() => void refetch()}>
          Look again
        </Button>
      </div>
      {error !== null && (
        <div className="px-4">
          <QueryError what="The mailbox" error={error} onRetry={() => void refetch()} />
        </div>
      )}
      {letters === undefined && error === null && <LoadingRows what="the letters" />}
      {letters?.length === 0 && (
        <div className="px-4">
          <EmptyState>No letters yet. Invite a person, and theirs comes here.</EmptyState>
        </div>
      )}
      {letters !== undefined && letters.length > 0 && <LetterList letters={letters} />}
    </>
  );
}

export function MailboxPage() {
  const { letterId } = useParams();
  return (
    <div className="grid min-h-full grid-cols-[404px_minmax(0,1fr)] max-lg:grid-cols-[minmax(0,1fr)]">
      <PageTitle>Mailbox</PageTitle>
      <h1 className="sr-only">Mailbox</h1>
      <div
        className={classNames(
          'border-r border-ink max-lg:border-r-0',
          letterId !== undefined && 'max-lg:hidden',
        )}
      >
        <Letters />
      </div>
      <div
        className={classNames(
          'min-w-0 bg-paper-raised px-6 pt-[26px] pb-8 max-sm:px-4 max-sm:pt-2',
          letterId === undefined && 'max-lg:hidden',
        )}
      >
        {letterId === undefined ? (
          <p className="text-small text-ink-2">Choose a letter to read it here.</p>
        ) : (
          <Letter key={letterId} letterId={letterId} />
        )}
      </div>
    </div>
  );
}
