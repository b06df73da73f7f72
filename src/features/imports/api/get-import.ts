import { queryOptions } from '@tanstack/react-query';
import { importSchema } from '../../../../shared/schemas/imports.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { isWorking } from '../import-states.ts';
import { importsQuery } from './list-imports.ts';

const TWICE_A_SECOND = 500;

/** One import; asked for again and again while the server works on it. */
export function importQuery(schemeId: string, importId: string) {
  return queryOptions({
    queryKey: [...importsQuery(schemeId).queryKey, importId],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/imports/${importId}`, importSchema, signal),
    refetchInterval: ({ state }) =>
      state.data !== undefined && isWorking(state.data.state) && TWICE_A_SECOND,
    staleTime: 0,
  });
}
