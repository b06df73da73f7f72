import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { importRowsSchema, type ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import type { RowFilter } from '../outcomes.ts';
import { importQuery } from './get-import.ts';

/** So many lines stand on a page of the report. */
export const ROWS_PER_PAGE = 100;

/** Which lines of a report. */
export type RowsAsked = { readonly filter: RowFilter | null; readonly offset: number };

/** Lines of an import's report, as it was last checked. */
export function rowsQuery(
  schemeId: string,
  { id, version, state }: Pick<ImportAnswer, 'id' | 'version' | 'state'>,
  { filter, offset }: RowsAsked,
) {
  const words = new URLSearchParams({ offset: String(offset), limit: String(ROWS_PER_PAGE) });
  if (filter !== null) words.set('outcome', filter);
  return queryOptions({
    queryKey: [...importQuery(schemeId, id).queryKey, 'rows', version, state, filter, offset],
    queryFn: ({ signal }) =>
      apiGet(
        `${apiPath`/api/schemes/${schemeId}/imports/${id}/rows`}?${words.toString()}`,
        importRowsSchema,
        signal,
      ),
    staleTime: Infinity,
    placeholderData: keepPreviousData,
  });
}
