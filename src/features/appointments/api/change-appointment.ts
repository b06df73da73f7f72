import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  appointmentSchema,
  type ChangeAppointment,
  type NewAppointment,
} from '../../../../shared/schemas/appointments.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { waitingQuery } from '../../waiting/api/get-waiting.ts';
import { appointmentsKey } from './list-appointments.ts';

/** Offers an appointment. */
export function useOfferAppointment(schemeId: string, onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (offer: NewAppointment) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/appointments`, appointmentSchema, offer),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: appointmentsKey(schemeId) }),
  });
}

/** Offers an appointment anew, calls it off or closes it. */
export function useChangeAppointment(schemeId: string, id: string, onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: ChangeAppointment) =>
      apiSend(
        'PATCH',
        apiPath`/api/schemes/${schemeId}/appointments/${id}`,
        appointmentSchema,
        change,
      ),
    onSuccess: onDone,
    onSettled: async () => {
      await client.invalidateQueries({ queryKey: appointmentsKey(schemeId) });
      await client.invalidateQueries({ queryKey: waitingQuery.queryKey });
    },
  });
}
