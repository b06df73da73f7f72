import { useQueries, type UseQueryResult } from '@tanstack/react-query';
import { useState } from 'react';
import type { RegisterPage } from '../../../../shared/schemas/register.ts';
import { registerPageQuery, ROWS_AT_ONCE } from '../../register/api/get-page.ts';
import type { Which } from '../../register/api/which-buildings.ts';

/** What the newest complete run leads on to stage 3, the smallest reserve first. */
const STAGE_3: Which = {
  filter: { any: { stage: ['3'] } },
  sort: { column: 'reserve', descending: false },
};

/** The pages as one list, which stays the same one as long as nothing in it changes. */
function joined(pages: UseQueryResult<RegisterPage>[]) {
  const [first] = pages;
  const failed = pages.find(({ error }) => error !== null);
  return {
    rows: pages.flatMap(({ data }) => data?.rows ?? []),
    isPending: first?.data === undefined && failed === undefined,
    found: first?.data?.found ?? 0,
    hasRun: first?.data?.run !== null,
    error: failed?.error ?? null,
    retry: () => void failed?.refetch(),
  };
}

/** The buildings to visit, a hundred at a time. */
export function useToVisit(schemeId: string) {
  const [pages, setPages] = useState(1);
  const listed = useQueries({
    queries: Array.from({ length: pages }, (_, page) =>
      registerPageQuery(schemeId, STAGE_3, page * ROWS_AT_ONCE),
    ),
    combine: joined,
  });
  return {
    ...listed,
    more: () => {
      setPages(pages + 1);
    },
  };
}
