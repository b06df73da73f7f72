import { useQuery } from '@tanstack/react-query';
import { Page } from '../../components/layout/page.tsx';
import { ButtonLink } from '../../components/ui/button-link.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { PATHS } from '../../config/paths.ts';
import { schemesQuery } from '../../features/schemes/api/list-schemes.ts';
import { SchemeList } from '../../features/schemes/components/scheme-list.tsx';
import { usePerson } from '../../features/session/person-context.ts';
import { waitingQuery } from '../../features/waiting/api/get-waiting.ts';
import { WaitingForYou } from '../../features/waiting/components/waiting-for-you.tsx';
import { waitingSentence } from '../../features/waiting/waiting-words.ts';

function NewScheme() {
  return (
    <ButtonLink to={PATHS.newScheme} className="w-full">
      New scheme
    </ButtonLink>
  );
}

function Schemes() {
  const { isAdministrator } = usePerson();
  const { data: schemes, error, refetch } = useQuery(schemesQuery);
  return (
    <Panel title="Schemes">
      <div className="h-3.5" />
      {error !== null && (
        <QueryError what="The list of schemes" error={error} onRetry={() => void refetch()} />
      )}
      {schemes === undefined && error === null && <LoadingRows what="the schemes" />}
      {schemes?.length === 0 && (
        <EmptyState>
          {isAdministrator
            ? 'No schemes yet. Make the first one to start its register.'
            : 'You are in no scheme yet. An administrator adds you to one.'}
        </EmptyState>
      )}
      {schemes !== undefined && schemes.length > 0 && <SchemeList schemes={schemes} />}
      {isAdministrator && schemes !== undefined && <NewScheme />}
    </Panel>
  );
}

export function SchemesPage() {
  const { data: waiting, error, refetch } = useQuery(waitingQuery);
  return (
    <Page
      title="Waiting for you"
      lead={waiting && waitingSentence(waiting, new Date())}
      aside={<Schemes />}
    >
      {error !== null && (
        <QueryError what="What waits for you" error={error} onRetry={() => void refetch()} />
      )}
      {waiting === undefined && error === null && <LoadingRows what="what waits for you" />}
      {waiting !== undefined && <WaitingForYou waiting={waiting} />}
    </Page>
  );
}
