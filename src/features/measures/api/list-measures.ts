import { queryOptions } from '@tanstack/react-query';
import { measuresSchema } from '../../../../shared/schemas/measures.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { schemeQuery } from '../../schemes/api/get-scheme.ts';

/** All that is fetched of a scheme's measures stands under it. */
export function measuresKey(schemeId: string): readonly string[] {
  return [...schemeQuery(schemeId).queryKey, 'measures'];
}

/** The protective measures of a scheme, or those of one building. */
export function measuresQuery(schemeId: string, buildingId?: number) {
  const which = buildingId === undefined ? '' : `?building=${buildingId}`;
  return queryOptions({
    queryKey: [...measuresKey(schemeId), buildingId ?? 'all'],
    queryFn: ({ signal }) =>
      apiGet(`${apiPath`/api/schemes/${schemeId}/measures`}${which}`, measuresSchema, signal),
  });
}
