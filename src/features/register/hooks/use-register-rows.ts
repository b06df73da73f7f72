import { keepPreviousData, useQueries, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { RegisterPage, RegisterRow } from '../../../../shared/schemas/register.ts';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { registerPageQuery, ROWS_AT_ONCE } from '../api/get-page.ts';
import type { Which } from '../api/which-buildings.ts';

/** A scrollbar that is drawn over thousands of rows asks for none of them until it stands still. */
const STANDS_STILL_MS = 90;

/** Offsets of the windows that hold some rows, and of the next one. */
function windowsOf(first: number, last: number, found: number): number[] {
  const from = Math.floor(first / ROWS_AT_ONCE);
  const to = Math.floor(last / ROWS_AT_ONCE) + 1;
  return Array.from({ length: to - from + 1 }, (_, index) => (from + index) * ROWS_AT_ONCE).filter(
    // the first window is fetched in any case
    (offset) => offset > 0 && offset < found,
  );
}

/** The rows of the register in windows of a hundred, as they come into view. */
export function useRegisterRows(schemeId: string, which: Which) {
  const client = useQueryClient();
  const [seen, setSeen] = useState({ first: 0, last: 0 });
  const settled = useDelayedValue(seen, STANDS_STILL_MS);
  const start = useQuery({
    ...registerPageQuery(schemeId, which, 0),
    placeholderData: keepPreviousData,
  });
  const found = start.data?.found ?? 0;
  const further = useQueries({
    queries: start.isPlaceholderData
      ? []
      : windowsOf(settled.first, settled.last, found).map((offset) =>
          registerPageQuery(schemeId, which, offset),
        ),
  });

  function windowAt(offset: number): RegisterPage | undefined {
    if (offset === 0) return start.data;
    if (start.isPlaceholderData) return undefined;
    return client.getQueryData(registerPageQuery(schemeId, which, offset).queryKey);
  }
  function rowAt(index: number): RegisterRow | undefined {
    const offset = Math.floor(index / ROWS_AT_ONCE) * ROWS_AT_ONCE;
    return windowAt(offset)?.rows[index - offset];
  }
  const failed = [start, ...further].find(({ error }) => error !== null);
  return {
    /** Undefined until anything is known. */
    page: start.data,
    /** Whether the rows are still those of before. */
    isStale: start.isPlaceholderData,
    isBusy: start.isFetching || further.some(({ isPending }) => isPending),
    error: failed?.error ?? null,
    retry: () => void failed?.refetch(),
    rowAt,
    onView: (first: number, last: number) => {
      setSeen((now) => (now.first === first && now.last === last ? now : { first, last }));
    },
  };
}

export type RegisterRows = ReturnType<typeof useRegisterRows>;
