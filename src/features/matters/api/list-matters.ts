import { queryOptions } from '@tanstack/react-query';
import { mattersSchema } from '../../../../shared/schemas/matter-answers.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { schemeQuery } from '../../schemes/api/get-scheme.ts';

/** All that is fetched of a scheme's matters stands under it. */
export function mattersKey(schemeId: string): readonly string[] {
  return [...schemeQuery(schemeId).queryKey, 'matters'];
}

/** The matters of a scheme that a filter means, as words of the address. */
export function mattersQuery(schemeId: string, filter: Readonly<Record<string, string>>) {
  const words = new URLSearchParams(filter).toString();
  return queryOptions({
    queryKey: [...mattersKey(schemeId), 'list', words],
    queryFn: ({ signal }) =>
      apiGet(`${apiPath`/api/schemes/${schemeId}/matters`}?${words}`, mattersSchema, signal),
  });
}
