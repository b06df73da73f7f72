import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { likelySameSchema, partiesSchema } from '../../../../shared/schemas/party-answers.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { schemeQuery } from '../../schemes/api/get-scheme.ts';

/** So many parties stand on one page. */
export const PARTIES_PER_PAGE = 100;

export type WhichParties = {
  readonly search?: string;
  readonly building?: number;
  readonly offset?: number;
};

/** All that is fetched of a scheme's parties stands under it. */
export function partiesKey(schemeId: string): readonly string[] {
  return [...schemeQuery(schemeId).queryKey, 'parties'];
}

function wordsOf({ search = '', building, offset = 0 }: WhichParties): string {
  const words = new URLSearchParams({ search, offset: String(offset) });
  words.set('limit', String(PARTIES_PER_PAGE));
  if (building !== undefined) words.set('building', String(building));
  return words.toString();
}

/** A page of the parties of a scheme, by name. */
export function partiesQuery(schemeId: string, which: WhichParties) {
  const words = wordsOf(which);
  return queryOptions({
    queryKey: [...partiesKey(schemeId), 'page', words],
    queryFn: ({ signal }) =>
      apiGet(`${apiPath`/api/schemes/${schemeId}/parties`}?${words}`, partiesSchema, signal),
    placeholderData: keepPreviousData,
  });
}

/** Parties that are likely the same. */
export function likelySameQuery(schemeId: string) {
  return queryOptions({
    queryKey: [...partiesKey(schemeId), 'likely-same'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/parties/likely-same`, likelySameSchema, signal),
  });
}
