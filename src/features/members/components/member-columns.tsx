import type { MemberAnswer } from '../../../../shared/schemas/members.ts';
import { ROLES, type Role } from '../../../../shared/schemas/roles.ts';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { roleName } from '../roles-in-words.ts';

type OnSwitch = (member: MemberAnswer, role: Role) => void;

const PERSON: Column<MemberAnswer> = {
  id: 'name',
  heading: 'Name',
  sortBy: ({ person }) => person.name.toLowerCase(),
  cell: ({ person }) => (
    <b className="inline-block max-w-[200px] truncate align-middle font-semibold max-sm:max-w-[130px]">
      {person.name}
    </b>
  ),
};

const STATE: Column<MemberAnswer> = {
  id: 'state',
  heading: 'State',
  wide: true,
  cell: ({ accepted }) =>
    accepted ? (
      <StateMark state="done">Can sign in</StateMark>
    ) : (
      <StateMark state="in-hand">Invited</StateMark>
    ),
};

const EMAIL: Column<MemberAnswer> = {
  id: 'email',
  heading: 'E-mail',
  spare: true,
  sortBy: ({ person }) => person.email,
  cell: ({ person }) => (
    <span
      className="inline-block max-w-[220px] truncate align-middle text-ink-2"
      title={person.email}
    >
      {person.email}
    </span>
  ),
};

function roleColumn(role: Role, onSwitch: OnSwitch | undefined): Column<MemberAnswer> {
  return {
    id: role,
    heading: roleName(role),
    cell: (member) => {
      const has = member.roles.includes(role);
      if (onSwitch === undefined) return has ? 'yes' : '';
      return (
        <label className="inline-flex size-6 cursor-pointer items-center justify-center max-sm:size-11">
          <span className="sr-only">{`${member.person.name} is ${role}`}</span>
          <input
            type="checkbox"
            className="size-4 accent-ink"
            checked={has}
            onChange={() => {
              onSwitch(member, role);
            }}
          />
        </label>
      );
    },
  };
}

/** A person and a tick for each role; without `onSwitch` it is only read. */
export function memberColumns(onSwitch: OnSwitch | undefined): Column<MemberAnswer>[] {
  return [PERSON, ...ROLES.map((role) => roleColumn(role, onSwitch)), EMAIL, STATE];
}
