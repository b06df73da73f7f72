import { useQuery } from '@tanstack/react-query';
import { useState, type KeyboardEvent } from 'react';
import { MOST_BUILDINGS_FOUND, type BuildingRow } from '../../../../shared/schemas/buildings.ts';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { SearchList } from '../../../components/ui/search-list.tsx';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { buildingSearchQuery } from '../../buildings/api/search-buildings.ts';

const WAIT = 150;

type BuildingSearchProps = {
  readonly schemeId: string;
  readonly onChoose: (building: BuildingRow, words: string, found: readonly BuildingRow[]) => void;
};

function titleOf({ reference, name }: BuildingRow): string {
  return name === null ? reference : `${reference} ${name}`;
}

/** Finds buildings by reference, name or address. */
export function BuildingSearch({ schemeId, onChoose }: BuildingSearchProps) {
  const [query, setQuery] = useState('');
  const words = query.trim();
  const settled = useDelayedValue(words, WAIT);
  const { data, error, refetch } = useQuery(buildingSearchQuery(schemeId, settled));
  // what was found for other words would be taken by a quick Enter
  const found = words !== '' && settled === words ? data : undefined;

  function choose(id: string): void {
    const building = found?.find((one) => String(one.id) === id);
    if (found === undefined || building === undefined) return;
    setQuery('');
    onChoose(building, words, found);
  }
  function clear(event: KeyboardEvent): void {
    if (event.key === 'Escape') setQuery('');
  }
  return (
    <div role="search" aria-label="Buildings" onKeyDown={clear}>
      <SearchList
        label="Find a building"
        placeholder="Reference, name or address"
        query={query}
        onQuery={setQuery}
        found={(found ?? []).map((one) => ({
          id: String(one.id),
          title: titleOf(one),
          note: one.address ?? 'address not known',
        }))}
        nothing={found === undefined ? '' : 'No building has this reference, name or address.'}
        onChoose={choose}
      />
      {found?.length === MOST_BUILDINGS_FOUND && (
        <p className="mt-1 text-cap text-ink-3">
          The first {MOST_BUILDINGS_FOUND}. Write more to find fewer.
        </p>
      )}
      {error !== null && settled !== '' && (
        <QueryError what="What you are looking for" error={error} onRetry={() => void refetch()} />
      )}
    </div>
  );
}
