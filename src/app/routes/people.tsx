import { useQuery } from '@tanstack/react-query';
import { Page } from '../../components/layout/page.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { peopleQuery } from '../../features/people/api/list-people.ts';
import { InviteForm } from '../../features/people/components/invite-form.tsx';
import { PeopleTable } from '../../features/people/components/people-table.tsx';
import { formatCount } from '../../lib/format-number.ts';

export function PeoplePage() {
  const { data: people, error, refetch } = useQuery(peopleQuery);
  const waiting = people?.filter(({ hasPassword }) => !hasPassword).length ?? 0;
  return (
    <Page
      title="People"
      lead={
        people &&
        `${formatCount(people.length)} with an account; ${formatCount(waiting)} of them cannot sign in yet.`
      }
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
