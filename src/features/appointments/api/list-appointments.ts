import { queryOptions } from '@tanstack/react-query';
import { appointmentsSchema } from '../../../../shared/schemas/appointments.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { schemeQuery } from '../../schemes/api/get-scheme.ts';

/** All that is fetched of a scheme's appointments stands under it. */
export function appointmentsKey(schemeId: string): readonly string[] {
  return [...schemeQuery(schemeId).queryKey, 'appointments'];
}

/** The appointments of a scheme, or those of one building. */
export function appointmentsQuery(schemeId: string, buildingId?: number) {
  const which = buildingId === undefined ? '' : `?building=${buildingId}`;
  return queryOptions({
    queryKey: [...appointmentsKey(schemeId), buildingId ?? 'all'],
    queryFn: ({ signal }) =>
      apiGet(
        `${apiPath`/api/schemes/${schemeId}/appointments`}${which}`,
        appointmentsSchema,
        signal,
      ),
  });
}
