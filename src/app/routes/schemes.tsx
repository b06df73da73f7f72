import { useQuery } from '@tanstack/react-query';
import { Navigate } from 'react-router-dom';
import type { WaitingAnswer } from '../../../shared/schemas/waiting.ts';
import { Page } from '../../components/layout/page.tsx';
import { ButtonLink } from '../../components/ui/button-link.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { homePath, PATHS } from '../../config/paths.ts';
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

/** The scheme of somebody who has a building in it, and no other part anywhere. */
function onlyAsOwner({ general, schemes }: WaitingAnswer): string | undefined {
  const [only, ...others] = schemes;
  const isOwner = only?.roles.length === 1 && only.roles[0] === 'owner';
  return isOwner && others.length === 0 && general.length === 0 ? only.scheme.id : undefined;
}

/** What waits for whom. An owner has no desk: what is asked of them stands on their own page. */
export function SchemesPage() {
  const { isAdministrator } = usePerson();
  const { data: waiting, error, refetch } = useQuery(waitingQuery);
  const ownScheme = waiting === undefined || isAdministrator ? undefined : onlyAsOwner(waiting);
  if (ownScheme !== undefined) return <Navigate replace to={homePath(ownScheme)} />;
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
