import { useQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import type { ListedParty } from '../../../../shared/schemas/party-answers.ts';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { SearchList } from '../../../components/ui/search-list.tsx';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { partiesQuery } from '../api/list-parties.ts';
import { PartyName } from './party-name.tsx';

const WAIT = 150;
const MOST = 20;

type PartySearchProps = {
  readonly schemeId: string;
  readonly label: string;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  /** The one for whom another is sought. */
  readonly except: string | undefined;
  readonly onChoose: (party: ListedParty) => void;
};

/** Finds a party by name, address, e-mail or building. */
export function PartySearch({ schemeId, except, onChoose, ...words }: PartySearchProps) {
  const [query, setQuery] = useState('');
  const asked = query.trim();
  const settled = useDelayedValue(asked, WAIT);
  const { data, error, refetch, isPlaceholderData } = useQuery({
    ...partiesQuery(schemeId, { search: settled }),
    enabled: settled !== '',
  });
  const isSettled = asked !== '' && settled === asked && !isPlaceholderData;
  const found = isSettled ? data?.parties.filter(({ id }) => id !== except) : undefined;
  return (
    <>
      <SearchList
        {...words}
        placeholder="Name, address, e-mail or building"
        query={query}
        onQuery={setQuery}
        found={(found ?? []).slice(0, MOST).map(({ id, name, address }) => ({
          id,
          title: <PartyName name={name} />,
          note: address.join(', '),
        }))}
        nothing={found === undefined ? '' : 'No other party is found by this.'}
        onChoose={(id) => {
          const party = found?.find((one) => one.id === id);
          if (party === undefined) return;
          setQuery('');
          onChoose(party);
        }}
      />
      {error !== null && (
        <QueryError what="What you are looking for" error={error} onRetry={() => void refetch()} />
      )}
    </>
  );
}
