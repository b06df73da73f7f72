import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { SchemeAnswer } from '../../../shared/schemas/schemes.ts';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { useDelayedValue } from '../../hooks/use-delayed-value.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { mattersQuery } from './api/list-matters.ts';
import { InboxFilterBar } from './components/inbox-filter.tsx';
import { InboxTable } from './components/inbox-table.tsx';
import {
  addressOfFilter,
  filterOfAddress,
  queryOfFilter,
  type InboxFilter,
} from './inbox-filter.ts';

const WHILE_TYPING = 200;

function Nothing({ filter }: { readonly filter: InboxFilter }) {
  const isFiltered = Object.keys(addressOfFilter(filter)).length > 0;
  if (isFiltered) return <EmptyState>No matter is like this.</EmptyState>;
  return (
    <EmptyState>
      Nothing waits for an answer. Questions, concerns, claims and corrections of owners come here
      from their own page.
    </EmptyState>
  );
}

function Inbox({ scheme }: { readonly scheme: SchemeAnswer }) {
  const [words, setWords] = useSearchParams();
  const [filter, setFilter] = useState(() => filterOfAddress(words));
  const settled = useDelayedValue(filter, WHILE_TYPING);
  const { data, error, refetch } = useQuery({
    ...mattersQuery(scheme.id, queryOfFilter(settled)),
    placeholderData: keepPreviousData,
  });
  function change(some: Partial<InboxFilter>) {
    const next = { ...filter, ...some };
    setFilter(next);
    setWords(addressOfFilter(next), { replace: true });
  }
  return (
    <>
      <InboxFilterBar filter={filter} onChange={change} />
      {error !== null && (
        <QueryError what="The inbox" error={error} onRetry={() => void refetch()} />
      )}
      {data === undefined && error === null && <LoadingRows what="the inbox" />}
      {data?.matters.length === 0 && <Nothing filter={settled} />}
      {data !== undefined && data.matters.length > 0 && (
        <>
          <InboxTable schemeId={scheme.id} matters={data.matters} />
          {data.total > data.matters.length && (
            <p className="mt-2 text-small text-ink-2">
              {`The first ${data.matters.length} of ${data.total}. Say more in the filter to see others.`}
            </p>
          )}
        </>
      )}
    </>
  );
}

/** What owners have brought up: questions, concerns, claims and corrections. */
export function InboxPage() {
  const scheme = useScheme();
  return (
    <div className="p-8 max-sm:p-4">
      <PageTitle>{`Inbox of ${scheme.name}`}</PageTitle>
      <h1 className="mb-3 text-h3">Inbox</h1>
      {can(scheme, 'readMatters') ? (
        <Inbox scheme={scheme} />
      ) : (
        <EmptyState>What owners write is for assessors and the administrator.</EmptyState>
      )}
    </div>
  );
}
