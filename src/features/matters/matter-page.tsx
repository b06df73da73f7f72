import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { ownersPath } from '../../config/paths.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { matterQuery } from './api/get-matter.ts';
import { MatterStanding } from './components/matter-standing.tsx';
import { MessageList } from './components/message-list.tsx';
import { SuggestionPanel } from './components/suggestion-panel.tsx';
import { WriteForm } from './components/write-form.tsx';

/** Why nothing can be read, or who else can. */
function Erased({ mayRead }: { readonly mayRead: boolean }) {
  return (
    <p className="mb-3 max-w-[60ch] text-roomy">
      The personal data of this party have been erased.{' '}
      {mayRead
        ? 'What was written is kept for a time, for the administrator alone.'
        : 'What was written can be read by the administrator alone.'}{' '}
      Nothing more can be written: nobody would read it.
    </p>
  );
}

function Thread({ schemeId, matterId }: { readonly schemeId: string; readonly matterId: string }) {
  const scheme = useScheme();
  const { data: matter, error, refetch } = useQuery(matterQuery(schemeId, matterId));
  const onReload = () => void refetch();
  if (error !== null) return <QueryError what="The matter" error={error} onRetry={onReload} />;
  if (matter === undefined) return <LoadingRows what="the matter" />;
  const mayChange = can(scheme, 'answerMatters');
  const { suggestion } = matter;
  return (
    <>
      <PageTitle>{`Matter ${matter.number} of ${scheme.name}`}</PageTitle>
      <h1 className="mb-4 text-h3 break-words" dir="auto">
        {matter.title === '' ? `Matter ${matter.number}` : matter.title}
      </h1>
      <div className="grid gap-x-8 gap-y-6 lg:grid-cols-[minmax(0,1fr)_300px]">
        <div className="min-w-0">
          {matter.isErased && <Erased mayRead={matter.messages.length > 0} />}
          <MessageList {...{ schemeId, matter }} />
          {mayChange && !matter.isErased && <WriteForm {...{ schemeId, matter, onReload }} />}
        </div>
        <div className="min-w-0">
          <MatterStanding {...{ schemeId, matter, mayChange, onReload }} />
          {suggestion !== null && (
            <SuggestionPanel
              {...{ schemeId, matter, suggestion, onReload }}
              mayTake={mayChange && !matter.isErased && can(scheme, 'updateRegister')}
            />
          )}
        </div>
      </div>
    </>
  );
}

/** One matter: what the owner wrote, what they were answered, and where it stands. */
export function MatterPage() {
  const scheme = useScheme();
  const { matterId = '' } = useParams();
  return (
    <div className="p-8 max-sm:p-4">
      <p className="mb-2 text-small">
        <Link to={ownersPath(scheme.id, 'inbox')}>Inbox</Link>
      </p>
      <Thread key={matterId} schemeId={scheme.id} matterId={matterId} />
    </div>
  );
}
