import { queryOptions } from '@tanstack/react-query';
import { ownAppointmentsSchema } from '../../../../shared/schemas/appointments.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { ownKey } from './get-own.ts';

/** The appointments at an owner's buildings. */
export function ownAppointmentsQuery(schemeId: string) {
  return queryOptions({
    queryKey: [...ownKey(schemeId), 'appointments'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/own/appointments`, ownAppointmentsSchema, signal),
  });
}
