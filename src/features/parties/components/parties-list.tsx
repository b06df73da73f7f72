import { useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { Field } from '../../../components/ui/field.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { PARTIES_PER_PAGE, partiesQuery } from '../api/list-parties.ts';
import type { usePartiesAddress } from '../hooks/use-parties-address.ts';
import { NoParties } from './no-parties.tsx';
import { Pages } from './pages.tsx';
import { PartiesTable } from './parties-table.tsx';

const WAIT = 250;

type PartiesListProps = { readonly address: ReturnType<typeof usePartiesAddress> };

/** What is written into the search goes into the address once it rests. */
function useSearchWords({ address }: PartiesListProps) {
  const [words, setWords] = useState(address.search);
  const settled = useDelayedValue(words.trim(), WAIT);
  const { search, setSearch } = address;
  useEffect(() => {
    if (settled !== search) setSearch(settled);
    // only what is written changes the address, not the other way round
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [settled]);
  return { words, setWords };
}

/** Everybody who owns, rents or manages a building, by name. */
export function PartiesList({ address }: PartiesListProps) {
  const scheme = useScheme();
  const { words, setWords } = useSearchWords({ address });
  const { search, offset } = address;
  const { data, error, refetch } = useQuery(partiesQuery(scheme.id, { search, offset }));
  if (data?.found === 0 && search === '') return <NoParties />;
  return (
    <>
      <Field
        label="Find parties"
        type="search"
        placeholder="Name, address, e-mail or building"
        frameClassName="mb-3 max-w-[360px]"
        value={words}
        onChange={({ target }) => {
          setWords(target.value);
        }}
      />
      {error !== null && (
        <QueryError what="The list" error={error} onRetry={() => void refetch()} />
      )}
      {error === null && data === undefined && <LoadingRows what="the parties" />}
      {data !== undefined && data.found > 0 && (
        <PartiesTable parties={data.parties} onOpen={address.open} />
      )}
      {data !== undefined && (
        <Pages
          what="parties"
          offset={offset}
          perPage={PARTIES_PER_PAGE}
          found={data.found}
          onGoTo={address.setOffset}
        />
      )}
    </>
  );
}
