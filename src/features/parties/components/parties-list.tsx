import { useQuery } from '@tanstack/react-query';
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

/** Everybody who owns, rents or manages a building, by name. */
export function PartiesList({ address }: PartiesListProps) {
  const scheme = useScheme();
  const { search: words, setSearch, offset } = address;
  const search = useDelayedValue(words.trim(), WAIT);
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
          setSearch(target.value);
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
          one="party"
          many="parties"
          offset={offset}
          perPage={PARTIES_PER_PAGE}
          found={data.found}
          onGoTo={address.setOffset}
        />
      )}
    </>
  );
}
