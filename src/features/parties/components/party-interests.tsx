import { Link } from 'react-router-dom';
import { capital } from '../../../../shared/presentation/capital.ts';
import type { Party } from '../../../../shared/schemas/parties.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { buildingPath } from '../../../config/paths.ts';
import { daysWords } from '../party-words.ts';

type Interest = Party['interests'][number];

function columnsOf(schemeId: string): readonly Column<Interest>[] {
  return [
    {
      id: 'building',
      heading: 'Building',
      sortBy: ({ building }) => building.reference,
      cell: ({ building }) => (
        <Link to={buildingPath(schemeId, building.id)}>{building.reference}</Link>
      ),
    },
    {
      id: 'address',
      heading: 'Address',
      wide: true,
      cell: ({ building }) => building.address ?? 'not known',
    },
    { id: 'kind', heading: 'Interest', cell: ({ kind }) => capital(kind) },
    { id: 'days', heading: 'When', cell: (interest) => daysWords(interest) },
  ];
}

/** The buildings that a party has to do with. */
export function PartyInterests({
  schemeId,
  interests,
}: {
  readonly schemeId: string;
  readonly interests: readonly Interest[];
}) {
  if (interests.length === 0) {
    return (
      <p className="mt-2 text-small text-ink-2">None. Letters reach buildings through them.</p>
    );
  }
  return (
    <Table label="Interests" columns={columnsOf(schemeId)} rows={interests} idOf={({ id }) => id} />
  );
}
