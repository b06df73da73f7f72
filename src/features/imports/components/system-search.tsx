import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { SearchList, type Found } from '../../../components/ui/search-list.tsx';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { crsSearchQuery } from '../../crs/api/search-crs.ts';

type SystemSearchProps = { readonly onChoose: (code: number) => void };

const WHILE_TYPING = 200;

/** The number alone, where the search does not list it: the server knows those with heights too. */
function byNumber(typed: string, found: readonly Found[]): Found[] {
  const [, code] = /^(?:epsg\s*:?\s*)?(\d{4,5})$/i.exec(typed) ?? [];
  if (code === undefined || found.some(({ id }) => id === code)) return [];
  return [{ id: code, title: `EPSG:${code}`, note: 'taken by its number' }];
}

/** Finds the system of a file's coordinates by number, name or place. */
export function SystemSearch({ onChoose }: SystemSearchProps) {
  const [typed, setTyped] = useState('');
  const words = typed.trim();
  const query = useDelayedValue(words, WHILE_TYPING);
  const search = useQuery(crsSearchQuery(query, 'file'));
  const listed = query === '' || query !== words ? [] : (search.data ?? []);
  const known = listed.map(({ code, name, area }) => ({
    id: String(code),
    title: `${code} ${name}`,
    note: area,
  }));
  const isSettled = words !== '' && query === words && search.isSuccess && !search.isFetching;
  const hasAnswer = isSettled || search.isError;
  const found = [...known, ...(hasAnswer ? byNumber(words, known) : [])];
  return (
    <SearchList
      label="Which system are its coordinates in?"
      hint="By EPSG number, name or place. Degrees from GPS or the web are 4326."
      placeholder="25830, ETRS89 zone 30N, Lisbon…"
      query={typed}
      onQuery={setTyped}
      found={found}
      nothing={isSettled ? 'No system is called that. Try its EPSG number.' : ''}
      onChoose={(id) => {
        onChoose(Number(id));
      }}
    />
  );
}
