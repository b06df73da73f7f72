import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import {
  partyImportRowsSchema,
  partyImportSchema,
  partyImportsSchema,
  type PartyImportRow,
} from '../../../../shared/schemas/party-imports.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { schemeQuery } from '../../schemes/api/get-scheme.ts';

/** What a report is narrowed to. */
export type RowsOnly = PartyImportRow['outcome'] | 'noted';

/** All that is fetched of a scheme's imports of parties stands under it. */
export function partyImportsKey(schemeId: string): readonly string[] {
  return [...schemeQuery(schemeId).queryKey, 'party-imports'];
}

/** The imports of parties of a scheme, the newest first. */
export function partyImportsQuery(schemeId: string) {
  return queryOptions({
    queryKey: [...partyImportsKey(schemeId), 'all'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/party-imports`, partyImportsSchema, signal),
  });
}

/** One import of parties. */
export function partyImportQuery(schemeId: string, id: string) {
  return queryOptions({
    queryKey: [...partyImportsKey(schemeId), id],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/party-imports/${id}`, partyImportSchema, signal),
  });
}

/** A page of what an import says about its rows. */
export function partyImportRowsQuery(
  schemeId: string,
  id: string,
  { only, offset }: { readonly only: RowsOnly | null; readonly offset: number },
) {
  const words = new URLSearchParams({ offset: String(offset) });
  if (only !== null) words.set('only', only);
  const path = apiPath`/api/schemes/${schemeId}/party-imports/${id}/rows`;
  return queryOptions({
    queryKey: [...partyImportsKey(schemeId), id, 'rows', words.toString()],
    queryFn: ({ signal }) => apiGet(`${path}?${words}`, partyImportRowsSchema, signal),
    placeholderData: keepPreviousData,
  });
}
