import { useQuery } from '@tanstack/react-query';
import { Page } from '../../components/layout/page.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { peopleQuery } from '../../features/people/api/list-people.ts';
import { InviteForm } from '../../features/people/components/invite-form.tsx';
import { PeopleTable } from '../../features/people/components/people-table.tsx';
import { formatCount } from '../../../shared/presentation/format-number.ts';

function inWords(count: number, waiting: number): string {
  const all = `${formatCount(count)} with an account`;
  return waiting === 0 ? `${all}.` : `${all}; ${formatCount(waiting)} of them cannot sign in.`;
}

export function PeoplePage() {
  const { data: people, error, refetch } = useQuery(peopleQuery);
  const waiting =
    people?.filter(({ hasPassword, shutOutAt }) => !hasPassword || shutOutAt !== null).length ?? 0;
  return (
    <Page
      title="People"
      lead={people && inWords(people.length, waiting)}
      aside={
        <Panel title="Invite a person">
          <InviteForm />
        </Panel>
      }
    >
      {error !== null && (
        <QueryError what="The list of people" error={error} onRetry={() => void refetch()} />
      )}
      {people === undefined && error === null && <LoadingRows what="the people" />}
      {people !== undefined && <PeopleTable people={people} />}
    </Page>
  );
}
