import type { ChangeAppointment } from '../../shared/schemas/appointments.ts';
import type { AppointmentNews } from '../mail/letters/appointment-mails.ts';
import {
  updateAppointment,
  type FoundAppointment,
  type MovedAppointment,
} from '../models/appointments.ts';
import { heldSettings } from '../models/letter-settings.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import {
  readAppointment,
  requireCurrent,
  requireToCome,
  requireWorkingDay,
  tellOfAppointment,
} from './kept-appointment.ts';
import { lockScheme } from './lock-scheme.ts';

const STATES = { 'offer anew': 'offered', cancel: 'cancelled', done: 'done' } as const;

const NEWS: Readonly<Record<ChangeAppointment['change'], AppointmentNews | null>> = {
  'offer anew': 'offered anew',
  cancel: 'cancelled',
  done: null,
};

function moved(before: FoundAppointment, asked: ChangeAppointment): MovedAppointment {
  const state = STATES[asked.change];
  const kept = { ...before, state, askedFor: null };
  if (asked.change !== 'offer anew') return kept;
  const { startsAt, minutes, place } = asked;
  return { ...kept, startsAt: new Date(startsAt), minutes, place };
}

/** Offers an appointment at another time or place, calls it off or closes it, unless it has changed meanwhile. */
export async function changeAppointment(
  services: Services,
  by: Actor,
  scheme: Scheme,
  asked: ChangeAppointment & { readonly id: string },
): Promise<FoundAppointment> {
  const { database } = services;
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const which = { id: asked.id };
    const before = await readAppointment(database, scheme.id, which, transaction);
    requireCurrent(before, asked.version);
    const { settings } = await heldSettings(database, scheme, transaction);
    if (asked.change === 'offer anew') {
      requireToCome(asked.startsAt);
      requireWorkingDay(asked, settings);
    }
    await updateAppointment(database, asked.id, moved(before, asked), transaction);
    const after = await readAppointment(database, scheme.id, which, transaction);
    const { timeZone } = settings;
    const news = NEWS[asked.change];
    const told = { action: 'change appointment', before, after, news, timeZone };
    await tellOfAppointment(services, by, scheme, told, transaction);
    return after;
  });
}
