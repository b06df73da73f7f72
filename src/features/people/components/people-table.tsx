import { useState } from 'react';
import type { PersonAnswer } from '../../../../shared/schemas/people.ts';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { partsInWords, signInState } from '../person-words.ts';
import { PersonDetail } from './person-detail.tsx';

const COLUMNS: readonly Column<PersonAnswer>[] = [
  {
    id: 'name',
    heading: 'Name',
    sortBy: ({ name }) => name.toLowerCase(),
    cell: ({ name, email, isAdministrator }) => (
      <>
        <b className="inline-block max-w-[190px] truncate align-middle font-semibold max-sm:max-w-[150px]">
          {name}
        </b>
        {isAdministrator && <span className="ml-1.5 text-ink-3">administrator</span>}
        <span className="block max-w-[220px] truncate text-cap text-ink-2 sm:hidden">{email}</span>
      </>
    ),
  },
  {
    id: 'email',
    heading: 'E-mail',
    spare: true,
    sortBy: ({ email }) => email,
    cell: ({ email }) => (
      <span className="inline-block max-w-[220px] truncate align-middle" title={email}>
        {email}
      </span>
    ),
  },
  {
    id: 'parts',
    heading: 'Schemes',
    spare: true,
    wide: true,
    cell: (person) => (
      <span className="text-ink-2" title={partsInWords(person)}>
        {partsInWords(person)}
      </span>
    ),
  },
  {
    id: 'state',
    heading: 'State',
    sortBy: (person) => signInState(person, new Date()).words,
    cell: (person) => {
      const { state, words } = signInState(person, new Date());
      return <StateMark state={state}>{words}</StateMark>;
    },
  },
];

/** Everybody who has an account. A row opens on what can be changed about the person. */
export function PeopleTable({ people }: { readonly people: readonly PersonAnswer[] }) {
  const [openId, setOpenId] = useState<string>();
  return (
    <Table
      label="People"
      wide
      className="max-h-[calc(100dvh-170px)]"
      columns={COLUMNS}
      rows={people}
      idOf={({ id }) => id}
      sortedBy={{ id: 'name', desc: false }}
      onOpen={({ id }) => {
        setOpenId(id === openId ? undefined : id);
      }}
      detailOf={(person) =>
        person.id === openId ? <PersonDetail key={person.id} person={person} /> : undefined
      }
    />
  );
}
