import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  ownAppointmentSchema,
  type AnswerAppointment,
  type OwnAppointment,
} from '../../../../shared/schemas/appointments.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { ownKey } from './get-own.ts';

/** Agrees to an appointment, or asks for other days. */
export function useAnswerAppointment(
  schemeId: string,
  appointmentId: string,
  onDone: (appointment: OwnAppointment) => void,
) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (answer: AnswerAppointment) =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/own/appointments/${appointmentId}/answer`,
        ownAppointmentSchema,
        answer,
      ),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: ownKey(schemeId) }),
  });
}
