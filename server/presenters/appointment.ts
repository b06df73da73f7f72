import {
  appointmentSchema,
  ownAppointmentSchema,
  type Appointment,
  type OwnAppointment,
} from '../../shared/schemas/appointments.ts';
import type { FoundAppointment } from '../models/appointments.ts';

function presentTimes(appointment: FoundAppointment) {
  const { id, building, purpose, startsAt, minutes, place, state, askedFor, version, changedAt } =
    appointment;
  return {
    ...{ id, building, purpose, minutes, place, state, askedFor, version },
    startsAt: startsAt.toISOString(),
    changedAt: changedAt.toISOString(),
  };
}

/** What leaves the server of an appointment to its owner. */
export function presentOwnAppointment(appointment: FoundAppointment): OwnAppointment {
  return ownAppointmentSchema.parse(presentTimes(appointment));
}

/** What leaves the server of an appointment to the team. */
export function presentAppointment(appointment: FoundAppointment): Appointment {
  const { party, createdBy, reader } = appointment;
  const isMailed = reader !== null;
  return appointmentSchema.parse({ ...presentTimes(appointment), party, createdBy, isMailed });
}
