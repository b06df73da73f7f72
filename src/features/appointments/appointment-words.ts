import type {
  Appointment,
  AppointmentState,
  AskedFor,
} from '../../../shared/schemas/appointments.ts';
import { formatWeekday } from '../../lib/format-date.ts';
import type { State } from '../../components/ui/state-mark.tsx';

/** The shape of each state of an appointment. */
export const APPOINTMENT_SHAPES: Readonly<Record<AppointmentState, State>> = {
  offered: 'in-hand',
  agreed: 'done',
  'another day asked for': 'waiting',
  cancelled: 'not-started',
  done: 'done',
};

/** Whether an appointment is over. */
export function isOver({ state }: Pick<Appointment, 'state'>): boolean {
  return state === 'cancelled' || state === 'done';
}

/** A day that an owner asked for, in words. */
export function askedDayWords({ day, part }: AskedFor['days'][number]): string {
  return `${formatWeekday(`${day}T12:00`)}, ${part}`;
}
