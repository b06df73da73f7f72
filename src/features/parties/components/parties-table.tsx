import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import type { ListedParty } from '../../../../shared/schemas/party-answers.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { CHANNEL_WORDS } from '../party-words.ts';
import { PartyName } from './party-name.tsx';

/** Buildings by interest, each kind said once. */
function Interests({ interests, interestCount }: ListedParty) {
  const more = interestCount - interests.length;
  const kinds = [...new Set(interests.map(({ kind }) => kind))];
  const words = kinds.map((kind) => {
    const held = interests.filter((one) => one.kind === kind);
    return `${kind} of ${held.map(({ building }) => building.reference).join(', ')}`;
  });
  return (
    <>
      {words.join('; ')}
      {more > 0 && <span className="text-ink-2"> and {formatCount(more)} more</span>}
    </>
  );
}

function columnsOf(onOpen: (id: string) => void): readonly Column<ListedParty>[] {
  return [
    {
      id: 'name',
      heading: 'Name',
      cell: ({ id, name }) => (
        <button
          type="button"
          title={name}
          className="block w-[220px] max-w-[46vw] cursor-pointer truncate text-left font-semibold max-sm:min-h-11"
          onClick={() => {
            onOpen(id);
          }}
        >
          <PartyName name={name} />
        </button>
      ),
    },
    { id: 'kind', heading: 'Kind', spare: true, cell: ({ kind }) => capital(kind) },
    {
      id: 'address',
      heading: 'Address',
      wide: true,
      cell: ({ address }) => <bdi title={address.join(', ')}>{address.join(', ')}</bdi>,
    },
    {
      id: 'interests',
      heading: 'Interests',
      cell: (party) =>
        party.interestCount === 0 ? (
          <span className="text-clay-deep">none</span>
        ) : (
          <Interests {...party} />
        ),
    },
    {
      id: 'channel',
      heading: 'Letters',
      cell: ({ channel, email }) => (
        <span title={email ?? undefined}>{CHANNEL_WORDS[channel]}</span>
      ),
    },
    {
      id: 'person',
      heading: 'Signs in',
      spare: true,
      cell: ({ person }) => (person === null ? '' : 'Yes'),
    },
  ];
}

/** Parties by name; a press opens one. */
export function PartiesTable({
  parties,
  onOpen,
}: {
  readonly parties: readonly ListedParty[];
  readonly onOpen: (id: string) => void;
}) {
  return (
    <Table
      label="Parties"
      columns={columnsOf(onOpen)}
      rows={parties}
      idOf={({ id }) => id}
      onOpen={({ id }) => {
        onOpen(id);
      }}
    />
  );
}
