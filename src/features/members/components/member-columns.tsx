import type { MemberAnswer } from '../../../../shared/schemas/members.ts';
import { ROLES, type Role } from '../../../../shared/schemas/roles.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { roleName } from '../roles-in-words.ts';

type OnSwitch = (member: MemberAnswer, role: Role) => void;

const PERSON: Column<MemberAnswer> = {
  id: 'name',
  heading: 'Name',
  wide: true,
  sortBy: ({ person }) => person.name.toLowerCase(),
  cell: ({ person, accepted }) => (
    <span className="block py-1 leading-snug">
      <span className="flex gap-1.5">
        <b className="truncate font-semibold" title={person.name}>
          {person.name}
        </b>
        {!accepted && <span className="text-ink-3">invited</span>}
      </span>
      <span className="block truncate text-cap text-ink-2" title={person.email}>
        {person.email}
      </span>
    </span>
  ),
};

function roleColumn(role: Role, onSwitch: OnSwitch | undefined): Column<MemberAnswer> {
  return {
    id: role,
    heading: roleName(role),
    holds: 'tick',
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
  return [PERSON, ...ROLES.map((role) => roleColumn(role, onSwitch))];
}
