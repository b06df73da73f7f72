import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { SearchList } from '../../../components/ui/search-list.tsx';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { crsSearchQuery } from '../api/search-crs.ts';
import { CrsFacts } from './crs-facts.tsx';

type CrsPickerProps = {
  /** The EPSG number of the system that is chosen. */
  readonly value: number | undefined;
  readonly onChange: (code: number | undefined) => void;
  readonly error?: string | undefined;
};

const WHILE_TYPING = 200;

function nothingWords(query: string, isSettled: boolean, error: Error | null): string {
  if (query === '') return '';
  if (error !== null) return 'The search does not answer. Try again in a moment.';
  return isSettled
    ? 'No projected system in metres is called that. Try its EPSG number, its name or a place.'
    : '';
}

/** Finds a projected system by number, name or place, and explains the one that is chosen. */
export function CrsPicker({ value, onChange, error }: CrsPickerProps) {
  const [typed, setTyped] = useState('');
  const query = useDelayedValue(typed.trim(), WHILE_TYPING);
  const search = useQuery(crsSearchQuery(query));
  const found = query === '' || typed.trim() === '' ? [] : (search.data ?? []);

  if (value !== undefined) {
    return (
      <CrsFacts code={value}>
        <Button
          kind="quiet"
          autoFocus
          onClick={() => {
            onChange(undefined);
          }}
        >
          Choose another
        </Button>
      </CrsFacts>
    );
  }
  return (
    <SearchList
      label="Coordinate system"
      hint="Every level, line and footprint of the scheme is kept in it. It stays as it is."
      placeholder="32631, UTM zone 31N, North Sea…"
      error={error}
      query={typed}
      onQuery={setTyped}
      found={found.map(({ code, name, area }) => ({
        id: String(code),
        title: `${code} ${name}`,
        note: area,
      }))}
      nothing={nothingWords(query, query === typed.trim() && search.isSuccess, search.error)}
      onChoose={(id) => {
        onChange(Number(id));
      }}
    />
  );
}
