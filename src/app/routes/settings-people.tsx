import { useQuery } from '@tanstack/react-query';
import { Page } from '../../components/layout/page.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { membersQuery } from '../../features/members/api/list-members.ts';
import { AddMemberForm } from '../../features/members/components/add-member-form.tsx';
import { MembersTable } from '../../features/members/components/members-table.tsx';
import { can } from '../../features/schemes/can.ts';
import { useScheme } from '../../features/schemes/scheme-context.ts';
import { NotFoundPage } from './not-found.tsx';

function Members() {
  const scheme = useScheme();
  const { data: members, error, refetch } = useQuery(membersQuery(scheme.id));
  const mayChange = can(scheme, 'manageMembers');
  return (
    <Page
      title="People and roles"
      lead="One person may be several things. Nobody checks their own work."
      aside={
        mayChange && members !== undefined ? (
          <Panel title="Add a person">
            <AddMemberForm schemeId={scheme.id} members={members} />
          </Panel>
        ) : undefined
      }
    >
      {error !== null && (
        <QueryError what="The list of people" error={error} onRetry={() => void refetch()} />
      )}
      {members === undefined && error === null && <LoadingRows what="the people" />}
      {members !== undefined && (
        <MembersTable schemeId={scheme.id} members={members} mayChange={mayChange} />
      )}
    </Page>
  );
}

export function MembersPage() {
  return can(useScheme(), 'readMembers') ? <Members /> : <NotFoundPage />;
}
