import type { AnswerAppointment, AskedFor } from '../../shared/schemas/appointments.ts';
import { AppError } from '../errors.ts';
import { updateAppointment, type FoundAppointment } from '../models/appointments.ts';
import { findOwn } from '../models/find-own.ts';
import { heldSettings } from '../models/letter-settings.ts';
import { Person } from '../models/person.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readAppointment, requireCurrent, tellOfAppointment } from './kept-appointment.ts';
import { lockScheme } from './lock-scheme.ts';
import { dayIn } from '../days.ts';

/** The days that are asked for; refused where one is not to come. */
function askedForBy(answer: AnswerAppointment, today: string): AskedFor | null {
  if (answer.answer === 'agree') return null;
  if (answer.days.some(({ day }) => day <= today)) {
    const message = 'Choose days that are still to come.';
    throw new AppError('invalid-input', undefined, [{ path: 'days', message }]);
  }
  return { days: answer.days, note: answer.note };
}

function requireAgreeable({ startsAt }: FoundAppointment, asked: AskedFor | null): void {
  if (asked !== null || startsAt.getTime() > Date.now()) return;
  throw new AppError('conflict', 'This time has passed. Ask for another day.');
}

/** Agrees to an appointment for an owner, or asks for another day, and confirms it by mail. */
export async function answerAppointment(
  services: Services,
  by: Actor,
  scheme: Scheme,
  answer: AnswerAppointment & { readonly id: string },
): Promise<FoundAppointment> {
  const { database } = services;
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const { timeZone } = (await heldSettings(database, scheme, transaction)).settings;
    const askedFor = askedForBy(answer, dayIn(new Date(), timeZone));
    const { parties } = await findOwn(database, scheme.id, by.id, transaction);
    const which = { id: answer.id, parties };
    const before = await readAppointment(database, scheme.id, which, transaction);
    requireCurrent(before, answer.version);
    requireAgreeable(before, askedFor);
    const state = askedFor === null ? 'agreed' : 'another day asked for';
    await updateAppointment(database, answer.id, { ...before, state, askedFor }, transaction);
    const written = await readAppointment(database, scheme.id, which, transaction);
    // whoever answered is told, also where they act for the party
    const { name, email } = await Person.findByPk(by.id, { transaction, rejectOnEmpty: true });
    const after = { ...written, reader: { name, email } };
    const news = askedFor === null ? 'agreed' : 'asked for';
    const told = { action: 'answer appointment', before, after, news, timeZone } as const;
    await tellOfAppointment(services, by, scheme, told, transaction);
    return after;
  });
}
