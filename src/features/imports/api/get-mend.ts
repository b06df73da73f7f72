import { queryOptions } from '@tanstack/react-query';
import { mendSchema } from '../../../../shared/schemas/imports.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { importQuery } from './get-import.ts';

/** A crossing outline as it is in the file and as it would be mended. */
export function mendQuery(schemeId: string, importId: string, row: number) {
  return queryOptions({
    queryKey: [...importQuery(schemeId, importId).queryKey, 'mend', row],
    queryFn: ({ signal }) =>
      apiGet(
        apiPath`/api/schemes/${schemeId}/imports/${importId}/rows/${row}/mend`,
        mendSchema,
        signal,
      ),
    staleTime: Infinity,
  });
}
