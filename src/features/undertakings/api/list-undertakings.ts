import { queryOptions } from '@tanstack/react-query';
import { undertakingsSchema } from '../../../../shared/schemas/undertakings.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { schemeQuery } from '../../schemes/api/get-scheme.ts';

/** All that is fetched of a scheme's undertakings stands under it. */
export function undertakingsKey(schemeId: string): readonly string[] {
  return [...schemeQuery(schemeId).queryKey, 'undertakings'];
}

/** The undertakings of a scheme, or those for one building. */
export function undertakingsQuery(schemeId: string, buildingId?: number) {
  const which = buildingId === undefined ? '' : `?building=${buildingId}`;
  return queryOptions({
    queryKey: [...undertakingsKey(schemeId), buildingId ?? 'all'],
    queryFn: ({ signal }) =>
      apiGet(
        `${apiPath`/api/schemes/${schemeId}/undertakings`}${which}`,
        undertakingsSchema,
        signal,
      ),
  });
}
