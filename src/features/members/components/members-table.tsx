import { useMemo, useState } from 'react';
import type { MemberAnswer } from '../../../../shared/schemas/members.ts';
import { ROLES, type Role } from '../../../../shared/schemas/roles.ts';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Table } from '../../../components/ui/table/table.tsx';
import { useChangeMember } from '../api/change-member.ts';
import { memberColumns } from './member-columns.tsx';

type MembersTableProps = {
  readonly schemeId: string;
  readonly members: readonly MemberAnswer[];
  readonly mayChange: boolean;
};

/** A person's roles with one of them switched, in the order of ROLES. */
function switched(roles: readonly Role[], role: Role): Role[] {
  return ROLES.filter((one) => (one === role ? !roles.includes(one) : roles.includes(one)));
}

/** Who is what in a scheme. A tick is kept at once; taking the last role away is asked about. */
export function MembersTable({ schemeId, members, mayChange }: MembersTableProps) {
  const change = useChangeMember(schemeId);
  const [leaving, setLeaving] = useState<MemberAnswer>();
  const { mutate } = change;

  const columns = useMemo(() => {
    function onSwitch(member: MemberAnswer, role: Role) {
      const roles = switched(member.roles, role);
      if (roles.length === 0) setLeaving(member);
      else mutate({ personId: member.person.id, roles });
    }
    return memberColumns(mayChange ? onSwitch : undefined);
  }, [mayChange, mutate]);

  function close() {
    setLeaving(undefined);
  }
  if (members.length === 0) {
    return <EmptyState>Nobody is in the scheme yet. Add the first person here.</EmptyState>;
  }
  return (
    <>
      <MutationError failed="The roles were not changed." error={change.error} />
      <Table
        label="People and their roles"
        wide
        className="max-h-[calc(100dvh-200px)]"
        columns={columns}
        rows={members}
        idOf={({ person }) => person.id}
        sortedBy={{ id: 'name', desc: false }}
      />
      <ConfirmDialog
        open={leaving !== undefined}
        title={`Take ${leaving?.person.name ?? ''} out of the scheme?`}
        doIt="Take them out"
        busy={change.isPending}
        onClose={close}
        onConfirm={() => {
          if (leaving === undefined) return;
          change.mutate({ personId: leaving.person.id, roles: [] }, { onSettled: close });
        }}
      >
        It is the only role they have here. They no longer see the scheme; what they did in it
        stays.
      </ConfirmDialog>
    </>
  );
}
